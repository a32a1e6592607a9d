import type { ChangedWhat } from '@weighhouse/shared/contracts/live';

/** A committed change of a case. Listeners tell browsers, clear caches and send mail. */
export class CaseChangedEvent {
  static readonly eventName = 'case.changed';
  readonly name = CaseChangedEvent.eventName;

  constructor(
    readonly caseId: string,
    readonly revision: number,
    readonly what: ChangedWhat,
  ) {}
}

/** Somebody's way in has changed: sessions revoked, person deactivated, taken off a team. */
export class AccessChangedEvent {
  static readonly eventName = 'access.changed';
  readonly name = AccessChangedEvent.eventName;

  constructor(
    readonly personId: string,
    readonly sessionId: string | null = null,
    readonly caseId: string | null = null,
  ) {}
}
