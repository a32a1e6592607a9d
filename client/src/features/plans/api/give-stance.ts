import { useMutation, useQueryClient } from '@tanstack/react-query';
import { planViewSchema } from '@weighhouse/shared/contracts/plans';
import { post } from '../../../lib/api';
import { takePlan } from './get-plan';

/** Agrees with the draft (null), or puts dissent on the record in these words. */
export function useGiveStance(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (dissent: string | null) =>
      dissent === null
        ? post(`/api/cases/${caseId}/agree`, planViewSchema)
        : post(`/api/cases/${caseId}/dissent`, planViewSchema, { words: dissent }),
    onSuccess: (view) => {
      takePlan(client, caseId, view);
    },
  });
}
