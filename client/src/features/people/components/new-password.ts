import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { newPasswordSchema } from '@weighhouse/shared/contracts/people';

/** What is wrong with a new password typed twice; `path` names it in the contract. */
export function newPasswordFaults(path: string, value: string, again: string): FieldFault[] {
  const parsed = newPasswordSchema.safeParse(value);
  const faults = parsed.success ? [] : parsed.error.issues.map(({ message }) => ({ path, message }));
  return value === again ? faults : [...faults, { path: 'again', message: 'must be the same as above' }];
}
