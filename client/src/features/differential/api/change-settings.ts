import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type ChangeSettings, settingsSchema } from '@weighhouse/shared/contracts/cases';
import { patch } from '../../../lib/api';
import { refreshDifferential } from './refresh-differential';

export function useChangeSettings(caseId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: ChangeSettings) => patch(`/api/cases/${caseId}/settings`, settingsSchema, body),
    onSuccess: () => refreshDifferential(client, caseId),
  });
}
