import { type ReactNode, useState } from 'react';
import { useLedger } from '../ledger/ledger-context';
import type { Column } from '../model/columns';
import { fewColumns } from '../model/few-columns';

/** The columns that a list shows, and the button for the rest where there is one. */
export function useFewColumns(): { shown: Column[]; more: ReactNode } {
  const { columns, differential } = useLedger();
  const [all, setAll] = useState(false);
  const { assessment, mine } = differential;
  const { shown, rest, words } = fewColumns(columns, assessment?.standing ?? mine?.standing ?? null);
  const more = rest.length > 0 && (
    <button
      type="button"
      className="text-button"
      aria-expanded={all}
      onClick={() => {
        setAll(!all);
      }}
    >
      {all ? 'Only the leading ones' : words}
    </button>
  );
  return { shown: all ? [...shown, ...rest] : shown, more };
}
