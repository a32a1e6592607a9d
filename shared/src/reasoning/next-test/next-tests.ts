import type { NextTest } from '../assessment.js';
import { descending } from '../descending.js';
import { leaderChanged, leaderOf } from '../leader.js';
import { listed } from '../listed.js';
import type { Reasoning } from '../reasoning.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import { type Costed, onFrontier } from './frontier.js';

/**
 * The pending findings that someone of positive weight judged, those that
 * settle most first; equal ones in panel order.
 *
 * What a result does is worked out with the row's own exponent, its group
 * counted one larger for this row alone.
 */
export function nextTests(panel: CheckedPanel, judged: readonly boolean[], reasoning: Reasoning): NextTest[] {
  const leader = leaderOf(reasoning.standing);
  const tests: NextTest[] = [];
  const costs: Costed[] = [];
  panel.findings.forEach((finding, r) => {
    if (finding.observed !== null || !judged[r]) return;
    const { bits, levels } = reasoning.expectation(r);
    let leaderChanges = 0;
    for (const { p, standing } of levels) if (leaderChanged(standing, leader)) leaderChanges += p;
    costs.push({ bits, cost: finding.cost, waitDays: finding.waitDays, burden: finding.burden });
    tests.push({
      finding: finding.id,
      bits,
      leaderChanges,
      frontier: false,
      levels: levels.map(({ p, standing }) => ({ p, standing: listed(standing) })),
    });
  });
  onFrontier(costs).forEach((frontier, index) => (tests[index]!.frontier = frontier));
  return descending(tests, ({ bits }) => bits);
}
