/** Where to go after signing in: a path of this application and nothing else, so that a link cannot lead away. */
export function returnPath(asked: string | null): string {
  if (asked === null || !asked.startsWith('/')) return '/';
  try {
    const base = 'http://this.invalid';
    const url = new URL(asked, base);
    return url.origin === base && !asked.startsWith('/sign-in') ? url.pathname + url.search + url.hash : '/';
  } catch {
    return '/';
  }
}
