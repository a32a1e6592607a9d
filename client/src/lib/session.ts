/**
 * What happens to requests that find the session over. They wait: the shell asks the person to sign in again over the
 * page as it stands, and then they are sent again, so that nothing typed is lost.
 */
type Decide = (again: boolean) => void;

let waiting: Decide[] = [];
const listeners = new Set<() => void>();

/** Waits until the same person has signed in again (true), or until somebody else has or the page is left (false). */
export function waitForSignIn(signal?: AbortSignal): Promise<boolean> {
  return new Promise((resolve) => {
    waiting.push(resolve);
    signal?.addEventListener('abort', () => {
      resolve(false);
    });
    for (const tell of listeners) tell();
  });
}

/** Ends the wait of every request that found the session over. */
export function decideSession(again: boolean): void {
  const decided = waiting;
  waiting = [];
  for (const decide of decided) decide(again);
}

/** Calls back whenever a request finds the session over. */
export function onSessionOver(tell: () => void): () => void {
  listeners.add(tell);
  return () => {
    listeners.delete(tell);
  };
}
