import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type openRoundSchema, roundSchema } from '@weighhouse/shared/contracts/rounds';
import type { z } from 'zod';
import { post } from '../../../lib/api';
import { refreshDifferential } from './refresh-differential';

export function useOpenRound(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: z.input<typeof openRoundSchema>) =>
      post(`/api/cases/${caseId}/rounds`, roundSchema, body),
    onSuccess: () => refreshDifferential(client, caseId),
  });
}
