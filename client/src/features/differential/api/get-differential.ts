import { queryOptions, useQuery } from '@tanstack/react-query';
import { differentialSchema } from '@weighhouse/shared/contracts/differential';
import { get } from '../../../lib/api';

export const differentialKey = (caseId: string) => ['case', caseId, 'differential'] as const;

export const differentialQuery = (caseId: string) =>
  queryOptions({
    queryKey: differentialKey(caseId),
    queryFn: ({ signal }) => get(`/api/cases/${caseId}/differential`, differentialSchema, signal),
  });

/** Everything the ledger shows, as far as this person may see it. */
export const useDifferential = (caseId: string) => useQuery(differentialQuery(caseId));
