import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type TeamMemberInput, teamSchema } from '@weighhouse/shared/contracts/cases';
import { put } from '../../../lib/api';

/** Sets the whole team: whoever is left out is taken off it. */
export function useSetTeam(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (team: TeamMemberInput[]) => put(`/api/cases/${caseId}/team`, teamSchema, team),
    onSuccess: () => client.invalidateQueries({ queryKey: ['case', caseId] }),
  });
}
