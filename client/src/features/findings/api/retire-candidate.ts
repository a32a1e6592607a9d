import { useMutation, useQueryClient } from '@tanstack/react-query';
import { candidateSetSchema } from '@weighhouse/shared/contracts/findings';
import { post } from '../../../lib/api';
import { refreshEvidence } from './refresh-evidence';

/** Takes a candidate off the differential, which makes the next version of the candidate set. */
export function useRetireCandidate(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ candidateId, words }: { candidateId: string; words: string }) =>
      post(
        `/api/candidates/${candidateId}/retire`,
        candidateSetSchema,
        words.trim() === '' ? {} : { words: words.trim() },
      ),
    onSuccess: () => refreshEvidence(client, caseId),
  });
}
