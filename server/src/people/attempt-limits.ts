import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectThrottlerStorage, type ThrottlerStorage } from '@nestjs/throttler';
import { TooMany } from '../platform/errors/refusal.js';

/** Attempts in a minute. Generous to a hospital behind one address, far too few for guessing. */
export const attemptsAMinute = {
  /** Signing in with one e-mail from one address. */
  account: 10,
  /** Signing in from one address, with any e-mail. */
  address: 60,
  /** Giving one's password again. */
  confirmation: 10,
} as const;

const minuteMs = 60_000;

/** Counts attempts at passwords. */
@Injectable()
export class AttemptLimits {
  constructor(@InjectThrottlerStorage() private readonly storage: ThrottlerStorage) {}

  /**
   * Counts one attempt.
   * @throws TooMany once the minute's attempts are used up
   */
  async take(kind: keyof typeof attemptsAMinute, of: string): Promise<void> {
    // What people type is not kept readable, not even in memory.
    const key = createHash('sha256').update(`${kind} ${of}`).digest('hex');
    const { isBlocked, timeToBlockExpire } = await this.storage.increment(
      key,
      minuteMs,
      attemptsAMinute[kind],
      minuteMs,
      kind,
    );
    if (isBlocked) throw new TooMany(Math.max(1, timeToBlockExpire));
  }
}
