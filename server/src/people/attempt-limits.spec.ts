import { ThrottlerStorageService } from '@nestjs/throttler';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { TooMany } from '../platform/errors/refusal.js';
import { AttemptLimits, attemptsAMinute } from './attempt-limits.js';

const limits = (): AttemptLimits => new AttemptLimits(new ThrottlerStorageService());
const takeAll = async (one: AttemptLimits, of: string): Promise<void> => {
  for (let count = 0; count < attemptsAMinute.account; count += 1) await one.take('account', of);
};

afterEach(() => {
  vi.useRealTimers();
});

describe('attempts at passwords', () => {
  it('are refused beyond the minute’s number, each account by itself', async () => {
    const one = limits();
    await takeAll(one, 'ann');
    await expect(one.take('account', 'ann')).rejects.toBeInstanceOf(TooMany);
    await expect(one.take('account', 'ben')).resolves.toBeUndefined();
    await expect(one.take('anywhere', 'ann')).resolves.toBeUndefined();
  });

  it('count anew after the right password, and after the wait that the refusal names', async () => {
    vi.useFakeTimers();
    const one = limits();
    await takeAll(one, 'ann');
    one.succeeded('account', 'ann');
    await takeAll(one, 'ann');
    const refused: unknown = await one.take('account', 'ann').catch((error: unknown) => error);
    expect(refused).toBeInstanceOf(TooMany);
    vi.advanceTimersByTime((refused as TooMany).retryAfterSeconds * 1000 + 1);
    await expect(one.take('account', 'ann')).resolves.toBeUndefined();
  });

  it('are not counted anew for somebody else’s success long ago being forgotten', async () => {
    vi.useFakeTimers();
    const one = limits();
    one.succeeded('account', 'ann');
    vi.advanceTimersByTime(10 * 60_000);
    await takeAll(one, 'ann');
    // Forgets what is old, Ann's start among it.
    one.succeeded('account', 'ben');
    await takeAll(one, 'cleo');
    await expect(one.take('account', 'cleo')).rejects.toBeInstanceOf(TooMany);
  });
});
