import { createContext, type ReactNode, use, useCallback, useMemo, useState } from 'react';
import { useSignedIn } from '../../people/api/get-me';
import { type ColumnChoice, columnChoiceSchema, plainChoice } from './column-choice';

interface Choosing {
  choice: ColumnChoice;
  choose: (change: (known: ColumnChoice) => ColumnChoice) => void;
}

const ChoiceContext = createContext<Choosing | null>(null);

/** How this person laid out the columns of this case, and how to change it. */
export function useColumnChoice(): Choosing {
  const choosing = use(ChoiceContext);
  if (!choosing) throw new Error('used outside the ledger');
  return choosing;
}

/** Remembers the layout of the columns in this browser, for each person and case. */
export function ColumnChoiceProvider({ caseId, children }: { caseId: string; children: ReactNode }) {
  const key = `weighhouse.columns.${useSignedIn().id}.${caseId}`;
  const [choice, setChoice] = useState(() => remembered(key));
  const choose = useCallback<Choosing['choose']>(
    (change) => {
      setChoice((known) => {
        const next = change(known);
        remember(key, next);
        return next;
      });
    },
    [key],
  );
  const choosing = useMemo(() => ({ choice, choose }), [choice, choose]);
  return <ChoiceContext value={choosing}>{children}</ChoiceContext>;
}

function remembered(key: string): ColumnChoice {
  try {
    return columnChoiceSchema.safeParse(JSON.parse(localStorage.getItem(key) ?? 'null')).data ?? plainChoice;
  } catch {
    return plainChoice;
  }
}

function remember(key: string, choice: ColumnChoice): void {
  try {
    localStorage.setItem(key, JSON.stringify(choice));
  } catch {
    // A full or forbidden storage only forgets the layout.
  }
}
