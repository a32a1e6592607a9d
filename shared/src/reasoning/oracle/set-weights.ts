import type { CheckedPair, CheckedPanel } from '../validation/checked-panel.js';
import { at, sum, upTo } from './at.js';

export const mostSets = 2 ** 16;

/** All sets of at most `largest` of the candidates, by size, members ascending. */
export function setsUpTo(candidates: number, largest: number): number[][] {
  let ofSize: number[][] = [[]];
  const sets = [[]] as number[][];
  for (let size = 1; size <= largest; size += 1) {
    ofSize = ofSize.flatMap((set) =>
      upTo(candidates)
        .filter((candidate) => candidate > (set.at(-1) ?? -1))
        .map((candidate) => [...set, candidate]),
    );
    sets.push(...ofSize);
  }
  return sets;
}

/** The largest size that keeps the number of sets within `mostSets`. */
export function largestCounted(candidates: number): number {
  let size = 0;
  let count = 1;
  let ofSize = 1;
  while (size < candidates) {
    ofSize = (ofSize * (candidates - size)) / (size + 1);
    if (count + ofSize > mostSets) break;
    count += ofSize;
    size += 1;
  }
  return size;
}

/** ln( Π p Π t ) of a set. */
function logProduct(set: readonly number[], prior: readonly number[], pairs: readonly CheckedPair[]): number {
  return (
    sum(set.map((candidate) => Math.log(at(prior, candidate)))) +
    sum(pairs.filter(({ a, b }) => set.includes(a) && set.includes(b)).map(({ times }) => Math.log(times)))
  );
}

/** The sets that count, their prior weights, and whether (and how much) any are left out. */
export interface SetPrior {
  sets: number[][];
  weights: number[];
  exact: boolean;
  leftOut: number | null;
}

/**
 * Prior weights over sets: p_none for the empty set and
 * τ^(|S|-1) Π p_k Π t_ab for the others, τ such that sets of two or more have
 * the share `coexistence`. Without coexistence, or where every pair is
 * excluded, only sets of at most one candidate are counted.
 */
export function setPrior(panel: CheckedPanel, prior: readonly number[], coexistence: number): SetPrior {
  const none = at(prior, panel.candidates);
  const largest = coexistence > 0 ? largestCounted(panel.candidates) : 1;
  const sets = setsUpTo(panel.candidates, largest);
  const logs = sets.map((set) => (set.length === 0 ? Math.log(none) : logProduct(set, prior, panel.pairs)));
  const several = sets.flatMap((set, index) =>
    set.length > 1 && at(logs, index) > -Infinity ? [{ size: set.length, log: at(logs, index) }] : [],
  );
  if (coexistence === 0 || several.length === 0) {
    const single = sets.flatMap((set, index) =>
      set.length <= 1 ? [{ set, weight: Math.exp(at(logs, index)) }] : [],
    );
    return {
      sets: single.map(({ set }) => set),
      weights: single.map(({ weight }) => weight),
      exact: true,
      leftOut: 0,
    };
  }
  const logTau = solveLogTau(several, coexistence);
  const weights = sets.map((set, index) => Math.exp(at(logs, index) + Math.max(set.length - 1, 0) * logTau));
  const exact = largest === panel.candidates;
  return {
    sets,
    weights,
    exact,
    leftOut: exact ? 0 : shareLeftOut(panel, prior, largest, logTau, sum(weights)),
  };
}

/** ln τ by bisection: the share of sets of two or more rises with τ. */
function solveLogTau(several: readonly { size: number; log: number }[], coexistence: number): number {
  const target = Math.log(coexistence / (1 - coexistence));
  const logOdds = (logTau: number) => {
    const terms = several.map(({ size, log }) => log + (size - 1) * logTau);
    const top = terms.reduce((most, term) => Math.max(most, term));
    return top + Math.log(sum(terms.map((term) => Math.exp(term - top))));
  };
  let low = -2000;
  let high = 20000;
  for (let step = 0; step < 200; step += 1) {
    const middle = (low + high) / 2;
    if (logOdds(middle) < target) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** Without pairs the weights of all sets of a size add up to an elementary symmetric polynomial. */
function shareLeftOut(
  panel: CheckedPanel,
  prior: readonly number[],
  largest: number,
  logTau: number,
  counted: number,
): number | null {
  if (panel.pairs.some(({ times }) => times !== 1)) return null;
  let symmetric = [1];
  for (const candidate of upTo(panel.candidates)) {
    const share = at(prior, candidate);
    symmetric = [...symmetric, 0].map((value, size) => value + share * (symmetric[size - 1] ?? 0));
  }
  const missing = sum(
    symmetric.slice(largest + 1).map((value, index) => value * Math.exp((largest + index) * logTau)),
  );
  return missing / (counted + missing);
}
