import { queryOptions, useQuery } from '@tanstack/react-query';
import { todaySchema } from '@weighhouse/shared/contracts/today';
import { get } from '../../../lib/api';

export const todayQuery = queryOptions({
  queryKey: ['today'],
  queryFn: ({ signal }) => get('/api/today', todaySchema, signal),
  // Nobody pushes to a person who has no case open: a minute is soon enough for a list of what waits.
  refetchInterval: 60_000,
});

export const useToday = () => useQuery(todayQuery);
