import type { CheckedPanel } from '../validation/checked-panel.js';
import { logCoexistenceFactor } from './coexistence-factor.js';
import { type Half, type SetTable, setTable } from './set-table.js';
import { type TogetherFactors, pairedSums, symmetricSums, togetherFactors } from './size-weights.js';
import { togetherLogs } from './together.js';

/** What of the prior over sets is the same for every view of a panel. */
export interface SetAssumption {
  table: SetTable;
  coexistence: number;
  /** For each set Σ ln t_ab; null where there are no pairs to heed. */
  together: Float64Array | null;
  factors: TogetherFactors | null;
}

/** Null where no set of two or more can be: then coexistence has no effect. */
export function setAssumption(panel: CheckedPanel): SetAssumption | null {
  const { candidates, coexistence, pairs } = panel;
  if (coexistence === 0 || candidates < 2) return null;
  const table = setTable(candidates);
  const together = togetherLogs(table, pairs);
  const factors = together && togetherFactors(table, together);
  return together && !factors ? null : { table, coexistence, together, factors };
}

/** Logarithms that add up to the logarithm of a set's weight × τ: one of its low half, one of its high half. */
export interface SetPrior {
  logTau: number;
  low: Float64Array;
  high: Float64Array;
  /** ln( τ p_none ), for the empty set. */
  none: number;
}

/**
 * Prior weights over sets: p_none for the empty set, τ^(|S|-1) Π p_k Π t_ab for
 * the others. Multiplied by τ they are products over the members.
 */
export function setPrior({ table, coexistence, factors }: SetAssumption, prior: Float64Array): SetPrior {
  const sums = factors
    ? pairedSums(table, prior, factors)
    : symmetricSums(prior, table.candidates).subarray(0, table.largest + 1);
  const scaled = logCoexistenceFactor(sums, coexistence) ?? 0;
  const logTau = factors ? scaled - factors.shift : scaled;
  const member = prior.map((share) => Math.log(share) + logTau);
  return {
    logTau,
    low: sumsOf(table.low, member),
    high: sumsOf(table.high, member),
    none: member[table.candidates]!,
  };
}

function sumsOf({ parents, added }: Half, member: Float64Array): Float64Array {
  const sums = new Float64Array(parents.length);
  for (let index = 1; index < sums.length; index += 1)
    sums[index] = sums[parents[index]!]! + member[added[index]!]!;
  return sums;
}

/**
 * Prior share of the sets that are not counted for being too large: 0 where all
 * are counted, null where pairs make it incomputable.
 */
export function shareLeftOut(
  { table, together }: SetAssumption,
  prior: Float64Array,
  logTau: number,
): number | null {
  if (table.largest === table.candidates) return 0;
  if (together) return null;
  const sums = symmetricSums(prior, table.candidates);
  let counted = prior[table.candidates]!;
  let missing = 0;
  for (let size = 1; size <= table.candidates; size += 1) {
    const weight = sums[size]! * Math.exp((size - 1) * logTau);
    if (size <= table.largest) counted += weight;
    else missing += weight;
  }
  return missing / (counted + missing);
}
