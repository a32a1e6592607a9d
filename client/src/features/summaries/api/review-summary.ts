import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type Summary, summarySchema } from '@weighhouse/shared/contracts/summaries';
import { post } from '../../../lib/api';
import { takeSummary } from './get-summary';

/** The chair approves the version that is on the screen. */
export function useApproveSummary(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (version: number) => post(`/api/cases/${caseId}/summary/approve`, summarySchema, { version }),
    onSuccess: (summary: Summary) => {
      takeSummary(client, summary);
    },
  });
}

/** The chair asks for changes, in words. */
export function useReturnSummary(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (words: string) => post(`/api/cases/${caseId}/summary/return`, summarySchema, { words }),
    onSuccess: (summary: Summary) => {
      takeSummary(client, summary);
    },
  });
}
