import { useState } from 'react';
import { z } from 'zod';
import { forget, keep, kept } from '../../../lib/kept';

const textSchema = z.object({
  /** A candidate's id, `none`, or empty while nothing is chosen. */
  candidate: z.string(),
  diagnosis: z.string(),
  howKnown: z.string(),
  knownOn: z.string(),
});
type OutcomeText = z.infer<typeof textSchema>;
const empty: OutcomeText = { candidate: '', diagnosis: '', howKnown: '', knownOn: '' };

/** What is typed of an outcome, kept in this browser until it is recorded. */
export function useOutcomeText(caseId: string): [OutcomeText, (text: OutcomeText) => void, () => void] {
  const key = `outcome.${caseId}`;
  const [text, setText] = useState(() => textSchema.safeParse(kept(key)).data ?? empty);
  return [
    text,
    (next) => {
      setText(next);
      keep(key, next);
    },
    () => {
      forget(key);
    },
  ];
}
