import { type Case, changeDraftSchema, sexSchema, urgencySchema } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { z } from 'zod';
import { faultsIn } from '../../../components/faults';
import type { DraftChange } from '../api/draft';

/** The referral as it is typed: everything may be half done. */
export const formSchema = z.object({
  question: z.string(),
  age: z.string(),
  sex: z.union([sexSchema, z.literal('')]),
  urgency: z.union([urgencySchema, z.literal('')]),
  urgencyReason: z.string(),
  consentHow: z.enum(['signed', 'spoken', '']),
  consentOn: z.string(),
  historyHtml: z.string(),
});
export type DraftForm = z.infer<typeof formSchema>;

type Source = Pick<
  Case,
  'question' | 'age' | 'sex' | 'urgency' | 'urgencyReason' | 'consent' | 'historyHtml'
>;

export function formOf(of: Source): DraftForm {
  return {
    question: of.question,
    age: of.age === null ? '' : String(of.age),
    sex: of.sex ?? '',
    urgency: of.urgency ?? '',
    urgencyReason: of.urgencyReason,
    consentHow: of.consent?.given === true ? of.consent.how : '',
    consentOn: of.consent?.givenOn ?? '',
    historyHtml: of.historyHtml,
  };
}

/** Names of the fields by their path in the contract. */
export const draftLabels: Readonly<Record<string, string>> = {
  question: 'Question',
  age: 'Age',
  sex: 'Sex',
  urgency: 'Urgency',
  urgencyReason: 'Why so urgent',
  consent: 'Consent',
  historyHtml: 'History',
  history: 'History',
  identity: 'Identity card',
};

function age(text: string): number | null {
  if (text.trim() === '') return null;
  return /^\d+$/.test(text.trim()) ? Number(text.trim()) : Number.NaN;
}

function consent({ consentHow, consentOn }: DraftForm): DraftChange['consent'] {
  if (consentHow === '') return null;
  return { given: true, how: consentHow, givenOn: consentOn };
}

/**
 * What of the form can be sent and what is wrong with the rest. A field with a fault is held back, so that it does not
 * keep the others from being saved. A consent without its day is half done, not wrong: it is held back without a fault.
 * @param keys the fields that changed
 */
export function changeOf(
  form: DraftForm,
  keys: ReadonlySet<keyof DraftForm>,
): { change: DraftChange; faults: FieldFault[] } {
  const consentChanged = keys.has('consentHow') || keys.has('consentOn');
  const consentHalf = form.consentHow !== '' && form.consentOn === '';
  const change: DraftChange = {
    ...(keys.has('question') && { question: form.question }),
    ...(keys.has('age') && { age: age(form.age) }),
    ...(keys.has('sex') && { sex: form.sex === '' ? null : form.sex }),
    ...(keys.has('urgency') && { urgency: form.urgency === '' ? null : form.urgency }),
    ...(keys.has('urgencyReason') && { urgencyReason: form.urgencyReason }),
    ...(consentChanged && !consentHalf && { consent: consent(form) }),
    ...(keys.has('historyHtml') && { historyHtml: form.historyHtml }),
  };
  const faults = faultsIn(changeDraftSchema, { version: 0, ...change });
  const wrong = new Set(faults.map((fault) => fault.path.split('.')[0]));
  const sound = Object.entries(change).filter(([key]) => !wrong.has(key));
  return { change: Object.fromEntries(sound), faults };
}

/** The fields in which two states of the form differ. */
export function differences(mine: DraftForm, theirs: DraftForm): (keyof DraftForm)[] {
  return (Object.keys(mine) as (keyof DraftForm)[]).filter((key) => mine[key] !== theirs[key]);
}

/** Two people's texts together: each field as the one who changed it left it, and mine where both did. */
export function merged(mine: DraftForm, theirs: DraftForm, base: DraftForm): DraftForm {
  const changed = differences(mine, base).map((key) => [key, mine[key]]);
  return { ...theirs, ...(Object.fromEntries(changed) as Partial<DraftForm>) };
}
