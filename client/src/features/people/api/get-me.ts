import { queryOptions, useQuery } from '@tanstack/react-query';
import { type Me, meSchema } from '@weighhouse/shared/contracts/people';
import { isApiError, request } from '../../../lib/api';

/** Who is signed in; null for nobody. */
async function getMe(signal: AbortSignal): Promise<Me | null> {
  try {
    return await request('GET', '/api/session', { schema: meSchema, signal, wait: false });
  } catch (error) {
    if (isApiError(error) && error.status === 401) return null;
    throw error;
  }
}

export const meQuery = queryOptions({
  queryKey: ['me'],
  queryFn: ({ signal }) => getMe(signal),
  staleTime: 60_000,
});

export const useMe = () => useQuery(meQuery);

/** The signed-in person, inside the shell, where there always is one. */
export function useSignedIn(): Me {
  const { data } = useMe();
  if (!data) throw new Error('used outside the shell');
  return data;
}
