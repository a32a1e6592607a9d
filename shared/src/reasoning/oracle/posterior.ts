import type { CheckedPanel } from '../validation/checked-panel.js';
import { at, normalised, sum, upTo } from './at.js';
import { reportedGivenSet } from './level-given-set.js';
import { type SetPrior, setPrior } from './set-weights.js';
import type { View } from './view.js';

/** Shares of the counted sets, in their order. */
export interface Posterior extends Pick<SetPrior, 'sets' | 'exact' | 'leftOut'> {
  shares: number[];
}

/** posterior(S) ∝ weight(S) Π over observed rows of P'(observed | S)^γ. */
export function posterior(
  panel: CheckedPanel,
  view: View,
  exponents: readonly number[],
  coexistence = panel.coexistence,
): Posterior {
  const { sets, weights, exact, leftOut } = setPrior(panel, view.prior, coexistence);
  const logs = sets.map((set, index) => {
    const terms = panel.findings.map(({ observed, reliability }, finding) => {
      const row = at(view.rows, finding);
      if (!row || observed === null) return 0;
      return at(exponents, finding) * Math.log(at(reportedGivenSet(row, set, reliability), observed));
    });
    return Math.log(at(weights, index)) + sum(terms);
  });
  const top = logs.reduce((most, log) => Math.max(most, log));
  return { sets, shares: normalised(logs.map((log) => Math.exp(log - top))), exact, leftOut };
}

/** Each candidate's share, alone or with others, and the share of *none of these* last. */
export function standingOf(
  { sets, shares }: Pick<Posterior, 'sets' | 'shares'>,
  candidates: number,
): number[] {
  const shareWhere = (holds: (set: readonly number[]) => boolean) =>
    sum(shares.filter((_, index) => holds(at(sets, index))));
  return [
    ...upTo(candidates).map((candidate) => shareWhere((set) => set.includes(candidate))),
    shareWhere((set) => set.length === 0),
  ];
}

/** Position of the largest entry, the first of those equal within 1e-12. */
export function leaderOf(standing: readonly number[]): number {
  const most = Math.max(...standing);
  return standing.findIndex((share) => share >= most - 1e-12);
}
