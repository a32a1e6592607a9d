import type { Round } from '@weighhouse/shared/contracts/rounds';
import { useEffect } from 'react';
import { readSeen, withSeen, writeSeen } from './seen-digests';

/** Remembers in this browser every digest of a sealed round that was on the screen. */
export function useSeenDigests(round: Round | null): void {
  useEffect(() => {
    if (!round) return;
    const seen = readSeen();
    const next = withSeen(seen, round, new Date().toISOString());
    if (next !== seen) writeSeen(next);
  }, [round]);
}
