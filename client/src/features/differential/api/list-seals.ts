import { queryOptions, useQuery } from '@tanstack/react-query';
import { sealListSchema } from '@weighhouse/shared/contracts/rounds';
import { get } from '../../../lib/api';

export const sealsQuery = (caseId: string) =>
  queryOptions({
    queryKey: ['case', caseId, 'seals'],
    queryFn: ({ signal }) => get(`/api/cases/${caseId}/seals`, sealListSchema, signal),
  });

export const useSeals = (caseId: string) => useQuery(sealsQuery(caseId));
