import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type ChangePerson, type InvitePerson, personSchema } from '@weighhouse/shared/contracts/people';
import { patch, post } from '../../../lib/api';

/** Inviting, changing and inviting again; the lists of people are read anew afterwards. */
export function useChangePeople() {
  const client = useQueryClient();
  // Also after a refusal: somebody else may have changed the person meanwhile.
  const onSettled = () => client.invalidateQueries({ queryKey: ['people'] });
  return {
    invite: useMutation({
      mutationFn: (person: InvitePerson) => post('/api/people', personSchema, person),
      onSettled,
    }),
    change: useMutation({
      mutationFn: ({ id, ...change }: ChangePerson & { id: string }) =>
        patch(`/api/people/${id}`, personSchema, change),
      onSettled,
    }),
    inviteAgain: useMutation({
      mutationFn: (id: string) => post(`/api/people/${id}/invite`, personSchema),
      onSettled,
    }),
  };
}
