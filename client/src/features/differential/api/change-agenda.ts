import { useMutation, useQueryClient } from '@tanstack/react-query';
import { doneSchema } from '@weighhouse/shared/contracts/common';
import { agendaItemSchema, type PutOnAgenda } from '@weighhouse/shared/contracts/differential';
import { del, put } from '../../../lib/api';
import { refreshDifferential } from './refresh-differential';

const path = (caseId: string, findingId: string) => `/api/cases/${caseId}/agenda/${findingId}`;

/** Puts a row on the agenda, or changes its note. */
export function usePutOnAgenda(caseId: string, findingId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: PutOnAgenda) => put(path(caseId, findingId), agendaItemSchema, body),
    onSettled: () => refreshDifferential(client, caseId),
  });
}

/** Takes a row off the agenda, as it was last seen. */
export function useTakeOffAgenda(caseId: string, findingId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (version: number) => del(`${path(caseId, findingId)}?version=${String(version)}`, doneSchema),
    onSettled: () => refreshDifferential(client, caseId),
  });
}
