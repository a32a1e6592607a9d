import { queryOptions, useQuery } from '@tanstack/react-query';
import { reportListSchema } from '@weighhouse/shared/contracts/reports';
import { get } from '../../../lib/api';

export const reportsQuery = (caseId: string) =>
  queryOptions({
    queryKey: ['case', caseId, 'reports'],
    queryFn: ({ signal }) => get(`/api/cases/${caseId}/reports`, reportListSchema, signal),
  });

export const useReports = (caseId: string) => useQuery(reportsQuery(caseId));

/** Where a report's content is read; it answers ranges. */
export const contentPath = (reportId: string) => `/api/reports/${reportId}/content`;
