import { useMutation, useQueryClient } from '@tanstack/react-query';
import { roundSchema } from '@weighhouse/shared/contracts/rounds';
import { post } from '../../../lib/api';
import { refreshDifferential } from './refresh-differential';

export function useCloseRound(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (roundId: string) => post(`/api/rounds/${roundId}/close`, roundSchema, {}),
    onSuccess: () => refreshDifferential(client, caseId),
  });
}
