import { type JudgementDraftInput, judgementDraftSchema } from '@weighhouse/shared/contracts/judgements';
import { put } from '../../../lib/api';

/** Keeps what was typed on the server, private and not pooled; saving the judgement removes it there. */
export const keepDraft = (caseId: string, draft: JudgementDraftInput) =>
  put(`/api/cases/${caseId}/judgement/drafts/${draft.target}`, judgementDraftSchema, draft);
