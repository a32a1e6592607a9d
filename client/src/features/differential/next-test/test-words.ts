import type { Differential } from '@weighhouse/shared/contracts/differential';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { counted } from '../../../lib/words';
import type { TestView } from './tests-view';

/**
 * From how many bits on a result is expected to settle much, something, or little. One bit halves the doubt between
 * two candidates that stand alike. The steps are ours; no published thresholds exist.
 */
export const settlesFrom = { much: 0.5, something: 0.1, little: 0.01 } as const;

/** A standing that moves by less than this share on no candidate hardly moves: 3 of 100. */
export const hardlyMoves = 0.03;

/** What is expected to be settled, in words: "settles something". */
export function settlesWords(bits: number): string {
  if (bits >= settlesFrom.much) return 'settles much';
  if (bits >= settlesFrom.something) return 'settles something';
  return bits >= settlesFrom.little ? 'settles little' : 'settles hardly anything';
}

/** The same for a test among others: the first of several settles most, which can still be little. */
export function rankWords({ rank, bits }: Pick<TestView, 'rank' | 'bits'>, of: number): string {
  const alone = settlesWords(bits);
  if (rank > 1 || of < 2) return alone;
  return bits >= settlesFrom.something ? 'settles most' : `settles most of these, yet ${alone.slice(8)}`;
}

/** The pending finding that would settle most, where there are several and it is more than little. */
export function settlingMost({ assessment }: Pick<Differential, 'assessment'>): string | null {
  const [first, second] = assessment?.nextTests ?? [];
  return first && second && first.bits >= settlesFrom.something ? first.finding : null;
}

/** "0.17 bits"; below a hundredth not rounded to nothing. */
export function bitsWords(bits: number): string {
  return bits < 0.005 ? 'under 0.01 bits' : `${bits.toFixed(2)} bits`;
}

/** What the whole list says, as the section's title. */
export function headline(tests: readonly TestView[]): string {
  const [first] = tests;
  if (!first) return 'No test can be ranked yet';
  if (first.bits < settlesFrom.little) return 'No test here would settle anything to speak of';
  if (first.bits < settlesFrom.something) return 'No test here would settle much';
  return tests.length === 1
    ? `${first.finding.title} ${settlesWords(first.bits).replace('settles', 'would settle')}`
    : `${first.finding.title} would settle most`;
}

/** How often the first place would go to another candidate. */
export function leaderWords(leaderChanges: number): string {
  return leaderChanges === 0
    ? 'No result would change who is first.'
    : `In ${naturalFrequency(leaderChanges).words} the first place would go to another.`;
}

/** The largest change of any column by any of these results. */
function largestMove(test: Pick<TestView, 'results'>, now: readonly number[], atLeast = 0): number {
  const moves = test.results
    .filter(({ p }) => p >= atLeast)
    .flatMap(({ standing }) => standing.map((share, column) => Math.abs(share - (now[column] ?? 0))));
  return Math.max(0, ...moves);
}

/**
 * A caution about a test that is ordered by habit: nothing it can show moves the standing, or what it will nearly
 * always show does not.
 * @returns null where the test can make a difference that is not rare
 */
export function idleWords(test: Pick<TestView, 'results'>, now: readonly number[]): string | null {
  if (largestMove(test, now) < hardlyMoves) return 'Whatever it shows, the standing hardly moves.';
  const likely = test.results.find(({ p }) => p >= 0.9);
  if (!likely || largestMove({ results: [likely] }, now) >= hardlyMoves) return null;
  return `In ${naturalFrequency(likely.p).words} it shows “${likely.name}”, and then the standing hardly moves.`;
}

export function costWords(cost: number | null): string {
  return cost === null ? 'not said' : cost.toLocaleString('en-GB');
}

export function daysWords(days: number | null): string {
  if (days === null) return 'not said';
  return days === 0 ? 'none' : counted(days, 'day');
}
