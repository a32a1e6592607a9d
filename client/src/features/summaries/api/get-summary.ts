import { queryOptions, type QueryClient, useQuery } from '@tanstack/react-query';
import { type Summary, summarySchema } from '@weighhouse/shared/contracts/summaries';
import { get } from '../../../lib/api';

export const summaryQuery = (caseId: string) =>
  queryOptions({
    queryKey: ['case', caseId, 'summary'],
    queryFn: ({ signal }) => get(`/api/cases/${caseId}/summary`, summarySchema, signal),
  });

/** The text that the patient is told from, as far as this person may see it. */
export const useSummary = (caseId: string) => useQuery(summaryQuery(caseId));

/** Puts a change's answer on the screen; the lists that may have changed with it are read again. */
export function takeSummary(client: QueryClient, summary: Summary): void {
  // A reading that began before the change would bring the older text back.
  void client.cancelQueries({ queryKey: summaryQuery(summary.caseId).queryKey });
  client.setQueryData(summaryQuery(summary.caseId).queryKey, summary);
  void client.invalidateQueries({ queryKey: ['tell'] });
  void client.invalidateQueries({ queryKey: ['today'] });
  void client.invalidateQueries({ queryKey: ['case', summary.caseId, 'trail'] });
}
