import { useMutation } from '@tanstack/react-query';
import { identitySchema } from '@weighhouse/shared/contracts/summaries';
import { get } from '../../../lib/api';

/**
 * Opens the identity card. Every opening is written into the trail, so it is asked for by a click alone: not a query,
 * which would be read again on a focus, a reconnection or a live event.
 */
export const useOpenIdentity = (caseId: string) =>
  useMutation({ mutationFn: () => get(`/api/cases/${caseId}/identity`, identitySchema) });
