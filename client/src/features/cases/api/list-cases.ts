import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { type CaseQuery, caseListSchema } from '@weighhouse/shared/contracts/cases';
import { get } from '../../../lib/api';
import { searchOf } from '../components/case-query';

/** One page of the cases that this person may see, sorted and filtered by the server. */
export const useCases = (query: CaseQuery) =>
  useQuery({
    queryKey: ['cases', query],
    queryFn: ({ signal }) => get(`/api/cases?${searchOf(query).toString()}`, caseListSchema, signal),
    placeholderData: keepPreviousData,
  });
