import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { trailSchema } from '@weighhouse/shared/contracts/trail';
import { get } from '../../../lib/api';

export const trailPageSize = 50;

/** One page of the case's trail, newest first. */
export const useTrail = (caseId: string, page: number) =>
  useQuery({
    queryKey: ['case', caseId, 'trail', page],
    queryFn: ({ signal }) =>
      get(
        `/api/cases/${caseId}/trail?page=${String(page)}&size=${String(trailPageSize)}`,
        trailSchema,
        signal,
      ),
    placeholderData: keepPreviousData,
  });
