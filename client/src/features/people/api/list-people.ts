import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { personListSchema, type Role } from '@weighhouse/shared/contracts/people';
import { get } from '../../../lib/api';

export interface PeopleQuery {
  role?: Role | undefined;
  q?: string | undefined;
}

/** People by role and by words of their name, specialty or centre. */
export function usePeople(query: PeopleQuery) {
  const search = new URLSearchParams();
  if (query.role) search.set('role', query.role);
  if (query.q) search.set('q', query.q);
  return useQuery({
    queryKey: ['people', query],
    queryFn: ({ signal }) => get(`/api/people?${search.toString()}`, personListSchema, signal),
    placeholderData: keepPreviousData,
  });
}
