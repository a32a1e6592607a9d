import { useMutation, useQueryClient } from '@tanstack/react-query';
import { doneSchema } from '@weighhouse/shared/contracts/common';
import { del } from '../../../lib/api';

/** Removes a report from a draft. */
export function useRemoveReport(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (reportId: string) => del(`/api/reports/${reportId}`, doneSchema),
    onSuccess: () => client.invalidateQueries({ queryKey: ['case', caseId] }),
  });
}
