import type { ChangeSettings, Settings } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { numberWord } from '../../../lib/words';

export type Pair = Settings['together'][number];
type PairInput = NonNullable<ChangeSettings['together']>[number];

/** A pair that goes together or avoids each other, as its form holds it. */
export interface PairValues {
  a: string;
  b: string;
  /** As typed: A makes B so many times as likely. */
  times: string;
  reason: string;
}

export const emptyPair: PairValues = { a: '', b: '', times: '', reason: '' };

export const valuesOfPair = ({ a, b, times, reason }: Pair): PairValues => ({
  a,
  b,
  times: String(times),
  reason,
});

export const samePair = (one: { a: string; b: string }, other: { a: string; b: string }) =>
  (one.a === other.a && one.b === other.b) || (one.a === other.b && one.b === other.a);

/**
 * The list with one pair added, or changed where it is there already.
 * @param editing the pair that the form was opened with; null for a new one
 */
export function withPair(
  pairs: readonly Pair[],
  values: PairValues,
  editing: Pair | null,
): { together: PairInput[]; faults: FieldFault[] } {
  const faults: FieldFault[] = [];
  const others = pairs.filter((pair) => editing === null || !samePair(pair, editing));
  const times = Number(values.times.trim().replace(',', '.'));
  if (values.a === '') faults.push({ path: 'pair.a', message: 'choose a candidate' });
  if (values.b === '') faults.push({ path: 'pair.b', message: 'choose a candidate' });
  else if (values.a === values.b) faults.push({ path: 'pair.b', message: 'choose another one' });
  else if (others.some((pair) => samePair(pair, values)))
    faults.push({ path: 'pair.b', message: 'this pair is in the list already: change it there' });
  if (values.times.trim() === '' || !Number.isFinite(times) || times < 0 || times > 100)
    faults.push({ path: 'pair.times', message: 'must be a number from 0 to 100' });
  if (values.reason.trim() === '') faults.push({ path: 'pair.reason', message: 'say why' });
  const added = { a: values.a, b: values.b, times, reason: values.reason.trim() };
  return { together: [...others, added], faults };
}

/** The list without a pair. */
export const withoutPair = (pairs: readonly Pair[], pair: Pair): PairInput[] =>
  pairs.filter((one) => !samePair(one, pair));

/** "Lymphoma makes tuberculosis three times as likely". */
export function pairSentence(a: string, b: string, times: number): string {
  if (times === 0) return `${a} and ${b} are never there together`;
  if (times === 1) return `${a} makes ${b} neither more nor less likely`;
  return `${a} makes ${b} ${timesWords(times)} as likely`;
}

function timesWords(times: number): string {
  if (times === 2) return 'twice';
  if (times === 0.5) return 'half';
  const figure = Number.isInteger(times) ? numberWord(times) : String(times);
  return times < 1 ? `only ${figure} times` : `${figure} times`;
}

/** Reads the share of patients with two or more, out of 100, as it is typed. */
export function readCoexistence(text: string): { share: number } | { fault: string } {
  const typed = text.trim().replace(',', '.');
  const value = Number(typed);
  if (typed === '' || !Number.isFinite(value) || value < 0 || value > 50)
    return { fault: 'must be a number from 0 to 50' };
  return { share: Math.round(value * 10) / 1000 };
}
