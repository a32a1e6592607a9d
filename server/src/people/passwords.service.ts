import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { hashPassword, passwordMatches } from '../platform/crypto/passwords.js';
import { Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { AttemptLimits } from './attempt-limits.js';
import { PersonRow } from './person.entity.js';

/** The one place that reads and writes password hashes. */
@Injectable()
export class PasswordsService {
  constructor(
    private readonly source: DataSource,
    private readonly limits: AttemptLimits,
  ) {}

  /**
   * The person with this e-mail and password. Takes the same time whoever does not get in: an unknown e-mail, a wrong
   * password, somebody deactivated or who never accepted an invitation.
   */
  async personFor(email: string, password: string): Promise<PersonRow | null> {
    const found = await this.withHash({ email });
    // The database takes é for e and leaves out what nobody sees: other spellings would each be counted as an account
    // of its own, and so let somebody guess on.
    const row = found?.email === email ? found : null;
    const matches = await passwordMatches(row?.active === true ? row.passwordHash : null, password);
    return matches ? row : null;
  }

  /**
   * Asks for the password of somebody signed in once more, before an act that binds them.
   * @throws Refusal wrong-password, or too-many after ten attempts in a minute
   */
  async confirm(actor: Pick<Actor, 'id'>, password: string): Promise<void> {
    await this.limits.take('confirmation', actor.id);
    const row = await this.withHash({ id: actor.id });
    if (!(await passwordMatches(row?.passwordHash ?? null, password))) {
      throw new Refusal('wrong-password', 'That is not your password.');
    }
    this.limits.succeeded('confirmation', actor.id);
  }

  /** Sets a password and with it accepts the invitation, if it was the first. */
  async set(em: EntityManager, personId: string, password: string): Promise<void> {
    const passwordHash = await hashPassword(password);
    await em.update(PersonRow, { id: personId }, { passwordHash, accepted: true });
  }

  private withHash(where: { id: string } | { email: string }): Promise<PersonRow | null> {
    return this.source.manager.findOne(PersonRow, {
      where,
      select: { id: true, email: true, name: true, active: true, passwordHash: true },
    });
  }
}
