import type { GivenCell, Panel, PanelContributor, PanelFinding } from '../panel.js';

export interface QuickRow extends Partial<PanelFinding> {
  given: GivenCell[];
}

/** A panel of one contributor: a prior and rows, for checks against worked examples. */
export function panelOfOne(
  prior: readonly number[],
  rows: readonly QuickRow[],
  settings: Partial<Panel> = {},
): Panel {
  return {
    candidates: prior.slice(1).map((_, index) => `candidate ${index}`),
    findings: rows.map(({ given: _, ...finding }, index) => ({
      observed: 1,
      ...finding,
      id: `row ${index}`,
    })),
    contributors: [
      {
        id: 'only',
        prior,
        likelihoods: Object.fromEntries(rows.map(({ given }, index) => [`row ${index}`, { given }])),
      },
    ],
    ...settings,
  };
}

/** A panel in which each contributor gives a prior and nothing else. */
export function panelOfPriors(
  priors: readonly (readonly number[] | null)[],
  weights?: readonly number[],
): Panel {
  const columns = priors.find((prior) => prior !== null)?.length ?? 2;
  return {
    candidates: Array.from({ length: columns - 1 }, (_, index) => `candidate ${index}`),
    contributors: priors.map((prior, index): PanelContributor => ({
      id: `contributor ${index}`,
      prior,
      weight: weights?.[index] ?? 1,
    })),
  };
}
