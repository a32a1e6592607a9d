import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type ChangeFinding, findingSchema } from '@weighhouse/shared/contracts/findings';
import { isApiError, patch } from '../../../lib/api';
import { refreshEvidence } from './refresh-evidence';

export function useChangeFinding(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ findingId, ...body }: ChangeFinding & { findingId: string }) =>
      patch(`/api/findings/${findingId}`, findingSchema, body),
    onSuccess: () => refreshEvidence(client, caseId),
    onError: (error) => (isApiError(error, 'stale') ? refreshEvidence(client, caseId) : undefined),
  });
}
