import { queryOptions, useQuery } from '@tanstack/react-query';
import { reportListSchema } from '@weighhouse/shared/contracts/reports';
import { get } from '../../../lib/api';

/** The reports a finding can come from; the same query as the reports' own section reads. */
export const useReportsOf = (caseId: string) =>
  useQuery(
    queryOptions({
      queryKey: ['case', caseId, 'reports'],
      queryFn: ({ signal }) => get(`/api/cases/${caseId}/reports`, reportListSchema, signal),
    }),
  );
