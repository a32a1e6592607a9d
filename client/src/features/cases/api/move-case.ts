import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type Accept, caseSchema } from '@weighhouse/shared/contracts/cases';
import { post } from '../../../lib/api';
import { caseQuery } from './get-case';

type Move = 'submit' | 'return' | 'decline' | 'accept' | 'withdraw' | 'reopen';

/** One of the moves of a case's life, with words where the move needs them. */
export function useMoveCase(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ move, body }: { move: Move; body: { words?: string } | Accept }) =>
      post(`/api/cases/${caseId}/${move}`, caseSchema, body),
    onSuccess: (moved) => {
      client.setQueryData(caseQuery(caseId).queryKey, moved);
      void client.invalidateQueries({ queryKey: ['case', caseId] });
      void client.invalidateQueries({ queryKey: ['cases'] });
      void client.invalidateQueries({ queryKey: ['today'] });
    },
  });
}
