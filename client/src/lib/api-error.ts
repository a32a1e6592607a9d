import type { FieldFault } from '@weighhouse/shared/contracts/errors';

interface Details {
  status: number;
  fields?: FieldFault[] | undefined;
  current?: unknown;
  retryAfterSeconds?: number | null;
}

/** A refusal of the server, or the server out of reach (status 0, id `offline`). */
export class ApiError extends Error {
  readonly status: number;
  /** All faults of the input, or all parts that are still missing for a move. */
  readonly fields: FieldFault[];
  /** With id `stale`: the state that the writer has not seen yet. */
  readonly current: unknown;
  /** With id `too-many`: how long to wait. */
  readonly retryAfterSeconds: number | null;

  constructor(
    readonly id: string,
    message: string,
    details: Details,
  ) {
    super(message);
    this.name = 'ApiError';
    this.status = details.status;
    this.fields = details.fields ?? [];
    this.current = details.current;
    this.retryAfterSeconds = details.retryAfterSeconds ?? null;
  }
}

export function isApiError(error: unknown, id?: string): error is ApiError {
  return error instanceof ApiError && (id === undefined || error.id === id);
}

export const offlineError = () =>
  new ApiError('offline', 'You are offline or the server cannot be reached. Nothing you typed is lost.', {
    status: 0,
  });
