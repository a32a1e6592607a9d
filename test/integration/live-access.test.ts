import { setTimeout as wait } from 'node:timers/promises';
import { liveEvents } from '@weighhouse/shared/contracts/live';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { castOf, openRound, seat, type SeatedPerson, teamOf, unsealedCase } from '../factories/judgements.js';
import { closeListeners, connect, cookieOf, listen, quietly } from '../factories/live.js';
import { makePerson } from '../factories/people.js';
import { type RunningApp, startApp } from '../setup/app.js';

let running: RunningApp;
beforeAll(async () => {
  running = await startApp();
  await castOf(running);
});
afterEach(closeListeners);
afterAll(() => running.close());

const firstOf = (people: SeatedPerson[]): [SeatedPerson, SeatedPerson] => {
  const [first, second] = people;
  if (!first || !second) throw new Error('two contributors are needed');
  return [first, second];
};
const refused = (headers: Record<string, string>) =>
  new Promise<string>((resolve) => {
    const { socket } = connect(running, headers);
    socket.once('connect_error', (error) => {
      resolve(error.message);
    });
    socket.once('connect', () => {
      resolve('connected');
    });
  });

describe('connecting', () => {
  it('takes a running session and a page of ours', async () => {
    const person = await makePerson(running, 'specialist');
    const cookie = await cookieOf(running, person);
    expect(await refused({})).toBe('signed-out');
    expect(await refused({ cookie: 'weighhouse_session=forged' })).toBe('signed-out');
    expect(await refused({ cookie: `${cookie}x` })).toBe('signed-out');
    expect(await refused({ cookie, origin: 'https://elsewhere.example' })).toBe('forbidden');
    expect(await refused({ cookie, origin: running.url })).toBe('connected');
    expect(await refused({ cookie })).toBe('connected');
  });

  it('watches only cases that are open to the person', async () => {
    const case_ = await unsealedCase(running);
    const stranger = await makePerson(running, ['specialist', 'chair']);
    const page = await listen(running, stranger, case_.id);
    const answer = await page.watch(case_.id);
    expect(answer).toMatchObject({ error: { id: 'not-found' } });
    expect(await page.watch('not an identifier')).toMatchObject({ error: { id: 'invalid' } });
    await openRound(case_, 'live');
    await quietly();
    expect(page.of(liveEvents.changed)).toEqual([]);
    expect(page.of(liveEvents.standing)).toEqual([]);
    expect(page.of(liveEvents.present)).toEqual([]);
  });
});

describe('whoever loses the way in', () => {
  it('is thrown out when the session ends, and other sessions stay', async () => {
    const case_ = await unsealedCase(running);
    const [ann] = firstOf(case_.contributors);
    const cookie = await cookieOf(running, ann);
    const page = connect(running, { cookie });
    await page.watch(case_.id);
    const other = await listen(running, ann, case_.id);
    const gone = new Promise((resolve) => page.socket.once('disconnect', resolve));
    await fetch(`${running.url}/api/session`, { method: 'DELETE', headers: { cookie } });
    await gone;
    page.heard.length = 0;
    await openRound(case_, 'live');
    await other.until(liveEvents.changed);
    expect(page.heard).toEqual([]);
    expect(await refused({ cookie })).toBe('signed-out');
  });

  it('is thrown out when taken off the team, at once and for good', async () => {
    const case_ = await unsealedCase(running);
    const [ann] = firstOf(case_.contributors);
    const page = await listen(running, ann, case_.id);
    const witness = await listen(running, case_.chair, case_.id);
    await witness.until(liveEvents.present, (event) => event.people === 2);
    page.heard.length = 0;
    const rest = { ...case_, contributors: case_.contributors.slice(1) };
    await case_.chair.agent.put(`/api/cases/${case_.id}/team`).send(teamOf(rest)).expect(200);
    await witness.until(liveEvents.changed, (event) => event.what === 'team');
    await openRound(case_, 'live');
    await witness.until(liveEvents.changed, (event) => event.what === 'round');
    await quietly();
    expect(page.heard).toEqual([]);
    expect(await page.watch(case_.id)).toMatchObject({ error: { id: 'not-found' } });
    expect(witness.of(liveEvents.present).at(-1)).toEqual({ caseId: case_.id, people: 1 });
  });

  it('is thrown out when deactivated', async () => {
    const case_ = await unsealedCase(running, { ownPeople: true });
    const [ann] = firstOf(case_.contributors);
    const administrator = await seat(running, 'administrator');
    const page = await listen(running, ann, case_.id);
    const gone = new Promise((resolve) => page.socket.once('disconnect', resolve));
    const people = await administrator.agent.get('/api/people').expect(200);
    const row = (people.body as { items: { id: string; version: number }[] }).items.find(
      (one) => one.id === ann.id,
    );
    await administrator.agent
      .patch(`/api/people/${ann.id}`)
      .send({ version: row?.version, active: false })
      .expect(200);
    await gone;
    page.socket.connect();
    await wait(200);
    expect(page.socket.connected).toBe(false);
  });

  it('hears nothing more of a withdrawn case', async () => {
    const case_ = await unsealedCase(running);
    const [ann] = firstOf(case_.contributors);
    const page = await listen(running, ann, case_.id);
    const witness = await listen(running, case_.referrer, case_.id);
    page.heard.length = 0;
    await case_.referrer.agent
      .post(`/api/cases/${case_.id}/withdraw`)
      .send({ words: 'The patient no longer wants it.' })
      .expect(200);
    await witness.until(liveEvents.changed, (event) => event.what === 'case');
    await quietly();
    expect(page.of(liveEvents.changed)).toEqual([]);
  });
});
