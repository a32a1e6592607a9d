import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { leaderChanged, leaderOf } from '@weighhouse/shared/reasoning/leader';
import { levelName } from '../model/finding-words';

/** One possible result of a test: how likely it is, and where the panel would stand then. */
export interface ResultView {
  level: number;
  name: string;
  p: number;
  /** K+1 shares, none of these last. */
  standing: number[];
  /** The column that would be first; another than now where `takesFirst`. */
  leader: number;
  takesFirst: boolean;
}

/** A pending finding as a test that could be done next. */
export interface TestView {
  finding: Finding;
  /** 1 for the test that settles most. */
  rank: number;
  bits: number;
  leaderChanges: number;
  frontier: boolean;
  results: ResultView[];
}

/** The tests in the server's order: what settles most first. Empty where nothing is worked out (sealed, not judged). */
export function testsOf({ assessment, findings }: Differential): TestView[] {
  if (!assessment) return [];
  const now = leaderOf(assessment.standing);
  const byId = new Map(findings.map((finding) => [finding.id, finding]));
  return assessment.nextTests.flatMap(({ finding: id, bits, leaderChanges, frontier, levels }, index) => {
    const finding = byId.get(id);
    if (!finding || finding.observed !== null || finding.enteredInError) return [];
    const results = levels.map(({ p, standing }, level) => {
      const takesFirst = leaderChanged(standing, now);
      const leader = takesFirst ? leaderOf(standing) : now;
      return { level, name: levelName(finding, level), p, standing, leader, takesFirst };
    });
    return [{ finding, rank: index + 1, bits, leaderChanges, frontier, results }];
  });
}

export function pendingOf(findings: readonly Finding[]): Finding[] {
  return findings.filter((finding) => finding.observed === null && finding.enteredInError === null);
}

/** Pending findings that cannot be ranked because nobody who counts has judged them. */
export function unjudgedTests(differential: Differential): Finding[] {
  const judged = new Set(differential.assessment?.nextTests.map((test) => test.finding));
  return pendingOf(differential.findings).filter((finding) => !judged.has(finding.id));
}

/** What was never said of a test although it would be compared by it. */
export function unsaid({ cost, waitDays, burden }: Finding): string[] {
  const missing: string[] = [];
  if (cost === null) missing.push('cost');
  if (waitDays === null) missing.push('wait');
  if (burden === null) missing.push('burden');
  return missing;
}
