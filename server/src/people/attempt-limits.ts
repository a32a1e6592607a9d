import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectThrottlerStorage, type ThrottlerStorage } from '@nestjs/throttler';
import { TooMany } from '../platform/errors/refusal.js';

/** Attempts in a minute. Generous to a hospital behind one address, far too few for guessing. */
export const attemptsAMinute = {
  /** Signing in with one e-mail from one address, since it last succeeded. */
  account: 10,
  /** Signing in with one e-mail from anywhere, since it last succeeded: guesses may come from many addresses. */
  anywhere: 60,
  /** Signing in from one address, with any e-mail. */
  address: 120,
  /** Giving one's password again, since it was last right. */
  confirmation: 10,
} as const;

const minuteMs = 60_000;

/** Counts attempts at passwords. */
@Injectable()
export class AttemptLimits {
  /** How often each count was started anew, and when last; part of the key, because the storage cannot forget. */
  private readonly fresh = new Map<string, { times: number; at: number }>();

  constructor(@InjectThrottlerStorage() private readonly storage: ThrottlerStorage) {}

  /**
   * Counts one attempt.
   * @throws TooMany once the minute's attempts are used up
   */
  async take(kind: keyof typeof attemptsAMinute, of: string): Promise<void> {
    const key = keyOf(kind, of);
    const { isBlocked, timeToBlockExpire } = await this.storage.increment(
      `${key} ${String(this.fresh.get(key)?.times ?? 0)}`,
      minuteMs,
      attemptsAMinute[kind],
      minuteMs,
      kind,
    );
    if (isBlocked) throw new TooMany(Math.max(1, timeToBlockExpire));
  }

  /** Starts the count anew, after the right password. */
  succeeded(kind: 'account' | 'anywhere' | 'confirmation', of: string): void {
    const key = keyOf(kind, of);
    const now = Date.now();
    const times = (this.fresh.get(key)?.times ?? 0) + 1;
    // Moved to the end, so that the oldest stand first.
    this.fresh.delete(key);
    this.fresh.set(key, { times, at: now });
    this.forgetOld(now);
  }

  /** What was counted before an old start is over by itself. */
  private forgetOld(now: number): void {
    for (const [key, { at }] of this.fresh) {
      if (now - at < 2 * minuteMs) return;
      this.fresh.delete(key);
    }
  }
}

/** What people type is not kept readable, not even in memory. */
const keyOf = (kind: string, of: string): string =>
  createHash('sha256').update(`${kind} ${of}`).digest('hex');
