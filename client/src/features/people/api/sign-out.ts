import { useMutation, useQueryClient } from '@tanstack/react-query';
import { doneSchema } from '@weighhouse/shared/contracts/common';
import { request } from '../../../lib/api';
import { forgetAll } from '../../../lib/kept';
import { liveConnection } from '../../../lib/live-connection';
import { decideSession } from '../../../lib/session';
import { meQuery } from './get-me';
import { leaveNothing } from './leave-nothing';

/** Ends this session, or all of one's own. Nothing of the person stays in this browser. */
export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ everywhere }: { everywhere: boolean }) =>
      request('DELETE', everywhere ? '/api/sessions' : '/api/session', {
        schema: doneSchema,
        wait: false,
      }),
    onSuccess: () => {
      liveConnection.close();
      forgetAll();
      decideSession(false);
      client.setQueryData(meQuery.queryKey, null);
      leaveNothing(client);
    },
  });
}
