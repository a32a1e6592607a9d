import { Inject, Injectable } from '@nestjs/common';
import type { InvitePerson, Person } from '@weighhouse/shared/contracts/people';
import type { EntityManager } from 'typeorm';
import { AuditLog } from '../platform/audit-log/audit-log.js';
import { Clock } from '../platform/clock/clock.js';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { Outbox } from '../platform/mail/outbox.js';
import { invitationLink, issueInvitation } from './issue-invitation.js';
import { PeopleList } from './people-list.js';
import { PersonRegister } from './person-register.js';

/** Brings people in by mail; the guard has asked for the administrator's role. */
@Injectable()
export class InvitePeopleService {
  constructor(
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly register: PersonRegister,
    private readonly people: PeopleList,
    private readonly audit: AuditLog,
    private readonly outbox: Outbox,
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
  ) {}

  /** Adds a person and sends the link. @throws Refusal duplicate, invalid */
  invite(actor: Actor, input: InvitePerson): Promise<Person> {
    return this.work.run(async ({ em }) => {
      const { personId, token } = await this.register.add(em, input, actor.id);
      await this.send(em, input.email, token);
      return this.people.forAdministrators(em, personId);
    });
  }

  /**
   * Sends a new link: to somebody who let the first one lapse or forgot the password. An old password works until the
   * link is used.
   */
  inviteAgain(actor: Actor, personId: string): Promise<Person> {
    return this.work.run(async ({ em }) => {
      const person = await this.people.forAdministrators(em, personId);
      if (person.active !== true || person.email === undefined) {
        throw new Refusal('wrong-state', 'This person is deactivated. Activate them first.');
      }
      const token = await issueInvitation(em, personId, this.clock.now());
      await this.send(em, person.email, token);
      await this.audit.record(em, {
        actorId: actor.id,
        action: 'person.invitedAgain',
        sentence: `sent ${person.name} a new link to set a password`,
      });
      return person;
    });
  }

  private send(em: EntityManager, email: string, token: string): Promise<void> {
    return this.outbox.put(em, {
      to: email,
      subject: 'Your way in to Weighhouse',
      body: [
        'You are invited to Weighhouse, where colleagues weigh difficult cases together.',
        'Set your password with this link. It works once and for seven days:',
        invitationLink(this.configuration.PUBLIC_URL, token),
        'If you did not expect this letter, you need do nothing.',
      ].join('\n\n'),
    });
  }
}
