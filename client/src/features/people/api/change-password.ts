import { useMutation } from '@tanstack/react-query';
import { doneSchema } from '@weighhouse/shared/contracts/common';
import { put } from '../../../lib/api';

interface Change {
  currentPassword: string;
  newPassword: string;
}

/** Changes one's own password; every other device is signed out. */
export const useChangePassword = () =>
  useMutation({ mutationFn: (change: Change) => put('/api/me/password', doneSchema, change) });
