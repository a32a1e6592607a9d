import { SessionsService } from '@weighhouse/server/people/sessions.service';
import { AuditEntry } from '@weighhouse/server/platform/audit-log/audit-entry.entity';
import { meSchema } from '@weighhouse/shared/contracts/people';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { makePerson, signedIn, testPassword, type TestPerson } from '../factories/people.js';
import { type RunningApp, serviceOf, startApp } from '../setup/app.js';

const hourMs = 3_600_000;

let running: RunningApp;
let person: TestPerson;

beforeAll(async () => {
  running = await startApp();
  person = await makePerson(running, ['chair', 'specialist']);
});
afterAll(() => running.close());
afterEach(() => {
  running.clock.reset();
});

const later = (ms: number): void => {
  running.clock.set(new Date(Date.now() + ms));
};

describe('signing in', () => {
  it('answers who one is, without a hash, and sets a cookie that no script and no other site can use', async () => {
    const response = await running
      .agent()
      .post('/api/session')
      .send({ email: ` ${person.email.toUpperCase()} `, password: testPassword })
      .expect(200);
    expect(meSchema.strict().parse(response.body)).toMatchObject({
      id: person.id,
      roles: ['chair', 'specialist'],
    });
    const [cookie] = response.headers['set-cookie'] as unknown as string[];
    expect(cookie).toMatch(/^weighhouse_session=[\w-]+\.[\w-]+\.[\w-]+;/);
    expect(cookie).toMatch(/Path=\/;.*HttpOnly; SameSite=Strict$/);
    expect(cookie).not.toContain('Secure');
  });

  it('gives the same answer to an unknown e-mail, a wrong password, somebody not yet in and somebody deactivated', async () => {
    const admin = await makePerson(running, 'administrator');
    const adminAgent = await signedIn(running, admin);
    const gone = await makePerson(running, 'specialist');
    const { body: people } = await adminAgent.get('/api/people').expect(200);
    const entry = (people as { items: { id: string; version: number; centre: { id: string } }[] }).items.find(
      ({ id }) => id === gone.id,
    );
    await adminAgent
      .patch(`/api/people/${gone.id}`)
      .send({ version: entry?.version, active: false })
      .expect(200);
    const invited = 'not-yet@tests.example';
    await adminAgent
      .post('/api/people')
      .send({ email: invited, name: 'N', specialty: 'S', centreId: entry?.centre.id, roles: ['specialist'] })
      .expect(201);
    const tries = [
      { email: 'nobody@tests.example', password: testPassword },
      { email: person.email, password: 'another password' },
      { email: gone.email, password: testPassword },
      { email: invited, password: testPassword },
    ];
    for (const attempt of tries) {
      const response = await running.agent().post('/api/session').send(attempt).expect(401);
      expect(response.body).toEqual({
        error: { id: 'wrong-credentials', message: 'E-mail and password do not go together.' },
      });
      expect(response.headers['set-cookie']).toBeUndefined();
    }
  });

  it('writes refused attempts into the trail without what was typed', async () => {
    const typed = 'secret-typed-in-the-wrong-field@tests.example';
    await running.agent().post('/api/session').send({ email: typed, password: 'a wrong one' }).expect(401);
    const entries = await running.source.manager.findBy(AuditEntry, { action: 'session.refused' });
    expect(entries.length).toBeGreaterThan(0);
    expect(JSON.stringify(entries)).not.toMatch(/secret-typed|a wrong one/);
  });

  it.each([
    [{}, ['email', 'password']],
    [{ email: { $ne: '' }, password: ['x'] }, ['email', 'password']],
    [{ email: 'a@b.example', password: 'x'.repeat(201) }, ['password']],
    [{ email: '   ', password: '' }, ['email', 'password']],
  ])('names every fault of %j', async (input, paths) => {
    const response = await running.agent().post('/api/session').send(input).expect(400);
    const { error } = response.body as { error: { id: string; fields: { path: string }[] } };
    expect([error.id, error.fields.map(({ path }) => path)]).toEqual(['invalid', paths]);
  });

  it('refuses the eleventh attempt of a minute on one e-mail, even with the right password, and says when to come back', async () => {
    const hunted = await makePerson(running, 'specialist');
    let asked = 0;
    // No proxy is trusted, so whoever sends the header gains nothing by it.
    const attempt = (password: string) =>
      running
        .agent()
        .post('/api/session')
        .set('X-Forwarded-For', `192.0.2.${String((asked += 1))}`)
        .send({ email: hunted.email, password });
    for (let count = 0; count < 10; count += 1) await attempt('guess').expect(401);
    const refused = await attempt(testPassword).expect(429);
    expect((refused.body as { error: { id: string } }).error.id).toBe('too-many');
    const wait = Number(refused.headers['retry-after']);
    expect(wait).toBeGreaterThan(0);
    expect(wait).toBeLessThanOrEqual(60);
    // Somebody else at the same address still gets in, as often as they like.
    for (let count = 0; count < 12; count += 1) await signedIn(running, person);
  });
});

describe('a session', () => {
  it('is asked for by every route that is not public', async () => {
    for (const path of ['/api/session', '/api/people', '/api/centres']) {
      const { body } = await running.agent().get(path).expect(401);
      expect((body as { error: { id: string } }).error.id).toBe('signed-out');
    }
  });

  it('is not made by a forged or an unsigned token', async () => {
    const agent = await signedIn(running, person);
    const sessions = await running.source.query<{ id: string }[]>('SELECT id FROM session LIMIT 1');
    const encode = (value: object): string => Buffer.from(JSON.stringify(value)).toString('base64url');
    const claims = encode({ sid: sessions[0]?.id });
    const unsigned = `${encode({ alg: 'none', typ: 'JWT' })}.${claims}.`;
    const forged = `${encode({ alg: 'HS256', typ: 'JWT' })}.${claims}.${'A'.repeat(43)}`;
    for (const token of [unsigned, forged, 'nonsense', '']) {
      await running.agent().get('/api/session').set('Cookie', `weighhouse_session=${token}`).expect(401);
      expect(await serviceOf(running.app, SessionsService).actorOf(token)).toBeNull();
    }
    await agent.get('/api/session').expect(200);
  });

  it('ends with signing out, also for whoever kept the cookie', async () => {
    const agent = running.agent();
    const response = await agent
      .post('/api/session')
      .send({ email: person.email, password: testPassword })
      .expect(200);
    const [cookie] = response.headers['set-cookie'] as unknown as string[];
    const kept = cookie?.split(';')[0] ?? '';
    const token = kept.split('=')[1] ?? '';
    const actor = await serviceOf(running.app, SessionsService).actorOf(token);
    expect(actor).toMatchObject({ id: person.id, roles: ['chair', 'specialist'] });
    await agent.delete('/api/session').expect(200);
    await running.agent().get('/api/session').set('Cookie', kept).expect(401);
    expect(await serviceOf(running.app, SessionsService).actorOf(token)).toBeNull();
  });

  it('ends everywhere at once when asked to', async () => {
    const [here, there] = [await signedIn(running, person), await signedIn(running, person)];
    await here.delete('/api/sessions').expect(200);
    await here.get('/api/session').expect(401);
    await there.get('/api/session').expect(401);
  });

  it('ends after twelve hours of rest, and goes on while it is used', async () => {
    const agent = await signedIn(running, person);
    later(11 * hourMs);
    await agent.get('/api/session').expect(200);
    later(22 * hourMs);
    await agent.get('/api/session').expect(200);
    later(34.1 * hourMs);
    await agent.get('/api/session').expect(401);
  });

  it('ends after seven days, however busy', async () => {
    const agent = await signedIn(running, person);
    for (let hours = 11; hours < 168; hours += 11) {
      later(hours * hourMs);
      await agent.get('/api/session').expect(200);
    }
    later(168.1 * hourMs);
    await agent.get('/api/session').expect(401);
  });
});

describe('a request from another site', () => {
  it.each([
    { 'Sec-Fetch-Site': 'cross-site' },
    { 'Sec-Fetch-Site': 'same-site' },
    { Origin: 'https://elsewhere.example' },
    { Origin: 'null' },
  ])('changes nothing: %j', async (headers) => {
    const agent = await signedIn(running, person);
    const { body } = await agent.delete('/api/session').set(headers).expect(403);
    expect((body as { error: { id: string } }).error.id).toBe('forbidden');
    await agent.get('/api/session').expect(200);
  });

  it('may look, and our own page may do', async () => {
    const agent = await signedIn(running, person);
    await agent.get('/api/session').set('Sec-Fetch-Site', 'cross-site').expect(200);
    await agent.delete('/api/session').set('Origin', 'http://localhost:4180').expect(200);
  });
});

describe('changing the password', () => {
  it('asks for the old one, and signs out every other device', async () => {
    const somebody = await makePerson(running, 'specialist');
    const [here, there] = [await signedIn(running, somebody), await signedIn(running, somebody)];
    const change = (currentPassword: string, newPassword: string) =>
      here.put('/api/me/password').send({ currentPassword, newPassword });
    const wrong = await change('not this one', 'a longer password').expect(403);
    expect((wrong.body as { error: { id: string } }).error.id).toBe('wrong-password');
    await change(testPassword, 'short').expect(400);
    await there.get('/api/session').expect(200);
    await change(testPassword, 'a longer password').expect(200);
    await here.get('/api/session').expect(200);
    await there.get('/api/session').expect(401);
    const signIn = (password: string) =>
      running.agent().post('/api/session').send({ email: somebody.email, password });
    await signIn(testPassword).expect(401);
    await signIn('a longer password').expect(200);
  });

  it('cannot be guessed by trying: the eleventh attempt of a minute is refused', async () => {
    const somebody = await makePerson(running, 'specialist');
    const agent = await signedIn(running, somebody);
    const attempt = (currentPassword: string) =>
      agent.put('/api/me/password').send({ currentPassword, newPassword: 'a longer password' });
    for (let count = 0; count < 10; count += 1) await attempt('guess').expect(403);
    const refused = await attempt(testPassword).expect(429);
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
  });
});

describe('the cookie on https', () => {
  it('is sent over https alone', async () => {
    const secure = await startApp({ PUBLIC_URL: 'https://weighhouse.example' });
    const somebody = await makePerson(secure, 'specialist');
    const response = await secure
      .agent()
      .post('/api/session')
      .send({ email: somebody.email, password: testPassword })
      .expect(200);
    expect(String(response.headers['set-cookie'])).toContain('Secure');
    await secure.close();
  });
});
