import { useMutation, useQueryClient } from '@tanstack/react-query';
import { meSchema, type SignIn } from '@weighhouse/shared/contracts/people';
import { request } from '../../../lib/api';
import { keepFor } from '../../../lib/kept';
import { liveConnection } from '../../../lib/live-connection';
import { decideSession } from '../../../lib/session';
import { meQuery } from './get-me';
import { leaveNothing } from './leave-nothing';

const signIn = (body: SignIn) => request('POST', '/api/session', { schema: meSchema, body, wait: false });

/** Signs in. What somebody else's session left in the cache goes; requests that waited for this person go on. */
export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: signIn,
    onSuccess: (me) => {
      const before = client.getQueryData(meQuery.queryKey);
      const same = before?.id === me.id;
      keepFor(me.id);
      if (!same) leaveNothing(client);
      client.setQueryData(meQuery.queryKey, me);
      decideSession(same);
      liveConnection.connectAgain();
    },
  });
}
