import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { InvitePerson } from '@weighhouse/shared/contracts/people';
import type { EntityManager } from 'typeorm';
import { AuditLog } from '../platform/audit-log/audit-log.js';
import { Clock } from '../platform/clock/clock.js';
import { invalid, Refusal } from '../platform/errors/refusal.js';
import { CentreRow } from './centre.entity.js';
import { issueInvitation } from './issue-invitation.js';
import { PersonRole } from './person-role.entity.js';
import { PersonRow } from './person.entity.js';

/** Adds people: for administrators, and for the command that makes the first of them. */
@Injectable()
export class PersonRegister {
  constructor(
    private readonly clock: Clock,
    private readonly audit: AuditLog,
  ) {}

  /**
   * Adds a person with a single-use link.
   * @param actorId who invites; null for the command line
   * @returns the person's id and the link's token, which is kept nowhere
   * @throws Refusal duplicate for an e-mail that is taken, invalid for a centre that does not exist
   */
  async add(
    em: EntityManager,
    input: InvitePerson,
    actorId: string | null,
  ): Promise<{ personId: string; token: string }> {
    const now = this.clock.now();
    if (!(await em.existsBy(CentreRow, { id: input.centreId }))) throw unknownCentre();
    if (await em.existsBy(PersonRow, { email: input.email })) throw emailTaken();
    const personId = randomUUID();
    await em
      .insert(PersonRow, {
        id: personId,
        email: input.email,
        name: input.name,
        specialty: input.specialty,
        centreId: input.centreId,
        passwordHash: null,
        createdAt: now,
      })
      .catch((error: unknown) => {
        throw isDuplicate(error) ? emailTaken() : error;
      });
    await writeRoles(em, personId, input.roles);
    const token = await issueInvitation(em, personId, now);
    await this.audit.record(em, {
      actorId,
      action: 'person.invited',
      sentence: `invited ${input.name} as ${input.roles.join(', ')}`,
    });
    return { personId, token };
  }
}

/** Replaces the roles that a person holds. */
export async function writeRoles(
  em: EntityManager,
  personId: string,
  roles: InvitePerson['roles'],
): Promise<void> {
  await em.delete(PersonRole, { personId });
  await em.insert(
    PersonRole,
    [...new Set(roles)].map((role) => ({ personId, role })),
  );
}

export const unknownCentre = (): Refusal =>
  invalid([{ path: 'centreId', message: 'must be a centre of the list' }]);

const emailTaken = (): Refusal => new Refusal('duplicate', 'Somebody with this e-mail is there already.');

const duplicateEntry = 1062;

/** Whether the database refused a row because one with the same unique value is there. */
export function isDuplicate(error: unknown): boolean {
  return typeof error === 'object' && error !== null && 'errno' in error && error.errno === duplicateEntry;
}
