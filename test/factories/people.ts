import { randomUUID } from 'node:crypto';
import { CentresService } from '@weighhouse/server/people/centres.service';
import { InvitationsService } from '@weighhouse/server/people/invitations.service';
import { PersonRegister } from '@weighhouse/server/people/person-register';
import { UnitOfWork } from '@weighhouse/server/platform/database/unit-of-work';
import type { Actor } from '@weighhouse/server/platform/http/actor';
import type { Centre, Role } from '@weighhouse/shared/contracts/people';
import type supertest from 'supertest';
import { type RunningApp, serviceOf } from '../setup/app.js';

export const testPassword = 'a password of the tests';

export interface TestPerson {
  id: string;
  email: string;
  name: string;
  roles: Role[];
  /** For calling services directly. */
  actor: Actor;
}

let count = 0;
const centres = new WeakMap<RunningApp, Promise<Centre>>();

function centreOf(running: RunningApp): Promise<Centre> {
  const known = centres.get(running) ?? addCentre(running);
  centres.set(running, known);
  return known;
}

function addCentre(running: RunningApp): Promise<Centre> {
  const system: Actor = {
    id: randomUUID(),
    name: 'Set-up',
    roles: ['administrator'],
    sessionId: randomUUID(),
  };
  return serviceOf(running.app, CentresService).add(system, { code: 'TST', name: 'Test Hospital' });
}

/** Invites a person with these roles, who accepts and sets the tests' password. */
export async function makePerson(
  running: RunningApp,
  roles: Role | Role[],
  about: { name?: string; email?: string; specialty?: string } = {},
): Promise<TestPerson> {
  count += 1;
  const list = [roles].flat();
  const name = about.name ?? `Dr ${list[0] ?? 'nobody'} ${String(count)}`;
  const email = about.email ?? `person-${String(count)}@tests.example`;
  const centre = await centreOf(running);
  const { personId, token } = await serviceOf(running.app, UnitOfWork).run(({ em }) =>
    serviceOf(running.app, PersonRegister).add(
      em,
      {
        email,
        name,
        specialty: about.specialty ?? 'General internal medicine',
        centreId: centre.id,
        roles: list,
      },
      null,
    ),
  );
  await serviceOf(running.app, InvitationsService).accept(token, testPassword);
  return {
    id: personId,
    email,
    name,
    roles: list,
    actor: { id: personId, name, roles: list, sessionId: randomUUID() },
  };
}

export type Agent = ReturnType<typeof supertest.agent>;

/** A browser in which this person is signed in. */
export async function signedIn(running: RunningApp, person: TestPerson): Promise<Agent> {
  const agent = running.agent();
  await agent.post('/api/session').send({ email: person.email, password: testPassword }).expect(200);
  return agent;
}
