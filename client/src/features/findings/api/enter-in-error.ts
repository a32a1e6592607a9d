import { useMutation, useQueryClient } from '@tanstack/react-query';
import { findingSchema } from '@weighhouse/shared/contracts/findings';
import { post } from '../../../lib/api';
import { refreshEvidence } from './refresh-evidence';

/** Marks a finding as entered in error: it stays in the trail and is counted nowhere. */
export function useEnterInError(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ findingId, words }: { findingId: string; words: string }) =>
      post(`/api/findings/${findingId}/entered-in-error`, findingSchema, { words }),
    onSuccess: () => refreshEvidence(client, caseId),
  });
}
