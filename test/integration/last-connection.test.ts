import type { QueryRunner } from 'typeorm';
import { afterAll, beforeAll, expect, it } from 'vitest';
import {
  handIn,
  judge,
  openRound,
  readDifferential,
  type SeatedPerson,
  teamOf,
} from '../factories/judgements.js';
import { concludedCase } from '../factories/plans.js';
import { type RunningApp, startApp } from '../setup/app.js';

/** Waiting for a connection that nobody will give back ends no sooner than this. */
const long = 240_000;
const words = { words: 'As agreed.' };

let running: RunningApp;
let held: QueryRunner[];

beforeAll(async () => {
  running = await startApp();
  const { connectionLimit } = running.source.options.extra as { connectionLimit: number };
  held = Array.from({ length: connectionLimit - 1 }, () => running.source.createQueryRunner());
  await Promise.all(held.map((runner) => runner.connect()));
}, long);
afterAll(async () => {
  await Promise.all(held.map((runner) => runner.release()));
  await running.close();
});

/**
 * A request that holds a connection must not ask for a second one: as many such requests at once as there are
 * connections would wait for each other for ever, and nobody else would be answered any more.
 */
it(
  'plays a case to its end, and refuses, with the last connection of the pool',
  async () => {
    const case_ = await concludedCase(running, { contributors: 3 });
    const [ann, ben] = case_.contributors;
    if (!ann || !ben) throw new Error('two contributors are needed');
    const at = (path: string): string => `/api/cases/${case_.id}${path}`;
    const get = async ({ agent }: SeatedPerson, path: string) =>
      (await agent.get(path).expect(200)).body as unknown;

    const { signed } = (await get(case_.chair, at('/plan'))) as { signed: { actions: { id: string }[] }[] };
    const [ofReferrer] = signed[0]?.actions ?? [];
    await case_.chair.agent
      .post(`/api/actions/${ofReferrer?.id ?? ''}/done`)
      .send(words)
      .expect(403);
    await case_.referrer.agent
      .post(`/api/actions/${ofReferrer?.id ?? ''}/done`)
      .send(words)
      .expect(200);

    const card = { name: 'Rosalind', birthDate: '1985-04-12', telephone: '', language: '', howToReach: '' };
    await case_.referrer.agent
      .put(at('/identity'))
      .send({ version: 0, ...card })
      .expect(200);
    await case_.liaison.agent
      .put(at('/identity'))
      .send({ version: 0, ...card })
      .expect(409);
    await get(case_.liaison, at('/identity'));
    await case_.liaison.agent
      .put(at('/summary'))
      .send({ version: 0, body: 'In plain words.', ready: true })
      .expect(200);
    await case_.chair.agent.post(at('/summary/return')).send(words).expect(200);
    await case_.liaison.agent
      .put(at('/summary'))
      .send({ version: 2, body: 'Plainer.', ready: true })
      .expect(200);
    await case_.chair.agent.post(at('/summary/approve')).send({ version: 3 }).expect(200);
    const contact = { at: new Date().toISOString(), how: 'telephone', reached: true };
    await case_.liaison.agent.post(at('/summary/told')).send(contact).expect(200);

    await case_.chair.agent.post(at('/reopen')).send(words).expect(200);
    const round = await openRound(case_, 'live');
    await judge(case_, ann, 2);
    await handIn(round, ann);
    await case_.chair.agent
      .put(at('/team'))
      .send(teamOf(case_, [0.5]))
      .expect(200);
    await case_.chair.agent
      .patch(at('/settings'))
      .send({ tempering: 0.8, reason: 'Few findings overlap.' })
      .expect(200);
    await case_.chair.agent.post(`/api/rounds/${round.id}/close`).expect(200);
    await case_.chair.agent
      .post(`/api/candidates/${case_.candidateIds[1] ?? ''}/retire`)
      .send(words)
      .expect(200);

    for (const person of [case_.referrer, case_.chair, ann]) {
      for (const path of [
        '',
        '/differential',
        '/panel',
        '/rounds',
        '/seals',
        '/plan',
        '/trail',
        '/findings',
        '/reports',
      ])
        await get(person, at(path));
      for (const format of ['pdf', 'letter', 'fhir', 'panel'])
        await get(person, at(`/export?format=${format}`));
      for (const path of ['/api/cases', '/api/today', '/api/people', '/api/session']) await get(person, path);
    }
    await get(case_.liaison, '/api/tell');
    expect((await readDifferential(case_, ben)).others).toHaveLength(2);
  },
  long,
);
