import { useQueryClient } from '@tanstack/react-query';
import { type Summary, type SummaryInput, summarySchema } from '@weighhouse/shared/contracts/summaries';
import { type ApiError, put } from '../../../lib/api';
import { takeSummary } from './get-summary';

/** Saves the text with the version it was written upon; `ready` hands it to the chair. */
export function useSaveSummary(caseId: string) {
  const client = useQueryClient();
  return async (input: SummaryInput): Promise<Summary> => {
    const summary = await put(`/api/cases/${caseId}/summary`, summarySchema, input);
    takeSummary(client, summary);
    return summary;
  };
}

/** The summary in a `stale` refusal. */
export function staleSummary(error: ApiError): Summary | null {
  return summarySchema.safeParse(error.current).data ?? null;
}
