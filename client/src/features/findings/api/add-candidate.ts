import { useMutation, useQueryClient } from '@tanstack/react-query';
import { candidateSchema, type NewCandidate } from '@weighhouse/shared/contracts/findings';
import { post } from '../../../lib/api';
import { refreshEvidence } from './refresh-evidence';

/** Adds a candidate, which makes the next version of the candidate set. */
export function useAddCandidate(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: NewCandidate) => post(`/api/cases/${caseId}/candidates`, candidateSchema, body),
    onSuccess: () => refreshEvidence(client, caseId),
  });
}
