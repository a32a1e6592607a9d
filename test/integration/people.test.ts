import { AuditEntry } from '@weighhouse/server/platform/audit-log/audit-entry.entity';
import {
  type Centre,
  type Person,
  personListSchema,
  personSchema,
} from '@weighhouse/shared/contracts/people';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { type Agent, makePerson, signedIn, testPassword, type TestPerson } from '../factories/people.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { mailbox } from '../setup/mailbox.js';

let running: RunningApp;
let admin: TestPerson;
let adminAgent: Agent;
let centre: Centre;
const box = mailbox();

beforeAll(async () => {
  running = await startApp();
  admin = await makePerson(running, 'administrator');
  adminAgent = await signedIn(running, admin);
  const { body } = await adminAgent.get('/api/centres').expect(200);
  centre = (body as { items: [Centre] }).items[0];
});
afterAll(() => running.close());
afterEach(() => {
  running.clock.reset();
});

let count = 0;
const input = (about: object = {}) => {
  count += 1;
  const email = `invited-${String(count)}@tests.example`;
  return {
    email,
    name: 'Dr New',
    specialty: 'Neurology',
    centreId: centre.id,
    roles: ['specialist'],
    ...about,
  };
};
const errorId = (body: unknown): string => (body as { error: { id: string } }).error.id;

/** Invites somebody and takes the link's token out of the letter. */
async function invite(about: object = {}): Promise<{ entry: Person; token: string }> {
  const { body } = await adminAgent.post('/api/people').send(input(about)).expect(201);
  const entry = personSchema.parse(body);
  return { entry, token: await tokenFor(entry.email ?? '') };
}

async function tokenFor(email: string): Promise<string> {
  await running.outbox.flush();
  const letters = (await box.messages()).filter(({ to }) => to.includes(email));
  const link = /http:\/\/localhost:4180\/invitation\/([\w-]+)/.exec(letters.at(-1)?.text ?? '');
  return link?.[1] ?? '';
}

const entryOf = async (id: string): Promise<Person> => {
  const { body } = await adminAgent.get('/api/people').expect(200);
  const entry = personListSchema.parse(body).items.find((person) => person.id === id);
  if (!entry) throw new Error('not in the list');
  return entry;
};

describe('an invitation', () => {
  it('lets a person in once, by the link of the letter, with a password of their own', async () => {
    const { entry, token } = await invite();
    expect(entry).toMatchObject({ active: true, invited: true, lastSeenAt: null });
    const shown = await running.agent().get(`/api/invitations/${token}`).expect(200);
    expect(shown.body).toMatchObject({ name: 'Dr New', email: entry.email });
    await running.agent().post(`/api/invitations/${token}`).send({ password: 'too short' }).expect(400);
    await running.agent().post(`/api/invitations/${token}`).send({ password: testPassword }).expect(200);
    await running
      .agent()
      .post('/api/session')
      .send({ email: entry.email, password: testPassword })
      .expect(200);
    const again = await running
      .agent()
      .post(`/api/invitations/${token}`)
      .send({ password: 'another password of mine' })
      .expect(400);
    expect(errorId(again.body)).toBe('link-unusable');
    const seen = await entryOf(entry.id);
    expect(seen.invited).toBe(false);
    expect(seen.lastSeenAt).not.toBeNull();
  });

  it('answers the same whether used, lapsed, replaced, of somebody deactivated or never made', async () => {
    const used = await invite();
    await running.agent().post(`/api/invitations/${used.token}`).send({ password: testPassword }).expect(200);
    const replaced = await invite();
    await adminAgent.post(`/api/people/${replaced.entry.id}/invite`).expect(200);
    const gone = await invite();
    await adminAgent
      .patch(`/api/people/${gone.entry.id}`)
      .send({ version: gone.entry.version, active: false })
      .expect(200);
    const lapsed = await invite();
    const now = running.clock.now();
    running.clock.set(new Date(now.getTime() + 7 * 24 * 3_600_000 - 60_000));
    await running.agent().get(`/api/invitations/${lapsed.token}`).expect(200);
    running.clock.set(new Date(now.getTime() + 7 * 24 * 3_600_000 + 60_000));
    const answers = [];
    for (const token of [used.token, replaced.token, gone.token, lapsed.token, 'A'.repeat(43), 'x']) {
      const read = await running.agent().get(`/api/invitations/${token}`).expect(400);
      const accepted = await running
        .agent()
        .post(`/api/invitations/${token}`)
        .send({ password: testPassword })
        .expect(400);
      answers.push(read.body, accepted.body);
    }
    expect(errorId(answers[0])).toBe('link-unusable');
    expect(new Set(answers.map((answer) => JSON.stringify(answer))).size).toBe(1);
  });

  it('is used by one of two who open it at once', async () => {
    const { token } = await invite();
    const accept = () => running.agent().post(`/api/invitations/${token}`).send({ password: testPassword });
    const responses = await Promise.all([accept(), accept(), accept()]);
    expect(responses.map(({ status }) => status).sort()).toEqual([200, 400, 400]);
  });

  it('sent again sets a forgotten password and ends what was signed in with the old one', async () => {
    const somebody = await makePerson(running, 'specialist');
    const agent = await signedIn(running, somebody);
    await adminAgent.post(`/api/people/${somebody.id}/invite`).expect(200);
    await agent.get('/api/session').expect(200);
    const token = await tokenFor(somebody.email);
    await running
      .agent()
      .post(`/api/invitations/${token}`)
      .send({ password: 'a new long password' })
      .expect(200);
    await agent.get('/api/session').expect(401);
  });

  it('keeps no token: neither in the database nor in a letter that was sent', async () => {
    const { token } = await invite();
    const rows = await running.source.query<object[]>('SELECT * FROM invitation');
    const letters = await running.source.query<object[]>('SELECT * FROM outbox_mail');
    expect(JSON.stringify([rows, letters])).not.toContain(token);
  });

  it('goes neither to a taken e-mail nor to an unknown centre, and names every fault', async () => {
    const taken = await adminAgent
      .post('/api/people')
      .send(input({ email: admin.email.toUpperCase() }))
      .expect(409);
    expect(errorId(taken.body)).toBe('duplicate');
    await adminAgent
      .post('/api/people')
      .send(input({ centreId: admin.id }))
      .expect(400);
    const { body } = await adminAgent
      .post('/api/people')
      .send({ email: 'x', name: ' ', specialty: 'S', centreId: '1', roles: ['king'] })
      .expect(400);
    const paths = (body as { error: { fields: { path: string }[] } }).error.fields.map((fault) => fault.path);
    expect(paths).toEqual(['email', 'name', 'centreId', 'roles[0]']);
  });

  it('makes one person of two invitations of one e-mail at once', async () => {
    const one = input();
    const responses = await Promise.all([0, 1, 2].map(() => adminAgent.post('/api/people').send(one)));
    expect(responses.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
  });
});

describe('the list of people', () => {
  it('shows others names alone, and only of people who are active', async () => {
    const gone = await makePerson(running, 'specialist');
    const { version } = await entryOf(gone.id);
    await adminAgent.patch(`/api/people/${gone.id}`).send({ version, active: false }).expect(200);
    const chair = await makePerson(running, 'chair', { name: 'Dr Chair of the List' });
    const { body } = await (await signedIn(running, chair)).get('/api/people').expect(200);
    const { items } = personListSchema.parse(body);
    expect(items.map(({ id }) => id)).not.toContain(gone.id);
    expect(items.map(({ id }) => id)).toContain(chair.id);
    expect(JSON.stringify(body)).not.toMatch(/@|lastSeenAt|invited|active|password/i);
    const found = await adminAgent.get('/api/people').query({ role: 'chair', q: 'of the list' }).expect(200);
    expect(personListSchema.parse(found.body).items.map(({ id }) => id)).toEqual([chair.id]);
  });

  it('is changed by administrators alone', async () => {
    const agent = await signedIn(
      running,
      await makePerson(running, ['chair', 'specialist', 'liaison', 'referrer']),
    );
    const refused = [
      await agent.post('/api/people').send(input()),
      await agent.patch(`/api/people/${admin.id}`).send({ version: 1, active: false }),
      await agent.post(`/api/people/${admin.id}/invite`),
      await agent.post('/api/centres').send({ code: 'X', name: 'X' }),
    ];
    expect(refused.map(({ status }) => status)).toEqual([403, 403, 403, 403]);
    await agent.get('/api/centres').expect(200);
  });

  it('takes a new centre once', async () => {
    await adminAgent.post('/api/centres').send({ code: 'NEW', name: 'New Clinic' }).expect(201);
    const { body } = await adminAgent.post('/api/centres').send({ code: 'NEW', name: 'Other' }).expect(409);
    expect(errorId(body)).toBe('duplicate');
  });
});

describe('changing a person', () => {
  it('ends the sessions of somebody deactivated at once, and lets them in again when activated', async () => {
    const somebody = await makePerson(running, 'specialist');
    const agent = await signedIn(running, somebody);
    const { version } = await entryOf(somebody.id);
    await adminAgent.patch(`/api/people/${somebody.id}`).send({ version, active: false }).expect(200);
    await agent.get('/api/session').expect(401);
    const again = await entryOf(somebody.id);
    await adminAgent
      .patch(`/api/people/${somebody.id}`)
      .send({ version: again.version, active: true })
      .expect(200);
    await agent.get('/api/session').expect(401);
    await signedIn(running, somebody);
  });

  it('gives a new role at once', async () => {
    const somebody = await makePerson(running, 'specialist');
    const agent = await signedIn(running, somebody);
    await agent.post('/api/centres').send({ code: 'R1', name: 'R' }).expect(403);
    const { version } = await entryOf(somebody.id);
    await adminAgent
      .patch(`/api/people/${somebody.id}`)
      .send({ version, roles: ['specialist', 'administrator'] })
      .expect(200);
    await agent.post('/api/centres').send({ code: 'R1', name: 'R' }).expect(201);
    const lines = await running.source.manager.findBy(AuditEntry, { action: 'person.changed' });
    expect(lines.at(-1)?.sentence).toContain('roles from specialist to specialist, administrator');
  });

  it('refuses the second of two with the entry as it stands', async () => {
    const somebody = await makePerson(running, 'specialist');
    const { version } = await entryOf(somebody.id);
    const change = (name: string) => adminAgent.patch(`/api/people/${somebody.id}`).send({ version, name });
    const responses = await Promise.all(['A', 'B', 'C'].map(change));
    expect(responses.map(({ status }) => status).sort()).toEqual([200, 409, 409]);
    const won = responses.find(({ status }) => status === 200)?.body as Person;
    const lost = responses.find(({ status }) => status === 409)?.body as {
      error: { id: string; current: unknown };
    };
    expect(lost.error.id).toBe('stale');
    expect(personSchema.parse(lost.error.current).name).toBe(won.name);
  });

  it('answers 404 for somebody who is not there', async () => {
    const unknown = '00000000-0000-4000-8000-000000000000';
    await adminAgent.patch(`/api/people/${unknown}`).send({ version: 1, name: 'N' }).expect(404);
    await adminAgent.post(`/api/people/${unknown}/invite`).expect(404);
    await adminAgent.patch('/api/people/me').send({ version: 1, name: 'N' }).expect(400);
  });
});
