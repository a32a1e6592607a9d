import type { Finding } from '@weighhouse/shared/contracts/findings';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import type { Column } from '../model/columns';
import { isTwoLevel, levelName } from '../model/finding-words';
import { factorOf } from './comparison';

/** Odds as two small whole numbers: "about 3 to 2", "about even". Within six in a hundred,
 * above 3 to 1 within ten: our own measure. */
export function oddsWords(odds: number): string {
  if (!(odds > 0) || !Number.isFinite(odds)) return 'beyond 99 to 1';
  const larger = Math.max(odds, 1 / odds);
  if (larger > 99) return odds > 1 ? 'more than 99 to 1' : 'less than 1 to 99';
  const [one, other] = smallNumbers(larger);
  if (one === other) return 'about even';
  return odds > 1 ? `about ${String(one)} to ${String(other)}` : `about ${String(other)} to ${String(one)}`;
}

function smallNumbers(ratio: number): [number, number] {
  for (const below of [1, 2, 3, 4, 5]) {
    const above = Math.round(ratio * below);
    if (Math.abs(Math.log(above / below / ratio)) <= Math.log(ratio < 3 ? 1.06 : 1.1)) return [above, below];
  }
  return [Math.round(ratio * 10), 10];
}

/** How many times, with as many digits as it has: "1.4", "3", "25", "more than 100". */
export function timesWords(times: number): string {
  if (times > 100) return 'more than 100';
  return times < 2.95 ? times.toFixed(1).replace('.0', '') : String(Math.round(times));
}

/** A push on the scale of the sum, with its sign: "+2.1", "−0.4", "0.0". */
export function signed(decibans: number): string {
  const words = Math.abs(decibans).toFixed(1);
  if (words === '0.0') return words;
  return `${decibans > 0 ? '+' : '−'}${words}`;
}

/** How a column is called inside a sentence. */
export const columnWord = (column: Column): string => (column.none ? 'none of these' : column.letter);

/** "Counts for", "Counts against" or "Counts neither way", with how many times as often it counts as: less than it is seen, by tempering. */
export function countsWords(decibans: number): string {
  if (Math.abs(decibans) < 0.05) return 'Counts neither way';
  const times = timesWords(factorOf(Math.abs(decibans)));
  const word = decibans > 0 ? 'for' : 'against';
  return times === '1' ? `Counts a little ${word}` : `Counts ${word}, as ${times} times`;
}

/**
 * What was observed, between two columns: "Seen about 4 times as often in A as in B: 62 and 15 of 100."
 * @param here P(observed | the candidate), as pooled
 * @param there P(observed | the other)
 */
export function oftenWords(
  finding: Finding,
  [here, there]: readonly [number, number],
  [one, other]: readonly [Column, Column],
): string {
  const seen = seenWords(finding);
  const figures = (first: number, second: number) =>
    `${String(naturalFrequency(first).outOf100)} and ${naturalFrequency(second).words}`;
  const [more, less] = here >= there ? [one, other] : [other, one];
  const [high, low] = here >= there ? [here, there] : [there, here];
  const times = timesWords(high / low);
  if (times === '1')
    return `${seen} about as often in ${columnWord(one)} as in ${columnWord(other)}: ${figures(here, there)}.`;
  const about = times.startsWith('more') ? times : `about ${times}`;
  return `${seen} ${about} times as often in ${columnWord(more)} as in ${columnWord(less)}: ${figures(high, low)}.`;
}

/** What was observed in one column alone: "Seen in 62 of 100 with A." */
export const seenIn = (finding: Finding, share: number, column: Column): string =>
  `${seenWords(finding)} in ${naturalFrequency(share).words} with ${columnWord(column)}.`;

function seenWords(finding: Finding): string {
  const level = finding.observed ?? 1;
  if (!isTwoLevel(finding)) return `“${levelName(finding, level)}” is seen`;
  return level === 0 ? 'Missing' : 'Seen';
}

/** What a step does to the candidate's own share: "29 becomes 41 of 100". */
export function becomesWords(from: number, to: number): string {
  const [before, after] = [naturalFrequency(from), naturalFrequency(to)];
  return before.outOf100 === after.outOf100
    ? `Stays at ${after.words}.`
    : `${String(before.outOf100)} becomes ${after.words}.`.replace(/^u/, 'U').replace(/^o/, 'O');
}
