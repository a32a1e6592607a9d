import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type JudgeFinding, savedJudgementSchema } from '@weighhouse/shared/contracts/judgements';
import { isApiError, put } from '../../../lib/api';
import { refreshDifferential, takeOwnVersion } from './refresh-differential';

/** Saves one's own likelihoods of a row as a new version; every cell null takes the row's judgement back. */
export function useSaveRowJudgement(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ findingId, ...body }: JudgeFinding & { findingId: string }) =>
      put(`/api/cases/${caseId}/judgement/findings/${findingId}`, savedJudgementSchema, body),
    onSuccess: ({ version }) => {
      takeOwnVersion(client, caseId, version);
      return refreshDifferential(client, caseId);
    },
    // What is new has to be on the screen before anybody can choose.
    onError: (error) => (isApiError(error, 'stale') ? refreshDifferential(client, caseId) : undefined),
  });
}
