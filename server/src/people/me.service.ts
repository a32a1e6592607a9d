import { Inject, Injectable } from '@nestjs/common';
import type { Me } from '@weighhouse/shared/contracts/people';
import type { EntityManager } from 'typeorm';
import { AuditLog } from '../platform/audit-log/audit-log.js';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { notFound } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { PasswordsService } from './passwords.service.js';
import { PeopleDirectory } from './people-directory.js';
import { SessionsService } from './sessions.service.js';

/** What a signed-in person does with their own way in. */
@Injectable()
export class MeService {
  constructor(
    private readonly work: UnitOfWork,
    private readonly directory: PeopleDirectory,
    private readonly sessions: SessionsService,
    private readonly passwords: PasswordsService,
    private readonly audit: AuditLog,
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
  ) {}

  async me(personId: string, em?: EntityManager): Promise<Me> {
    const entry = await this.directory.byId(personId, em);
    if (!entry) throw notFound();
    return { ...entry, timeZone: this.configuration.TIME_ZONE, demo: this.configuration.DEMO };
  }

  /** Starts a session for somebody whose password was right. @returns the cookie's value and who it is */
  signIn(personId: string, userAgent: string): Promise<{ token: string; me: Me }> {
    return this.work.run(async ({ em }) => {
      const token = await this.sessions.start(em, personId, userAgent);
      await this.audit.record(em, { actorId: personId, action: 'session.started', sentence: 'signed in' });
      return { token, me: await this.me(personId, em) };
    });
  }

  signOut(actor: Actor): Promise<void> {
    return this.work.run(async (work) => {
      await this.sessions.revoke(work, actor);
      await this.audit.record(work.em, {
        actorId: actor.id,
        action: 'session.ended',
        sentence: 'signed out',
      });
    });
  }

  signOutEverywhere(actor: Actor): Promise<void> {
    return this.work.run(async (work) => {
      await this.sessions.revokeAll(work, actor.id);
      await this.audit.record(work.em, {
        actorId: actor.id,
        action: 'session.allEnded',
        sentence: 'signed out everywhere',
      });
    });
  }

  /** Sets a new password; every other session ends. @throws Refusal wrong-password */
  async changePassword(actor: Actor, current: string, next: string): Promise<void> {
    await this.passwords.confirm(actor, current);
    await this.work.run(async (work) => {
      await this.passwords.set(work.em, actor.id, next);
      await this.sessions.revokeAll(work, actor.id, actor.sessionId);
      await this.audit.record(work.em, {
        actorId: actor.id,
        action: 'password.changed',
        sentence: 'changed the password',
      });
    });
  }
}
