import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { createContext, type ReactNode, use, useMemo, useState } from 'react';
import { useUnsavedTargets } from '../drafts/use-draft';
import { type Column, columnsOf } from '../model/columns';
import { rowsInOrder } from '../model/rows';
import { type Reading, useReading } from '../reading/use-reading';

/** A field in the editor that a cell of the ledger leads to. */
export interface TypeAt {
  columnId: string;
}

/** What stands at the side. */
export type Panel =
  | { kind: 'row'; findingId: string; at: TypeAt | null }
  | { kind: 'prior'; at: TypeAt | null }
  /** The target is a finding's id, `prior` or `standing`. */
  | { kind: 'why'; target: string; column: number }
  | { kind: 'finding'; findingId: string | null }
  /** Null: no finding is chosen yet. */
  | { kind: 'trial'; findingId: string | null }
  | {
      kind:
        | 'pooled'
        | 'round'
        | 'seals'
        | 'candidates'
        | 'groups'
        | 'assumption'
        | 'sets'
        | 'columns'
        | 'discuss';
    };

export interface Ledger {
  /** As it is read on this screen: its assessment and everything beside it belong to the reading in force. */
  differential: Differential;
  /** As it is saved: for whatever is written back. The same object while the panel's own reading is shown. */
  saved: Differential;
  reading: Reading;
  columns: Column[];
  /** In the order in which they are shown. */
  rows: Finding[];
  /** This person may type and save numbers now. */
  canJudge: boolean;
  may: (ability: string) => boolean;
  /** Rows (and `prior`) with something typed and not saved. */
  unsaved: ReadonlySet<string>;
  panel: Panel | null;
  open: (panel: Panel | null) => void;
}

const LedgerContext = createContext<Ledger | null>(null);

export function useLedger(): Ledger {
  const ledger = use(LedgerContext);
  if (!ledger) throw new Error('used outside the ledger');
  return ledger;
}

interface Props {
  differential: Differential;
  first: Panel | null;
  children: ReactNode;
}

export function LedgerProvider({ differential: saved, first, children }: Props) {
  const [panel, open] = useState<Panel | null>(first);
  const columns = useMemo(() => columnsOf(saved.candidates), [saved.candidates]);
  const { differential, reading } = useReading(saved, columns);
  const rows = useMemo(() => rowsInOrder(differential.findings), [differential.findings]);
  const unsaved = useUnsavedTargets(saved, columns);
  const ledger = useMemo<Ledger>(() => {
    const may = (ability: string) => saved.abilities.includes(ability);
    const canJudge = mayJudge(saved);
    return { differential, saved, reading, columns, rows, canJudge, may, unsaved, panel, open };
  }, [differential, saved, reading, columns, rows, unsaved, panel]);
  return <LedgerContext value={ledger}>{children}</LedgerContext>;
}

/** In a sealed round the judgement that was handed in stays as it is until the unsealing. */
export function mayJudge({ abilities, mine, sealed }: Differential): boolean {
  return abilities.includes('judgement.give') && mine !== null && !(sealed && mine.handedInAt !== null);
}
