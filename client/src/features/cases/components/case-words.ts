import type { CaseListItem, CaseState, Part, Sex, Urgency } from '@weighhouse/shared/contracts/cases';

/** The words of the field, the same on every screen. */
export const stateWords: Record<CaseState, string> = {
  draft: 'Draft',
  submitted: 'Submitted, waits for a chair',
  returned: 'Returned to the referrer',
  accepted: 'Accepted, judging not begun',
  judging: 'Judging',
  concluded: 'Concluded with a plan',
  outcomeKnown: 'Outcome known',
  declined: 'Declined',
  withdrawn: 'Withdrawn',
};

export const urgencyWords: Record<Urgency, string> = {
  withinWeek: 'within 1 week',
  withinTwoWeeks: 'within 2 weeks',
  withinMonth: 'within 1 month',
  noFixedTime: 'no fixed time',
};

export const sexWords: Record<Sex, string> = {
  female: 'female',
  male: 'male',
  other: 'other',
  unknown: 'not known',
};

export const partWords: Record<Part, string> = {
  referrer: 'referrer',
  contributor: 'contributor',
  chair: 'chair',
  liaison: 'liaison',
};

const adult = 18;
const people: Record<Sex, [young: string, grown: string]> = {
  female: ['girl', 'woman'],
  male: ['boy', 'man'],
  other: ['other sex', 'other sex'],
  unknown: ['sex not known', 'sex not known'],
};

/** "34, man", "9, girl", "age not given". */
export function patientWords({ age, sex }: { age: number | null; sex: Sex | null }): string {
  const years = age === null ? 'age not given' : String(age);
  if (sex === null) return years;
  return `${years}, ${people[sex][age !== null && age < adult ? 0 : 1]}`;
}

type Standing = Pick<CaseListItem, 'state' | 'round'>;

/** What is so on the case, with its round: "Round 1, sealed. 2 of 5 in." */
export function stateLine({ state, round }: Standing): string {
  if (state !== 'judging' || !round) return `${stateWords[state]}.`;
  const name = `Round ${String(round.number)}`;
  if (!round.open) return `${name}, ${round.kind}, is over.`;
  return `${name}, ${round.kind}. ${String(round.handedIn)} of ${String(round.contributors)} in.`;
}
