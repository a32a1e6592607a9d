import { type ErrorBody, errorStatus } from '@weighhouse/shared/contracts/errors';
import type { NextFunction, Request, RequestHandler, Response } from 'express';

const safeMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

const body: ErrorBody = {
  error: { id: 'forbidden', message: 'This request came from another site and was refused.' },
};

/**
 * Refuses changes that another site's page asks for (cross-site request forgery), besides the cookie's SameSite.
 * Programs that are no browser send neither header and are let through; they hold no cookie by accident.
 * @source Fetch Metadata Request Headers (W3C) and RFC 6454, as the OWASP sheet on request forgery combines them;
 *   from memory
 */
export function refuseForeignRequests(publicUrl: string): RequestHandler {
  return (request: Request, response: Response, next: NextFunction) => {
    if (safeMethods.has(request.method) || isOurs(publicUrl, request.headers)) next();
    else response.status(errorStatus.forbidden).json(body);
  };
}

/** Whether a request comes from a page of ours, or from no page at all. */
export function isOurs(
  publicUrl: string,
  headers: { 'sec-fetch-site'?: unknown; origin?: unknown; host?: unknown },
): boolean {
  const site = headers['sec-fetch-site'];
  if (site !== undefined) return site === 'same-origin' || site === 'none';
  const { origin, host } = headers;
  if (origin === undefined) return true;
  if (typeof origin !== 'string' || !URL.canParse(origin)) return false;
  const from = new URL(origin);
  return from.origin === new URL(publicUrl).origin || from.host === host;
}
