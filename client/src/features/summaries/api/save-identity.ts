import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type IdentityInput, identitySchema } from '@weighhouse/shared/contracts/summaries';
import { put } from '../../../lib/api';

/** Saves the card with the version one last saw. @throws ApiError `stale` with the newer card */
export function useSaveIdentity(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: IdentityInput) => put(`/api/cases/${caseId}/identity`, identitySchema, input),
    onSuccess: () => {
      // What is missing for submitting is said by the case.
      void client.invalidateQueries({ queryKey: ['case', caseId, 'case'] });
    },
  });
}
