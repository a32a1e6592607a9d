import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type ChangeDraft, caseSchema, type NewCase } from '@weighhouse/shared/contracts/cases';
import { patch, post } from '../../../lib/api';
import { caseQuery } from './get-case';

/** Opens a draft. */
export function useNewCase() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (draft: NewCase) => post('/api/cases', caseSchema, draft),
    onSuccess: (made) => {
      client.setQueryData(caseQuery(made.id).queryKey, made);
      void client.invalidateQueries({ queryKey: ['cases'] });
      void client.invalidateQueries({ queryKey: ['today'] });
    },
  });
}

export type DraftChange = Omit<ChangeDraft, 'version'>;

/** Changes some fields of a draft; refused when `version` is not the last one. */
export const changeDraft = (caseId: string, version: number, change: DraftChange) =>
  patch(`/api/cases/${caseId}`, caseSchema, { version, ...change });
