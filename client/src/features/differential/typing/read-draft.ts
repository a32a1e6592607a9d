import type { JudgeFinding } from '@weighhouse/shared/contracts/judgements';
import type { Column } from '../model/columns';
import { type Draft, textsOf } from './draft';
import { parseOutOf100 } from './parse-number';
import { readShares, restWords } from './sum';

/** A fault in what was typed, at a column (and level), or of the whole row. */
export interface DraftFault {
  columnId: string | null;
  level: number | null;
  message: string;
}

export interface ReadRow {
  outOf100: JudgeFinding['outOf100'];
  filled: number;
  faults: DraftFault[];
}

/**
 * Reads a row of likelihoods. A column may be left blank; with more than two levels it has all shares or none.
 * @param levels 2 asks for one number a column
 */
export function readRow(draft: Draft, columns: readonly Column[], levels: number): ReadRow {
  const faults: DraftFault[] = [];
  const outOf100 = columns.map((column) => {
    const texts = textsOf(draft, column.id, levels > 2 ? levels : 1);
    if (texts.every((text) => text.trim() === '')) return null;
    return levels > 2 ? readLevels(column, texts, faults) : readOne(column, texts[0] ?? '', faults);
  });
  const filled = outOf100.filter((cell) => cell !== null).length;
  if (filled > 0 && draft.exposure === null)
    faults.push({
      columnId: null,
      level: null,
      message: 'say how often you see this picture: seldom, sometimes or often',
    });
  return { outOf100, filled, faults };
}

function readOne(column: Column, text: string, faults: DraftFault[]): number | null {
  const typed = parseOutOf100(text);
  if (typed.kind === 'number') return typed.value;
  if (typed.kind === 'fault') faults.push({ columnId: column.id, level: null, message: typed.message });
  return null;
}

function readLevels(column: Column, texts: string[], faults: DraftFault[]): number[] | null {
  const shares = readShares(texts);
  for (const { index, message } of shares.faults) faults.push({ columnId: column.id, level: index, message });
  if (shares.complete) return shares.values.map((value) => value ?? 0);
  if (shares.faults.length === 0)
    faults.push({
      columnId: column.id,
      level: null,
      message: `all levels together must be 100: ${restWords(shares)}`,
    });
  return null;
}

/** Reads a prior: every column has a share and they sum to 100. */
export function readPrior(draft: Draft, columns: readonly Column[]) {
  return readShares(columns.map((column) => textsOf(draft, column.id, 1)[0] ?? ''));
}
