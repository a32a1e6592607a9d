import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { JudgeFinding, JudgePrior } from '@weighhouse/shared/contracts/judgements';
import { sumOf, whole } from './judged-columns.js';
import type { JudgedValue } from './saved-version.js';

/** What an input comes to: numbers to keep, or every fault of it. */
export interface Checked {
  values: JudgedValue[];
  faults: FieldFault[];
}

const toThousandths = (outOf100: number): number => Math.round(outOf100 * 10);

/**
 * Checks a prior against the case's columns.
 * @param columns candidate ids in order, null (none of these) last
 */
export function checkPrior(outOf100: JudgePrior['outOf100'], columns: readonly (string | null)[]): Checked {
  const wrongLength = lengthFault(outOf100.length, columns.length);
  if (wrongLength) return { values: [], faults: [wrongLength] };
  const shares = outOf100.map(toThousandths);
  const faults = sumOf(shares) === whole ? [] : [{ path: 'outOf100', message: 'must sum to 100' }];
  const values = columns.map((candidateId, k) => ({ candidateId, level: 0, thousandths: shares[k] ?? 0 }));
  return { values, faults };
}

/**
 * Checks a row against the case's columns and the finding's levels. Of a finding with two levels a cell is the number
 * that would show it; both shares are taken as well, and kept as that one number.
 */
export function checkRow(
  outOf100: JudgeFinding['outOf100'],
  columns: readonly (string | null)[],
  levels: number,
): Checked {
  const wrongLength = lengthFault(outOf100.length, columns.length);
  if (wrongLength) return { values: [], faults: [wrongLength] };
  const checked = columns.map((column, k) => checkCell(outOf100[k] ?? null, column, k, levels));
  return {
    values: checked.flatMap((cell) => cell.values),
    faults: checked.flatMap((cell) => cell.faults),
  };
}

function checkCell(
  cell: number | number[] | null,
  candidateId: string | null,
  k: number,
  levels: number,
): Checked {
  if (cell === null) return { values: [], faults: [] };
  const path = `outOf100[${String(k)}]`;
  if (typeof cell === 'number') {
    if (levels === 2)
      return { values: [{ candidateId, level: 1, thousandths: toThousandths(cell) }], faults: [] };
    return {
      values: [],
      faults: [{ path, message: `must give a share for each of ${String(levels)} levels` }],
    };
  }
  const shares = cell.map(toThousandths);
  const faults: FieldFault[] = [];
  if (shares.length !== levels)
    faults.push({ path, message: `must give a share for each of ${String(levels)} levels` });
  if (sumOf(shares) !== whole) faults.push({ path, message: 'must sum to 100' });
  const values = shares.map((thousandths, level) => ({ candidateId, level, thousandths }));
  return { values: levels === 2 ? values.slice(1) : values, faults };
}

function lengthFault(length: number, columns: number): FieldFault | null {
  if (length === columns) return null;
  return {
    path: 'outOf100',
    message: `must have ${String(columns)} entries, one for each candidate and one for none of these`,
  };
}
