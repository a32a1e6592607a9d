import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager, IsNull } from 'typeorm';
import { AuditLog } from '../platform/audit-log/audit-log.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { Refusal } from '../platform/errors/refusal.js';
import { InvitationRow } from './invitation.entity.js';
import { hashOfToken } from './issue-invitation.js';
import { PasswordsService } from './passwords.service.js';
import { PersonRow } from './person.entity.js';
import { SessionsService } from './sessions.service.js';

/** Single-use links by which people set their password. */
@Injectable()
export class InvitationsService {
  constructor(
    private readonly source: DataSource,
    private readonly clock: Clock,
    private readonly work: UnitOfWork,
    private readonly audit: AuditLog,
    private readonly passwords: PasswordsService,
    private readonly sessions: SessionsService,
  ) {}

  /** What the link shows before a password is set. @throws Refusal link-unusable, whatever the reason */
  async read(token: string): Promise<{ name: string; email: string; expiresAt: Date }> {
    const { invitation, person } = await this.usable(this.source.manager, token);
    return { name: person.name, email: person.email, expiresAt: invitation.expiresAt };
  }

  /**
   * Sets the password and uses the link up. Whoever was signed in as this person is signed out.
   * @returns the person's id
   * @throws Refusal link-unusable, also to the slower of two who use it at once
   */
  accept(token: string, password: string): Promise<string> {
    return this.work.run(async (work) => {
      const { invitation, person } = await this.usable(work.em, token);
      const used = await work.em.update(
        InvitationRow,
        { id: invitation.id, usedAt: IsNull(), withdrawnAt: IsNull() },
        { usedAt: this.clock.now() },
      );
      if (used.affected !== 1) throw unusable();
      await this.passwords.set(work.em, person.id, password);
      await this.sessions.revokeAll(work, person.id);
      await this.audit.record(work.em, {
        actorId: person.id,
        action: 'invitation.accepted',
        sentence: 'accepted the invitation and set a password',
      });
      return person.id;
    });
  }

  private async usable(
    em: EntityManager,
    token: string,
  ): Promise<{ invitation: InvitationRow; person: PersonRow }> {
    const invitation = await em.findOneBy(InvitationRow, {
      tokenHash: hashOfToken(token),
      usedAt: IsNull(),
      withdrawnAt: IsNull(),
    });
    if (!invitation || invitation.expiresAt.getTime() <= this.clock.now().getTime()) throw unusable();
    const person = await em.findOneBy(PersonRow, { id: invitation.personId, active: true });
    if (!person) throw unusable();
    return { invitation, person };
  }
}

const unusable = (): Refusal =>
  new Refusal(
    'link-unusable',
    'This link cannot be used: it was used before, is older than seven days or was replaced. Ask for a new one.',
  );
