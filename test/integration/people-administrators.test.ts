import { execFile } from 'node:child_process';
import path from 'node:path';
import { promisify } from 'node:util';
import { personListSchema } from '@weighhouse/shared/contracts/people';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makePerson, signedIn, testPassword, type TestPerson } from '../factories/people.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { refusal } from '../setup/refusals.js';

let running: RunningApp;
let admin: TestPerson;

beforeAll(async () => {
  running = await startApp();
  admin = await makePerson(running, 'administrator');
});
afterAll(() => running.close());

describe('admin-create', () => {
  const run = promisify(execFile);
  const command = (...args: string[]) =>
    run(process.execPath, [path.resolve('server/dist/admin-create.js'), ...args], {
      env: { ...process.env, DATABASE_URL: running.databaseUrl },
    });

  it('makes an administrator, whose link works once', async () => {
    const { stdout } = await command(
      '--email',
      'First@Tests.example',
      '--name',
      'Fay First',
      '--centre',
      'New Place',
    );
    const token = /^http:\/\/localhost:4180\/invitation\/([\w-]+)\n$/.exec(stdout)?.[1] ?? '';
    await running.agent().post(`/api/invitations/${token}`).send({ password: testPassword }).expect(200);
    const agent = running.agent();
    const { body } = await agent
      .post('/api/session')
      .send({ email: 'first@tests.example', password: testPassword })
      .expect(200);
    expect(body).toMatchObject({ name: 'Fay First', roles: ['administrator'], centre: 'New Place' });
  });

  it('says in words why it does not: a taken e-mail, missing arguments', async () => {
    await expect(command('--email', admin.email, '--name', 'Twice')).rejects.toMatchObject({
      code: 1,
      stderr: 'Somebody with this e-mail is there already.\n',
    });
    await expect(command('--name', '')).rejects.toMatchObject({
      code: 1,
      stderr: expect.stringMatching(/--email must be an e-mail address\n--name must not be empty\nUsage:/),
    });
  });
});

// Last, because strategies of passport are the process's: the application that started last has them.
describe('the last administrator', () => {
  it('can neither be deactivated nor lose the role, not even by two of them at once', async () => {
    const alone = await startApp();
    const [one, two] = [await makePerson(alone, 'administrator'), await makePerson(alone, 'administrator')];
    const [first, second] = [await signedIn(alone, one), await signedIn(alone, two)];
    const { body } = await first.get('/api/people').expect(200);
    const versions = new Map(personListSchema.parse(body).items.map(({ id, version }) => [id, version]));
    const responses = await Promise.all([
      first.patch(`/api/people/${two.id}`).send({ version: versions.get(two.id), active: false }),
      second.patch(`/api/people/${one.id}`).send({ version: versions.get(one.id), roles: ['chair'] }),
    ]);
    expect(responses.map(({ status }) => status).sort()).not.toEqual([200, 200]);
    const admins = await alone.source.query<{ id: string }[]>(
      "SELECT p.id FROM person p JOIN person_role r ON r.personId = p.id AND r.role = 'administrator' WHERE p.active = 1",
    );
    expect(admins).toHaveLength(1);
    const last = admins[0]?.id === one.id ? { person: one, agent: first } : { person: two, agent: second };
    const { body: now } = await last.agent.get('/api/people').expect(200);
    const own = personListSchema.parse(now).items.find(({ id }) => id === last.person.id);
    for (const change of [{ active: false }, { roles: ['chair'] }]) {
      const refused = await last.agent
        .patch(`/api/people/${last.person.id}`)
        .send({ version: own?.version, ...change })
        .expect(409);
      expect(refusal(refused).id).toBe('not-ready');
    }
    await alone.close();
  });
});
