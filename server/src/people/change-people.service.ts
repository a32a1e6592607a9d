import { Injectable } from '@nestjs/common';
import type { ChangePerson, Person } from '@weighhouse/shared/contracts/people';
import type { EntityManager } from 'typeorm';
import { AuditLog } from '../platform/audit-log/audit-log.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork, type Work } from '../platform/database/unit-of-work.js';
import { notReady, stale } from '../platform/errors/refusal.js';
import { AccessChangedEvent } from '../platform/events/case-events.js';
import type { Actor } from '../platform/http/actor.js';
import { CentreRow } from './centre.entity.js';
import { withdrawInvitations } from './issue-invitation.js';
import { PeopleList } from './people-list.js';
import { unknownCentre, writeRoles } from './person-register.js';
import { PersonRow } from './person.entity.js';
import { changeSentence } from './change-sentence.js';
import { SessionsService } from './sessions.service.js';

/** Changes people's entries; the guard has asked for the administrator's role. */
@Injectable()
export class ChangePeopleService {
  constructor(
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly people: PeopleList,
    private readonly sessions: SessionsService,
    private readonly audit: AuditLog,
  ) {}

  /**
   * Changes what is given. Deactivating signs the person out everywhere at once.
   * @throws Refusal stale with the entry as it stands; not-ready where nobody would be left to administer
   */
  change(actor: Actor, personId: string, input: ChangePerson): Promise<Person> {
    return this.work.run(async (work) => {
      const administrators = await lockAdministrators(work.em);
      const before = await this.people.forAdministrators(work.em, personId);
      if (before.version !== input.version) throw stale(before);
      const staysAdministrator =
        (input.active ?? before.active) === true && (input.roles ?? before.roles).includes('administrator');
      if (!staysAdministrator && administrators.length === 1 && administrators[0] === personId) {
        throw notReady([
          {
            path: input.active === false ? 'active' : 'roles',
            message: 'is the last active administrator; make another one first',
          },
        ]);
      }
      await this.write(work, before, input);
      await this.audit.record(work.em, {
        actorId: actor.id,
        action: input.active === false ? 'person.deactivated' : 'person.changed',
        sentence: changeSentence(before, input),
      });
      return this.people.forAdministrators(work.em, personId);
    });
  }

  private async write(work: Work, before: Person, input: ChangePerson): Promise<void> {
    const { em } = work;
    const { version, roles, ...columns } = input;
    if (columns.centreId !== undefined && !(await em.existsBy(CentreRow, { id: columns.centreId }))) {
      throw unknownCentre();
    }
    const written = await em.update(
      PersonRow,
      { id: before.id, version },
      { ...columns, version: version + 1 },
    );
    if (written.affected !== 1) throw stale(await this.people.forAdministrators(em, before.id));
    if (roles) await writeRoles(em, before.id, roles);
    if (input.active === false) {
      await withdrawInvitations(em, before.id, this.clock.now());
      await this.sessions.revokeAll(work, before.id);
    }
    if (input.active === false || roles) work.afterCommit(new AccessChangedEvent(before.id));
  }
}

/**
 * Ids of those who can administer, locked, so that the last two cannot deactivate each other at once.
 * Somebody who has not accepted an invitation yet cannot.
 */
async function lockAdministrators(em: EntityManager): Promise<string[]> {
  const rows = await em
    .createQueryBuilder(PersonRow, 'person')
    .innerJoin('person_role', 'held', "held.personId = person.id AND held.role = 'administrator'")
    .where('person.active = 1 AND person.accepted = 1')
    .orderBy('person.id')
    .setLock('pessimistic_write')
    .getMany();
  return rows.map((row) => row.id);
}
