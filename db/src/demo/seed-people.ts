import { randomUUID } from 'node:crypto';
import { CentresService } from '@weighhouse/server/people/centres.service';
import { InvitationsService } from '@weighhouse/server/people/invitations.service';
import { PersonRegister } from '@weighhouse/server/people/person-register';
import { UnitOfWork } from '@weighhouse/server/platform/database/unit-of-work';
import type { Actor } from '@weighhouse/server/platform/http/actor';
import { network } from './demo-case.js';
import type { Stage } from './stage.js';

export const demoPassword = 'lantern-coast-demo';
export const demoDomain = 'lantern.example';

/** Adds the centres of the network and its people, each of whom accepts and sets the demo's password. */
export async function seedPeople(stage: Stage): Promise<void> {
  const setUp: Actor = {
    id: randomUUID(),
    name: 'Set-up',
    roles: ['administrator'],
    sessionId: randomUUID(),
  };
  const centres = new Map<string, string>();
  for (const centre of network.centres) {
    centres.set(centre.code, (await stage.service(CentresService).add(setUp, centre)).id);
  }
  for (const person of network.people) {
    const roles = [person.role];
    const { personId, token } = await stage.service(UnitOfWork).run(({ em }) =>
      stage.service(PersonRegister).add(
        em,
        {
          email: `${person.id}@${demoDomain}`,
          name: person.name,
          specialty: person.specialty,
          centreId: centres.get(person.centre) ?? '',
          roles,
        },
        null,
      ),
    );
    await stage.service(InvitationsService).accept(token, demoPassword);
    stage.enter(person.id, { id: personId, name: person.name, roles });
  }
}
