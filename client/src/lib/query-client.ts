import { QueryClient } from '@tanstack/react-query';
import { isApiError } from './api-error';

/** Trying again helps only where the server was out of reach or out of order. */
function worthRetrying(count: number, error: Error): boolean {
  return count < 2 && isApiError(error) && (error.status === 0 || error.status >= 500);
}

export function makeQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        retry: worthRetrying,
        // Live events say when something changed; this only spares the refetch of what was read a moment ago.
        staleTime: 5_000,
        // A query that waits silently for the network would show a skeleton for ever.
        networkMode: 'always',
      },
      mutations: { networkMode: 'always' },
    },
  });
}
