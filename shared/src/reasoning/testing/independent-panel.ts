import type { Panel, PanelFinding } from '../panel.js';

/** A finding that conditions bring about independently of each other (leaky noisy-OR). */
export interface NoisyOrRow extends Partial<PanelFinding> {
  leak: number;
  /** Condition, and the chance that it alone brings the finding about, the leak apart. */
  links: readonly (readonly [number, number])[];
}

/** P(present | only this condition, leak included) for each condition, and the leak last. */
export function elicited(conditions: number, { leak, links }: NoisyOrRow): number[] {
  const link = new Map(links);
  const given = Array.from({ length: conditions }, (_, k) => 1 - (1 - leak) * (1 - (link.get(k) ?? 0)));
  return [...given, leak];
}

/**
 * The panel of one contributor whose prior over sets is that of independent
 * conditions. With odds o_k, the weight of a set is Π o_k; the panel's is
 * τ^(|S|-1) Π p_k, and p_none for the empty set. The two are proportional for
 * p_k = o_k / (1 + Σ o), p_none = 1 / (1 + Σ o) and τ = 1 + Σ o, and τ takes
 * that value when coexistence is the chance of two or more among the counted sets.
 *
 * @param largest size of the largest set that is counted
 */
export function independentPanel(
  priors: readonly number[],
  rows: readonly NoisyOrRow[],
  largest = priors.length,
): Panel {
  const odds = priors.map((prior) => prior / (1 - prior));
  // Weights of all sets of each size.
  let ofSize = [1];
  for (const one of odds)
    ofSize = [...ofSize, 0].map((weight, size) => weight + one * (ofSize[size - 1] ?? 0));
  const counted = ofSize.slice(0, largest + 1);
  const total = counted.reduce((sum, weight) => sum + weight, 0);
  const several = counted.slice(2).reduce((sum, weight) => sum + weight, 0);
  const single = counted[0]! + counted[1]!;
  return {
    candidates: priors.map((_, k) => `condition ${k}`),
    coexistence: several / total,
    findings: rows.map(({ leak: _leak, links: _links, ...finding }, index) => ({
      observed: 1,
      ...finding,
      id: `finding ${index}`,
    })),
    contributors: [
      {
        id: 'only',
        prior: [...odds.map((one) => one / single), 1 / single],
        likelihoods: Object.fromEntries(
          rows.map((row, index) => [`finding ${index}`, { given: elicited(priors.length, row) }]),
        ),
      },
    ],
  };
}
