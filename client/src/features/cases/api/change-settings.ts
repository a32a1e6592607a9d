import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type ChangeSettings, settingsSchema } from '@weighhouse/shared/contracts/cases';
import { patch } from '../../../lib/api';

/** Changes how the case is weighed and when it is discussed, with the reason. */
export function useChangeSettings(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: ChangeSettings) => patch(`/api/cases/${caseId}/settings`, settingsSchema, change),
    onSuccess: () => client.invalidateQueries({ queryKey: ['case', caseId] }),
  });
}
