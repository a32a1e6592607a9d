import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type JudgePrior, savedJudgementSchema } from '@weighhouse/shared/contracts/judgements';
import { isApiError, put } from '../../../lib/api';
import { refreshDifferential, takeOwnVersion } from './refresh-differential';

/** Saves one's own prior as a new version. */
export function useSavePrior(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: JudgePrior) => put(`/api/cases/${caseId}/judgement/prior`, savedJudgementSchema, body),
    onSuccess: ({ version }) => {
      takeOwnVersion(client, caseId, version);
      return refreshDifferential(client, caseId);
    },
    // What is new has to be on the screen before anybody can choose.
    onError: (error) => (isApiError(error, 'stale') ? refreshDifferential(client, caseId) : undefined),
  });
}
