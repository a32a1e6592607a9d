import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { DataSource, type EntityManager, IsNull, Not } from 'typeorm';
import { Clock } from '../platform/clock/clock.js';
import type { Work } from '../platform/database/unit-of-work.js';
import { AccessChangedEvent } from '../platform/events/case-events.js';
import type { Actor } from '../platform/http/actor.js';
import { PersonRole } from './person-role.entity.js';
import { PersonRow } from './person.entity.js';
import { absoluteLifeMs, idleLifeMs } from './session-cookie.js';
import { SessionRow } from './session.entity.js';

/** What the cookie's token says: which session it is, and nothing else. */
export interface SessionClaims {
  sid: string;
}

const seenEveryMs = 60_000;

/** Signed-in browsers. Each request looks its session up, so that a revoked one is refused at once. */
@Injectable()
export class SessionsService {
  constructor(
    private readonly source: DataSource,
    private readonly tokens: JwtService,
    private readonly clock: Clock,
  ) {}

  /** Signs a person in. @returns the value of the session cookie */
  async start(em: EntityManager, personId: string, userAgent: string): Promise<string> {
    const now = this.clock.now();
    const id = randomUUID();
    await em.insert(SessionRow, {
      id,
      personId,
      createdAt: now,
      lastSeenAt: now,
      expiresAt: new Date(now.getTime() + absoluteLifeMs),
      revokedAt: null,
      userAgent: userAgent.slice(0, 255),
    });
    return this.tokens.signAsync({ sid: id } satisfies SessionClaims);
  }

  /** The person behind a session cookie; null when it is forged, over, revoked or its person deactivated. */
  async actorOf(cookieToken: string): Promise<Actor | null> {
    const claims = await this.tokens.verifyAsync<Partial<SessionClaims>>(cookieToken).catch(() => null);
    return typeof claims?.sid === 'string' ? this.actorOfSession(claims.sid) : null;
  }

  async actorOfSession(sessionId: string): Promise<Actor | null> {
    const { manager } = this.source;
    const session = await manager.findOneBy(SessionRow, { id: sessionId, revokedAt: IsNull() });
    const now = this.clock.now();
    if (!session || !isRunning(session, now)) return null;
    const [person, roles] = await Promise.all([
      manager.findOneBy(PersonRow, { id: session.personId }),
      manager.findBy(PersonRole, { personId: session.personId }),
    ]);
    if (person?.active !== true) return null;
    if (now.getTime() - session.lastSeenAt.getTime() >= seenEveryMs) {
      await manager.update(SessionRow, { id: session.id }, { lastSeenAt: now });
    }
    return { id: person.id, name: person.name, roles: roles.map((row) => row.role), sessionId: session.id };
  }

  /** Ends one session. */
  async revoke(work: Work, actor: Actor): Promise<void> {
    await work.em.update(SessionRow, { id: actor.sessionId }, { revokedAt: this.clock.now() });
    work.afterCommit(new AccessChangedEvent(actor.id, actor.sessionId));
  }

  /** Ends every session of a person, or every other than one that is kept. */
  async revokeAll(work: Work, personId: string, keep?: string): Promise<void> {
    const open = { personId, revokedAt: IsNull(), ...(keep === undefined ? {} : { id: Not(keep) }) };
    const sessions = await work.em.find(SessionRow, { where: open, select: { id: true } });
    await work.em.update(SessionRow, open, { revokedAt: this.clock.now() });
    for (const { id } of sessions) work.afterCommit(new AccessChangedEvent(personId, id));
  }
}

/** Neither past its end nor resting for too long. */
export function isRunning(session: Pick<SessionRow, 'expiresAt' | 'lastSeenAt'>, now: Date): boolean {
  return (
    now.getTime() < session.expiresAt.getTime() && now.getTime() - session.lastSeenAt.getTime() < idleLifeMs
  );
}
