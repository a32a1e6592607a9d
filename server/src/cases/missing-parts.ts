import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { CaseFile } from './case-file.entity.js';
import { hasWords } from './history-html.js';

type Draft = Pick<CaseFile, 'question' | 'age' | 'sex' | 'urgency' | 'consentGiven' | 'historyHtml'>;

/** What a draft still needs before it can be submitted, in the order of the form; empty when nothing is missing. */
export function missingParts(draft: Draft): FieldFault[] {
  const parts: [boolean, string, string][] = [
    [
      draft.question.trim() === '',
      'question',
      'The question is missing: one sentence that you want answered.',
    ],
    [draft.age === null, 'age', 'The age is missing.'],
    [draft.sex === null, 'sex', 'The sex is missing.'],
    [draft.consentGiven === null, 'consent', 'Whether the patient consents is not recorded.'],
    [draft.consentGiven === false, 'consent', 'Without the patient’s consent the case cannot be submitted.'],
    [draft.urgency === null, 'urgency', 'How soon an answer is needed is not said.'],
    [!hasWords(draft.historyHtml), 'historyHtml', 'The history is missing.'],
  ];
  return parts.filter(([missing]) => missing).map(([, path, message]) => ({ path, message }));
}
