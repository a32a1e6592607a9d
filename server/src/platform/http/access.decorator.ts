import { SetMetadata } from '@nestjs/common';
import type { CaseAction } from '@weighhouse/shared/access/actions';
import type { Role } from '@weighhouse/shared/contracts/people';

/** Actions that are not about one case, with the role they ask for; null: any signed-in person. */
export const generalActions = {
  public: null,
  signedIn: null,
  'case.open': 'referrer',
  'people.list': null,
  'people.manage': 'administrator',
} as const satisfies Record<string, Role | null>;
export type GeneralAction = keyof typeof generalActions;

export const ACCESS = 'weighhouse:access';

/**
 * Declares the action of a route. General actions are decided by the guard; actions on a case by the service's first
 * line, which knows the case. A test fails on a route without a declaration.
 */
export const Access = (action: GeneralAction | CaseAction) => SetMetadata(ACCESS, action);
