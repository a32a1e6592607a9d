import { useEffect, useState } from 'react';

/** Seconds that are left of a wait; a new `since` (a moment in milliseconds) begins it again. */
export function useCountdown(seconds: number, since: number): number {
  const [now, setNow] = useState(() => Date.now());
  const end = since + seconds * 1000;
  useEffect(() => {
    if (seconds === 0) return;
    const timer = setInterval(() => {
      setNow(Date.now());
    }, 1000);
    return () => {
      clearInterval(timer);
    };
  }, [seconds, since]);
  // The clock is read once a second, so before its first beat it may be older than `since`.
  return Math.min(seconds, Math.max(0, Math.ceil((end - now) / 1000)));
}
