import type { IncomingMessage } from 'node:http';
import { Inject, Injectable } from '@nestjs/common';
import { parseCookie } from 'cookie';
import { SessionsService } from '../people/sessions.service.js';
import { sessionCookie } from '../people/session-cookie.js';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import { Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';

type Handshake = Pick<IncomingMessage, 'headers'>;

/** Decides who may connect at all: a browser on our own page, with the cookie of a running session. */
@Injectable()
export class LiveHandshake {
  private readonly ownOrigin: string;

  constructor(
    @Inject(CONFIGURATION) configuration: Configuration,
    private readonly sessions: SessionsService,
  ) {
    this.ownOrigin = new URL(configuration.PUBLIC_URL).origin;
  }

  /** @throws Refusal `forbidden` for another site's page, `signed-out` without a running session */
  async admit({ headers }: Handshake): Promise<Actor> {
    if (!isOwnOrigin(headers.origin, headers.host, this.ownOrigin))
      throw new Refusal('forbidden', 'Live changes are for pages of this service alone.');
    const token = parseCookie(headers.cookie ?? '')[sessionCookie];
    const actor = token === undefined ? null : await this.sessions.actorOf(token);
    if (!actor) throw new Refusal('signed-out', 'You are signed out. Sign in to go on.');
    return actor;
  }

  /** Whether the session that a connection began with still runs. */
  async stillIn(actor: Actor): Promise<Actor | null> {
    return this.sessions.actorOfSession(actor.sessionId);
  }
}

/**
 * A page of another site may make a browser connect with our cookie, so the page's origin has to be ours: the public
 * address, or the host that was asked. Programs that are no browsers send none.
 */
export function isOwnOrigin(
  origin: string | undefined,
  host: string | undefined,
  ownOrigin: string,
): boolean {
  if (origin === undefined || origin === ownOrigin) return true;
  if (host === undefined || !URL.canParse(origin)) return false;
  const page = new URL(origin);
  return /^https?:$/.test(page.protocol) && page.host === host;
}
