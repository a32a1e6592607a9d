import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  type ChangePerson,
  type InvitePerson,
  type Person,
  personSchema,
} from '@weighhouse/shared/contracts/people';
import { isApiError, patch, post } from '../../../lib/api';

const change = (id: string, input: ChangePerson) => patch(`/api/people/${id}`, personSchema, input);

/**
 * Lets a person in or shuts them out. What else changed about them meanwhile makes no difference to that, so a stale
 * version is answered by a second try upon the newest one.
 */
async function setActive({ person, active }: { person: Person; active: boolean }): Promise<Person> {
  try {
    return await change(person.id, { version: person.version, active });
  } catch (error) {
    const newest = isApiError(error, 'stale') ? personSchema.safeParse(error.current).data : undefined;
    if (!newest) throw error;
    return change(person.id, { version: newest.version, active });
  }
}

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
      mutationFn: ({ id, ...input }: ChangePerson & { id: string }) => change(id, input),
      onSettled,
    }),
    setActive: useMutation({ mutationFn: setActive, onSettled }),
    inviteAgain: useMutation({
      mutationFn: (id: string) => post(`/api/people/${id}/invite`, personSchema),
      onSettled,
    }),
  };
}
