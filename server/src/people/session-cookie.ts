import type { CookieOptions } from 'express';

/** The cookie that carries the session's token. */
export const sessionCookie = 'weighhouse_session';

export const absoluteLifeMs = 7 * 24 * 3_600_000;
export const idleLifeMs = 12 * 3_600_000;

/**
 * No script reads it and no other site's page sends it. A link in a letter still works for somebody signed in: the
 * page that it opens needs no cookie, and what that page then asks of the server comes from our own site.
 */
export const cookieOptions = (publicUrl: string): CookieOptions => ({
  httpOnly: true,
  sameSite: 'strict',
  secure: publicUrl.startsWith('https:'),
  path: '/',
});
