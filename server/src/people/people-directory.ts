import { Injectable } from '@nestjs/common';
import type { PersonRef } from '@weighhouse/shared/contracts/common';
import type { Role } from '@weighhouse/shared/contracts/people';
import { DataSource, type EntityManager, In } from 'typeorm';
import { CentreRow } from './centre.entity.js';
import { PersonRole } from './person-role.entity.js';
import { PersonRow } from './person.entity.js';

/** A person as other domains need them. The e-mail is for the outbox, never for an answer. */
export interface PersonEntry extends PersonRef {
  email: string;
  roles: Role[];
  /** May sign in; false once deactivated. */
  active: boolean;
}

/** Names of people for the other domains. Deactivated people are found too, because history names them. */
@Injectable()
export class PeopleDirectory {
  constructor(private readonly source: DataSource) {}

  /**
   * @param ids may repeat; unknown ones are left out of the answer
   * @param em the running transaction, for people added in it
   */
  async byIds(
    ids: readonly string[],
    em: EntityManager = this.source.manager,
  ): Promise<Map<string, PersonEntry>> {
    const wanted = [...new Set(ids)];
    if (wanted.length === 0) return new Map();
    const people = await em.findBy(PersonRow, { id: In(wanted) });
    const roles = await em.findBy(PersonRole, { personId: In(wanted) });
    const centres = await em.findBy(CentreRow, { id: In(people.map((person) => person.centreId)) });
    const centreNames = new Map(centres.map((centre) => [centre.id, centre.name]));
    return new Map(
      people.map((person) => [
        person.id,
        {
          id: person.id,
          name: person.name,
          specialty: person.specialty,
          centre: centreNames.get(person.centreId) ?? '',
          email: person.email,
          roles: roles.filter((row) => row.personId === person.id).map((row) => row.role),
          active: person.active,
        },
      ]),
    );
  }

  async byId(id: string, em?: EntityManager): Promise<PersonEntry | null> {
    return (await this.byIds([id], em)).get(id) ?? null;
  }
}

/** The part of an entry that may be answered to anybody on a case. */
export function personRef(entry: PersonEntry): PersonRef {
  return { id: entry.id, name: entry.name, specialty: entry.specialty, centre: entry.centre };
}
