import type { Panel } from '../panel.js';
import { bayesNetwork } from './bayes-network.js';
import { type NoisyOrRow, independentPanel } from './independent-panel.js';
import { publishedNetwork } from './published-network.js';

const conditions = 16;
const { priors, leaks, links, present, absent } = publishedNetwork;

const rowOf = (finding: number, observed: 0 | 1): NoisyOrRow => ({
  observed,
  leak: leaks[finding]!,
  links: links[finding]!.filter(([condition]) => condition < conditions),
});

/** The first 16 conditions of the published network with its six present and fifteen absent findings, as a panel. */
export function sixteenConditions(): Panel {
  const rows = [
    ...present.map((finding) => rowOf(finding, 1)),
    ...absent.map((finding) => rowOf(finding, 0)),
  ];
  return independentPanel(priors.slice(0, conditions), rows);
}

/**
 * The same as a general Bayesian network in its best encoding: an absent finding
 * of a noisy-OR multiplies the odds of each cause by 1 - link (Heckerman 1989),
 * so only the present ones need a node and a table.
 */
export function sixteenConditionsFolded() {
  const folded = priors.slice(0, conditions).map((prior, condition) => {
    const odds = absent.reduce(
      (left, finding) => {
        const link = links[finding]!.find(([cause]) => cause === condition)?.[1] ?? 0;
        return left * (1 - link);
      },
      prior / (1 - prior),
    );
    return odds / (1 + odds);
  });
  return bayesNetwork(
    folded,
    present.map((finding) => rowOf(finding, 1)),
  );
}
