import { isApiError } from './api-error';
import { waitWords } from './words';

/** What happened, that nothing was lost, and what to do, for a person to read. */
export interface ErrorWords {
  what: string;
  todo: string;
  /** Trying again can help. */
  retry: boolean;
}

const byId: Record<string, ErrorWords> = {
  offline: {
    what: 'You are offline or the server cannot be reached. Nothing you typed is lost.',
    todo: 'Check the connection and try again.',
    retry: true,
  },
  failed: {
    what: 'The server could not do this. Nothing you typed is lost.',
    todo: 'Try again in a moment. If it stays, tell your administrator.',
    retry: true,
  },
  unavailable: {
    what: 'The server is not ready. Nothing you typed is lost.',
    todo: 'Try again in a moment.',
    retry: true,
  },
  unreadable: {
    what: 'The server answered with something this page cannot read. Nothing was changed here.',
    todo: 'Load the page again: it may be older than the server.',
    retry: true,
  },
  'not-found': {
    what: 'There is nothing here that is open to you.',
    todo: 'Check the address, or ask the chair to put you on the team.',
    retry: false,
  },
  forbidden: {
    what: 'Your part on this case does not open this.',
    todo: 'Ask the chair if you need it.',
    retry: false,
  },
  sealed: {
    what: 'The round is sealed.',
    todo: 'The numbers are shown to everybody at once when the chair unseals it.',
    retry: false,
  },
  stale: {
    what: 'Somebody else changed this meanwhile. Your text is still here.',
    todo: 'Compare both and choose.',
    retry: false,
  },
};

/** The words for an error; the server's own where they say more than the id does. */
export function errorWords(error: unknown): ErrorWords {
  if (!isApiError(error))
    return { what: 'Something on this page failed. Nothing was changed.', todo: 'Try again.', retry: true };
  if (error.id === 'too-many')
    return {
      what: 'Too many tries in a short time.',
      todo: `Wait ${waitWords(error.retryAfterSeconds ?? 60)} and try again.`,
      retry: true,
    };
  return byId[error.id] ?? { what: error.message, todo: '', retry: false };
}

/** The same in one line. */
export function errorLine(error: unknown): string {
  const { what, todo } = errorWords(error);
  return todo === '' ? what : `${what} ${todo}`;
}
