import { Inject, Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Request } from 'express';
import { Strategy } from 'passport-jwt';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import type { Actor } from '../platform/http/actor.js';
import { sessionCookie } from './session-cookie.js';
import { type SessionClaims, SessionsService } from './sessions.service.js';

/** Who sends a request: the cookie's token names a session, which is looked up. */
@Injectable()
export class SessionStrategy extends PassportStrategy(Strategy, 'session') {
  constructor(
    @Inject(CONFIGURATION) configuration: Configuration,
    private readonly sessions: SessionsService,
  ) {
    super({
      jwtFromRequest: tokenOf,
      secretOrKey: configuration.SESSION_SECRET,
      algorithms: ['HS256'],
      // The session's row says when it ends.
      ignoreExpiration: true,
    });
  }

  async validate(claims: Partial<SessionClaims>): Promise<Actor | null> {
    return typeof claims.sid === 'string' ? this.sessions.actorOfSession(claims.sid) : null;
  }
}

function tokenOf(request: Request): string | null {
  const cookies = request.cookies as Record<string, unknown> | undefined;
  const token = cookies?.[sessionCookie];
  return typeof token === 'string' ? token : null;
}
