import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectThrottlerStorage, type ThrottlerStorage } from '@nestjs/throttler';
import { TooMany } from '../platform/errors/refusal.js';

/** Attempts in a minute. Generous to a hospital behind one address, far too few for guessing. */
export const attemptsAMinute = {
  /** Signing in with one e-mail from one address, since it last succeeded. */
  account: 10,
  /** Signing in from one address, with any e-mail. */
  address: 120,
  /** Giving one's password again, since it was last right. */
  confirmation: 10,
} as const;

const minuteMs = 60_000;

/** Counts attempts at passwords. */
@Injectable()
export class AttemptLimits {
  /** How often each count was started anew; part of the key, because the storage cannot forget. */
  private readonly fresh = new Map<string, number>();

  constructor(@InjectThrottlerStorage() private readonly storage: ThrottlerStorage) {}

  /**
   * Counts one attempt.
   * @throws TooMany once the minute's attempts are used up
   */
  async take(kind: keyof typeof attemptsAMinute, of: string): Promise<void> {
    const key = keyOf(kind, of);
    const { isBlocked, timeToBlockExpire } = await this.storage.increment(
      `${key} ${String(this.fresh.get(key) ?? 0)}`,
      minuteMs,
      attemptsAMinute[kind],
      minuteMs,
      kind,
    );
    if (isBlocked) throw new TooMany(Math.max(1, timeToBlockExpire));
  }

  /** Starts the count anew, after the right password. */
  succeeded(kind: 'account' | 'confirmation', of: string): void {
    const key = keyOf(kind, of);
    this.fresh.set(key, (this.fresh.get(key) ?? 0) + 1);
  }
}

/** What people type is not kept readable, not even in memory. */
const keyOf = (kind: string, of: string): string =>
  createHash('sha256').update(`${kind} ${of}`).digest('hex');
