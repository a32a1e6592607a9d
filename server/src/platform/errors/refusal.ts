import { HttpException } from '@nestjs/common';
import {
  type ErrorBody,
  type ErrorId,
  errorStatus,
  type FieldFault,
} from '@weighhouse/shared/contracts/errors';

/** A refusal that the client shows by its id. */
export class Refusal extends HttpException {
  constructor(
    readonly id: ErrorId,
    message: string,
    details: { fields?: FieldFault[]; current?: unknown } = {},
  ) {
    const body: ErrorBody = { error: { id, message, ...details } };
    super(body, errorStatus[id]);
    this.message = message;
  }
}

/** The same answer for what does not exist and for what a stranger may not know to exist. */
export const notFound = (): Refusal =>
  new Refusal('not-found', 'There is nothing here, or it is not open to you.');

export const wrongPart = (): Refusal =>
  new Refusal('forbidden', 'Your part on this case does not open this.');

export const sealedRefusal = (): Refusal =>
  new Refusal('sealed', 'The round is sealed: nobody sees these numbers until the chair unseals it.');

/** Somebody else was faster; `current` is what stands now. */
export const stale = (current: unknown): Refusal =>
  new Refusal('stale', 'Somebody changed this meanwhile. Compare both texts and save again.', { current });

/** Too many attempts; `retryAfterSeconds` leaves as the header Retry-After. */
export class TooMany extends Refusal {
  constructor(readonly retryAfterSeconds: number) {
    super('too-many', 'Too many attempts. Wait a minute and try again.');
  }
}

/** Something is still missing for a move, named part by part. */
export const notReady = (fields: FieldFault[]): Refusal =>
  new Refusal('not-ready', 'Something is still missing before this can be done.', { fields });

export const invalid = (fields: FieldFault[]): Refusal =>
  new Refusal('invalid', 'Some of it cannot be saved as it is. Each fault is named.', { fields });
