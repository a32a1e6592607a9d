import type { Case } from '@weighhouse/shared/contracts/cases';
import type { Certainty } from '@weighhouse/shared/contracts/plans';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';

/** The certainties of HL7 FHIR R4 condition-ver-status, as a sentence of a letter. */
export const certaintyWords: Record<Certainty, string> = {
  unconfirmed: 'Unconfirmed: not enough evidence yet to treat it as the diagnosis',
  provisional: 'Provisional: the best explanation so far, acted on and still being tested',
  differential: 'Differential: one of several possible diagnoses',
  confirmed: 'Confirmed: enough evidence to treat it as the diagnosis',
};

/** The patient as the case shows them: by age and sex, never by name. */
export function patientWords({ age, sex }: Pick<Case, 'age' | 'sex'>): string {
  const years = age === null ? 'age not given' : `${String(age)} years`;
  return sex === null || sex === 'unknown' ? years : `${years}, ${sex}`;
}

/** "62 of 100, between 41 and 80". Shares from 0 to 1. */
export function shareWords(share: number, range?: { low: number; high: number }): string {
  const { words } = naturalFrequency(share);
  if (!range) return words;
  const [low, high] = [naturalFrequency(range.low).outOf100, naturalFrequency(range.high).outOf100];
  return low === high ? words : `${words}, between ${String(low)} and ${String(high)}`;
}

const longDay = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });

/** @param day YYYY-MM-DD, a calendar day without a time zone */
export const dayWords = (day: string): string => longDay.format(new Date(`${day}T00:00:00Z`));

/** The day of a moment where the service's dates are shown. */
export const momentWords = (moment: string, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone }).format(new Date(moment));
