import type { QueryClient } from '@tanstack/react-query';
import { meQuery } from './get-me';

/**
 * Drops everything that was read for somebody. Who is signed in stays a query of its own, because the page on the
 * screen watches it: a cleared cache would leave it watching something that nobody changes any more.
 */
export function leaveNothing(client: QueryClient): void {
  client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== meQuery.queryKey[0] });
}
