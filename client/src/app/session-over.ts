import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { meQuery } from '../features/people/api/get-me';
import { useLiveState } from '../lib/live';
import { onSessionOver } from '../lib/session';

/**
 * True while requests wait for the person to sign in again. The page stays as it is, hidden, and goes on afterwards.
 */
export function useSessionOver(): boolean {
  const client = useQueryClient();
  const [over, setOver] = useState(false);
  useEffect(
    () =>
      onSessionOver(() => {
        setOver(true);
      }),
    [],
  );
  const live = useLiveState();
  useEffect(() => {
    // The server closes the connection of a session that has ended: ask, so that the page says so at once.
    if (live === 'reconnecting') void client.invalidateQueries({ queryKey: meQuery.queryKey });
  }, [client, live]);
  useEffect(
    () =>
      client.getQueryCache().subscribe((event) => {
        if (
          event.type === 'updated' &&
          event.action.type === 'success' &&
          (event.query.queryKey as readonly unknown[])[0] === meQuery.queryKey[0]
        )
          setOver(false);
      }),
    [client],
  );
  return over;
}
