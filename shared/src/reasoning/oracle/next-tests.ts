import type { NextTest } from '../assessment.js';
import { descending } from '../descending.js';
import type { CheckedFinding, CheckedPanel } from '../validation/checked-panel.js';
import { at, sum, upTo } from './at.js';
import { reportedGivenSet } from './level-given-set.js';
import { type Posterior, leaderOf, standingOf } from './posterior.js';
import type { View } from './view.js';

/** What one pending finding is expected to settle. Source: Lindley 1956, Ann. Math. Statist. 27:986-1005. */
function expectation(
  panel: CheckedPanel,
  view: View,
  exponents: readonly number[],
  { sets, shares }: Posterior,
  finding: number,
): Omit<NextTest, 'frontier'> {
  const { id, levels, reliability } = at(panel.findings, finding);
  const row = at(view.rows, finding) ?? [];
  const now = standingOf({ sets, shares }, panel.candidates);
  const leader = leaderOf(now);
  const reported = sets.map((set) => reportedGivenSet(row, set, reliability));
  let bits = 0;
  let leaderChanges = 0;
  const outcomes = upTo(levels).map((level) => {
    const p = sum(shares.map((share, index) => share * at(at(reported, index), level)));
    const raised = reported.map((given) => at(given, level) ** at(exponents, finding));
    const total = sum(shares.map((share, index) => share * at(raised, index)));
    const after = shares.map((share, index) => (share * at(raised, index)) / total);
    // KL(after ‖ now): after/now is raised/total.
    bits +=
      p * sum(after.map((share, index) => (share === 0 ? 0 : share * Math.log2(at(raised, index) / total))));
    const standing = standingOf({ sets, shares: after }, panel.candidates);
    if (Math.max(...standing) > at(standing, leader) + 1e-12) leaderChanges += p;
    return { p, standing };
  });
  return { finding: id, bits: Math.max(0, bits), leaderChanges, levels: outcomes };
}

interface Costed {
  finding: CheckedFinding;
  bits: number;
}

/** Whether `other` settles at least as much for at most the same cost, wait and burden, and is better in one of them. */
function outdoes(other: Costed, one: Costed): boolean {
  const differences = [
    other.bits - one.bits,
    one.finding.cost - other.finding.cost,
    one.finding.waitDays - other.finding.waitDays,
    one.finding.burden - other.finding.burden,
  ].map((difference, index) => (index === 0 && Math.abs(difference) <= 1e-12 ? 0 : difference));
  return (
    differences.every((difference) => difference >= 0) && differences.some((difference) => difference > 0)
  );
}

export function nextTests(
  panel: CheckedPanel,
  view: View,
  exponents: readonly number[],
  now: Posterior,
): NextTest[] {
  const pending = upTo(panel.findings.length).filter(
    (finding) => at(panel.findings, finding).observed === null && at(view.rows, finding) !== null,
  );
  const tests = pending.map((finding) => expectation(panel, view, exponents, now, finding));
  const costed = tests.map(({ bits }, index) => ({ finding: at(panel.findings, at(pending, index)), bits }));
  const marked = tests.map((test, index) => ({
    finding: test.finding,
    bits: test.bits,
    leaderChanges: test.leaderChanges,
    frontier: !costed.some((other) => outdoes(other, at(costed, index))),
    levels: test.levels,
  }));
  return descending(marked, ({ bits }) => bits);
}
