import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { meQuery } from '../features/people/api/get-me';
import { useLiveState } from '../lib/live';
import { liveConnection } from '../lib/live-connection';
import { onSessionOver } from '../lib/session';

/**
 * True while requests wait for the person to sign in again. The page stays as it is, hidden, and goes on afterwards.
 */
export function useSessionOver(signedIn: boolean): boolean {
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
    // On every page, not on a case's alone: whoever is deactivated is shown nothing more wherever they are. Where the
    // connection's code cannot be loaded, the next request tells.
    if (signedIn) liveConnection.whenConnected().catch(() => undefined);
  }, [signedIn]);
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
