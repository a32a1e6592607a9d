import { useMutation, useQueryClient } from '@tanstack/react-query';
import { roundSchema } from '@weighhouse/shared/contracts/rounds';
import { post } from '../../../lib/api';
import { refreshDifferential } from './refresh-differential';

/** Shows everybody the numbers of a sealed round; below the quorum only with a reason. */
export function useUnsealRound(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ roundId, reason }: { roundId: string; reason?: string }) =>
      post(`/api/rounds/${roundId}/unseal`, roundSchema, reason === undefined ? {} : { reason }),
    onSuccess: () => refreshDifferential(client, caseId),
  });
}
