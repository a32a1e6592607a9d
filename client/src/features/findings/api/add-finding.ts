import { useMutation, useQueryClient } from '@tanstack/react-query';
import { findingSchema, type newFindingSchema } from '@weighhouse/shared/contracts/findings';
import type { z } from 'zod';
import { post } from '../../../lib/api';
import { refreshEvidence } from './refresh-evidence';

export function useAddFinding(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: z.input<typeof newFindingSchema>) =>
      post(`/api/cases/${caseId}/findings`, findingSchema, body),
    onSuccess: () => refreshEvidence(client, caseId),
  });
}
