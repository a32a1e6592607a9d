import { queryOptions, useQuery } from '@tanstack/react-query';
import { tellListSchema } from '@weighhouse/shared/contracts/summaries';
import { get } from '../../../lib/api';

export const tellListQuery = queryOptions({
  queryKey: ['tell'],
  queryFn: ({ signal }) => get('/api/tell', tellListSchema, signal),
  // Nobody pushes to a liaison who has no case open.
  refetchInterval: 60_000,
});

export const useTellList = () => useQuery(tellListQuery);
