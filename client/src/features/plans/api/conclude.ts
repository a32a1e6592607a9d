import { useMutation, useQueryClient } from '@tanstack/react-query';
import { planViewSchema } from '@weighhouse/shared/contracts/plans';
import { post } from '../../../lib/api';
import { takePlan } from './get-plan';

/** Signs the draft and closes the case with it. */
export function useConclude(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (password: string) => post(`/api/cases/${caseId}/conclude`, planViewSchema, { password }),
    onSuccess: (view) => {
      takePlan(client, caseId, view);
      void client.invalidateQueries({ queryKey: ['case', caseId] });
      void client.invalidateQueries({ queryKey: ['cases'] });
    },
  });
}
