import { Injectable } from '@nestjs/common';
import type { Person, Role } from '@weighhouse/shared/contracts/people';
import { DataSource, type EntityManager, In } from 'typeorm';
import { notFound } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { CentreRow } from './centre.entity.js';
import { PersonRole } from './person-role.entity.js';
import { PersonRow } from './person.entity.js';
import { SessionRow } from './session.entity.js';

/** People as lists show them. */
@Injectable()
export class PeopleList {
  constructor(private readonly source: DataSource) {}

  /** Everybody active, by name; to administrators everybody, with e-mail and whether they can sign in. */
  async list(actor: Actor, query: { role?: Role; q?: string }): Promise<Person[]> {
    const full = actor.roles.includes('administrator');
    const people = await this.source.manager.find(PersonRow, {
      ...(full ? {} : { where: { active: true } }),
      order: { name: 'ASC', id: 'ASC' },
    });
    const described = await this.describe(this.source.manager, people, full);
    const words = query.q?.trim().toLowerCase() ?? '';
    return described.filter(
      (person) => (query.role === undefined || person.roles.includes(query.role)) && matches(person, words),
    );
  }

  /** One person as administrators see them. @throws Refusal not-found */
  async forAdministrators(em: EntityManager, personId: string): Promise<Person> {
    const person = await em.findOneBy(PersonRow, { id: personId });
    const [described] = person ? await this.describe(em, [person], true) : [];
    if (!described) throw notFound();
    return described;
  }

  private async describe(em: EntityManager, people: PersonRow[], full: boolean): Promise<Person[]> {
    const ids = people.map((person) => person.id);
    const roles = await em.findBy(PersonRole, { personId: In(ids) });
    const centres = new Map(
      (await em.findBy(CentreRow, { id: In(people.map((person) => person.centreId)) })).map((centre) => [
        centre.id,
        centre,
      ]),
    );
    const lastSeen = full ? await lastSeenOf(em, ids) : new Map<string, Date>();
    return people.flatMap((person) => {
      const centre = centres.get(person.centreId);
      if (!centre) return [];
      const shown = {
        id: person.id,
        version: person.version,
        name: person.name,
        specialty: person.specialty,
        centre: { id: centre.id, code: centre.code, name: centre.name },
        roles: roles.filter((row) => row.personId === person.id).map((row) => row.role),
      };
      if (!full) return [shown];
      return [
        {
          ...shown,
          email: person.email,
          active: person.active,
          invited: !person.accepted,
          lastSeenAt: lastSeen.get(person.id)?.toISOString() ?? null,
        },
      ];
    });
  }
}

async function lastSeenOf(em: EntityManager, ids: string[]): Promise<Map<string, Date>> {
  if (ids.length === 0) return new Map();
  const rows = await em
    .createQueryBuilder(SessionRow, 'session')
    .select('session.personId', 'personId')
    .addSelect('MAX(session.lastSeenAt)', 'at')
    .where('session.personId IN (:...ids)', { ids })
    .groupBy('session.personId')
    .getRawMany<{ personId: string; at: Date }>();
  return new Map(rows.map((row) => [row.personId, row.at]));
}

function matches(person: Person, words: string): boolean {
  return [person.name, person.specialty, person.centre.name, person.centre.code, person.email ?? ''].some(
    (text) => text.toLowerCase().includes(words),
  );
}
