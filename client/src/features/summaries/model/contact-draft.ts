import { type ContactInput, contactInputSchema } from '@weighhouse/shared/contracts/summaries';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { z } from 'zod';

/** A contact while it is written; empty text where nothing is chosen yet. */
export const contactDraftSchema = z.object({
  /** As in a datetime-local field, in the person's own time zone. */
  at: z.string(),
  how: z.enum(['', 'meeting', 'telephone', 'video', 'letter']),
  reached: z.enum(['', 'yes', 'no']),
  understood: z.enum(['', 'yes', 'partly', 'no']),
  questions: z.string(),
  notes: z.string(),
});
export type ContactDraft = z.infer<typeof contactDraftSchema>;
export const emptyContact: ContactDraft = {
  at: '',
  how: '',
  reached: '',
  understood: '',
  questions: '',
  notes: '',
};

interface Checked {
  contact: ContactInput | null;
  faults: FieldFault[];
}

/**
 * A contact as the contract takes it, or everything that is wrong with it. A contact that tells must have reached the
 * patient and says how far it was understood.
 * @param fromField reads the field's clock in the person's time zone; null when it is no time
 */
export function checkContact(
  draft: ContactDraft,
  telling: boolean,
  now: string,
  fromField: (text: string) => string | null,
): Checked {
  const at = fromField(draft.at);
  const reached = telling || draft.reached === 'yes';
  const faults: FieldFault[] = [];
  if (at === null) faults.push({ path: 'at', message: 'must be a date and time' });
  else if (Date.parse(at) > Date.parse(now))
    faults.push({ path: 'at', message: 'must not be in the future' });
  if (draft.how === '') faults.push({ path: 'how', message: 'must be chosen' });
  if (!telling && draft.reached === '') faults.push({ path: 'reached', message: 'must be chosen' });
  if (reached && draft.understood === '') faults.push({ path: 'understood', message: 'must be chosen' });
  const parsed = contactInputSchema.safeParse({
    at,
    how: draft.how,
    reached,
    understood: reached && draft.understood !== '' ? draft.understood : null,
    questions: reached ? draft.questions : '',
    notes: draft.notes,
  });
  if (faults.length > 0) return { contact: null, faults };
  if (parsed.success) return { contact: parsed.data, faults };
  return {
    contact: null,
    faults: parsed.error.issues.map(({ path, message }) => ({ path: path.map(String).join('.'), message })),
  };
}
