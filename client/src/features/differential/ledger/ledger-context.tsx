import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { createContext, type ReactNode, use, useMemo, useState } from 'react';
import { useUnsavedTargets } from '../drafts/use-draft';
import { type Column, columnsOf } from '../model/columns';
import { rowsInOrder } from '../model/rows';

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
  | { kind: 'pooled' | 'round' | 'seals' | 'candidates' | 'groups' };

export interface Ledger {
  differential: Differential;
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

export function LedgerProvider({ differential, first, children }: Props) {
  const [panel, open] = useState<Panel | null>(first);
  const columns = useMemo(() => columnsOf(differential.candidates), [differential.candidates]);
  const rows = useMemo(() => rowsInOrder(differential.findings), [differential.findings]);
  const unsaved = useUnsavedTargets(differential, columns);
  const ledger = useMemo<Ledger>(() => {
    const may = (ability: string) => differential.abilities.includes(ability);
    return { differential, columns, rows, canJudge: mayJudge(differential), may, unsaved, panel, open };
  }, [differential, columns, rows, unsaved, panel]);
  return <LedgerContext value={ledger}>{children}</LedgerContext>;
}

/** In a sealed round the judgement that was handed in stays as it is until the unsealing. */
export function mayJudge({ abilities, mine, sealed }: Differential): boolean {
  return abilities.includes('judgement.give') && mine !== null && !(sealed && mine.handedInAt !== null);
}
