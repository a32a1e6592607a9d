import { useMutation, useQueryClient } from '@tanstack/react-query';
import { planViewSchema } from '@weighhouse/shared/contracts/plans';
import { post } from '../../../lib/api';
import { takePlan } from './get-plan';

/** Asks every contributor for agreement or dissent with the draft as it stands. */
export function useAskContributors(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => post(`/api/cases/${caseId}/plan/ask`, planViewSchema),
    onSuccess: (view) => {
      takePlan(client, caseId, view);
    },
  });
}
