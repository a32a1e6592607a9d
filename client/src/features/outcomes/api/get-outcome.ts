import { queryOptions, useQuery } from '@tanstack/react-query';
import { outcomeSchema } from '@weighhouse/shared/contracts/outcomes';
import { get } from '../../../lib/api';

export const outcomeQuery = (caseId: string) =>
  queryOptions({
    queryKey: ['case', caseId, 'outcome'],
    queryFn: ({ signal }) => get(`/api/cases/${caseId}/outcome`, outcomeSchema.nullable(), signal),
  });

/** What the illness turned out to be; null while it is not known. */
export const useOutcome = (caseId: string) => useQuery(outcomeQuery(caseId));
