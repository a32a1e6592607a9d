import { useCallback, useEffect, useRef, useState } from 'react';
import { offlineError } from '../../../lib/api-error';
import { tryContent } from '../api/get-content';

/**
 * What to do when the browser could not load a report's content: find out why, and begin again where that can help, for
 * instance after the person has signed in again.
 * @returns `attempt` counts the beginnings; `error` is why there is none, if so; `failed` tells that a loading failed
 */
export function useLoadFailure(reportId: string) {
  const [attempt, setAttempt] = useState(0);
  const [error, setError] = useState<unknown>(null);
  const leaving = useRef<AbortController | null>(null);
  const tried = useRef(false);
  useEffect(() => {
    const abort = new AbortController();
    leaving.current = abort;
    return () => {
      abort.abort();
    };
  }, [reportId]);
  const again = useCallback(() => {
    setError(null);
    setAttempt((count) => count + 1);
  }, []);
  const failed = useCallback(() => {
    const signal = leaving.current?.signal;
    if (!signal) return;
    tryContent(reportId, signal).then(
      () => {
        // Without a question only once: what fails again although it can be had is shown as failed.
        if (tried.current) setError(offlineError());
        else again();
        tried.current = true;
      },
      (reason: unknown) => {
        if (!signal.aborted) setError(reason);
      },
    );
  }, [reportId, again]);
  return { attempt, error, failed, again };
}
