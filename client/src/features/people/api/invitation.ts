import { useMutation, useQuery } from '@tanstack/react-query';
import { doneSchema } from '@weighhouse/shared/contracts/common';
import { invitationSchema } from '@weighhouse/shared/contracts/people';
import { get, post } from '../../../lib/api';

const path = (token: string) => `/api/invitations/${encodeURIComponent(token)}`;

/** Whom a single-use link invites. */
export const useInvitation = (token: string) =>
  useQuery({
    queryKey: ['invitation', token],
    queryFn: ({ signal }) => get(path(token), invitationSchema, signal),
  });

export const useAcceptInvitation = (token: string) =>
  useMutation({ mutationFn: (password: string) => post(path(token), doneSchema, { password }) });
