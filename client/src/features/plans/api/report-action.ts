import { useMutation, useQueryClient } from '@tanstack/react-query';
import { planViewSchema } from '@weighhouse/shared/contracts/plans';
import { post } from '../../../lib/api';
import { takePlan } from './get-plan';

/** Reports one's own action done, with what came of it. */
export function useReportAction(caseId: string, actionId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (words: string) => post(`/api/actions/${actionId}/done`, planViewSchema, { words }),
    onSuccess: (view) => {
      takePlan(client, caseId, view);
      void client.invalidateQueries({ queryKey: ['case', caseId, 'summary'] });
    },
  });
}
