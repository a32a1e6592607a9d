import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type OutcomeInput, outcomeSchema } from '@weighhouse/shared/contracts/outcomes';
import { post } from '../../../lib/api';
import { outcomeQuery } from './get-outcome';

/** Records what the illness turned out to be. It stands for good. */
export function useRecordOutcome(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: OutcomeInput) => post(`/api/cases/${caseId}/outcome`, outcomeSchema, input),
    onSuccess: (outcome) => {
      client.setQueryData(outcomeQuery(caseId).queryKey, outcome);
      void client.invalidateQueries({ queryKey: ['case', caseId] });
      void client.invalidateQueries({ queryKey: ['cases'] });
      void client.invalidateQueries({ queryKey: ['today'] });
    },
  });
}
