import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type ContactInput, type Summary, summarySchema } from '@weighhouse/shared/contracts/summaries';
import { post } from '../../../lib/api';
import { takeSummary } from './get-summary';

/** Logs a contact with the patient; `told` is the one in which the approved summary was told. */
export function useLogContact(caseId: string, told: boolean) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (contact: ContactInput) =>
      post(`/api/cases/${caseId}/${told ? 'summary/told' : 'summary/contacts'}`, summarySchema, contact),
    onSuccess: (summary: Summary) => {
      takeSummary(client, summary);
      if (told) void client.invalidateQueries({ queryKey: ['case', caseId, 'case'] });
    },
  });
}
