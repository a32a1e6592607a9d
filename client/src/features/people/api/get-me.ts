import { queryOptions, useQuery } from '@tanstack/react-query';
import { type Me, meSchema } from '@weighhouse/shared/contracts/people';
import { isApiError, request } from '../../../lib/api';
import { keepFor } from '../../../lib/kept';

/**
 * Who is signed in; null for nobody.
 * @param known somebody is on this page already: then a session that is over is waited out as for every other request,
 *   because leaving the page would lose what stands on it
 */
async function getMe(signal: AbortSignal, known: boolean): Promise<Me | null> {
  try {
    const me = await request('GET', '/api/session', { schema: meSchema, signal, wait: known });
    keepFor(me.id);
    return me;
  } catch (error) {
    if (isApiError(error) && error.status === 401 && !known) return null;
    throw error;
  }
}

const key = ['me'] as const;

export const meQuery = queryOptions({
  queryKey: key,
  queryFn: ({ client, signal }) => getMe(signal, client.getQueryData<Me | null>(key) != null),
  staleTime: 60_000,
});

export const useMe = () => useQuery(meQuery);

/** The signed-in person, inside the shell, where there always is one. */
export function useSignedIn(): Me {
  const { data } = useMe();
  if (!data) throw new Error('used outside the shell');
  return data;
}
