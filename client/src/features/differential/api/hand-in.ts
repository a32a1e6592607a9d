import { useMutation, useQueryClient } from '@tanstack/react-query';
import { handInSchema, type handInInputSchema } from '@weighhouse/shared/contracts/rounds';
import type { z } from 'zod';
import { post } from '../../../lib/api';
import { refreshDifferential } from './refresh-differential';

/** Hands one's judgement in for the round; the answer carries the digest of its seal. */
export function useHandIn(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ roundId, ...body }: z.input<typeof handInInputSchema> & { roundId: string }) =>
      post(`/api/rounds/${roundId}/hand-in`, handInSchema, body),
    onSuccess: () => refreshDifferential(client, caseId),
  });
}
