import { setTimeout as wait } from 'node:timers/promises';
import { liveEvents } from '@weighhouse/shared/contracts/live';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  castOf,
  handIn,
  judge,
  openRound,
  readDifferential,
  savePrior,
  saveRow,
  type SeatedPerson,
  unsealedCase,
} from '../factories/judgements.js';
import { closeListeners, listen, quietly } from '../factories/live.js';
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

describe('a live round', () => {
  it('pushes each save to every open page: the standing first, then what changed, with the revision', async () => {
    const case_ = await unsealedCase(running);
    await openRound(case_, 'live');
    const [ann, ben] = firstOf(case_.contributors);
    const pages = await Promise.all(
      [ann, ben, case_.chair, case_.referrer].map((person) => listen(running, person, case_.id)),
    );
    const { revision } = await readDifferential(case_, ann);
    await savePrior(case_, ann, [80, 10, 10]);
    await saveRow(case_, ben, 0, [90, 20, 10]);
    for (const page of pages) {
      await page.until(liveEvents.changed, (event) => event.revision === revision + 2);
      const told = page.heard.filter((one) => one.event !== liveEvents.present);
      expect(told.map((one) => [one.event, one.payload.revision, one.payload.what])).toEqual([
        [liveEvents.standing, expect.any(Number), undefined],
        [liveEvents.changed, revision + 1, 'judgements'],
        [liveEvents.standing, revision + 2, undefined],
        [liveEvents.changed, revision + 2, 'judgements'],
      ]);
      const { assessment, candidateSet } = await readDifferential(case_, case_.chair);
      expect(page.of(liveEvents.standing).at(-1)).toEqual({
        caseId: case_.id,
        revision: revision + 2,
        candidateSet,
        standing: assessment?.standing,
      });
    }
  });

  it('tells a liaison nothing of it', async () => {
    const case_ = await unsealedCase(running);
    await openRound(case_, 'live');
    const [ann] = firstOf(case_.contributors);
    const page = await listen(running, case_.liaison, case_.id);
    const witness = await listen(running, case_.chair, case_.id);
    await savePrior(case_, ann, [80, 10, 10]);
    await witness.until(liveEvents.standing);
    await case_.chair.agent
      .post(`/api/cases/${case_.id}/candidates`)
      .send({ name: 'Sarcoidosis' })
      .expect(201);
    await witness.until(liveEvents.changed, (event) => event.what === 'candidates');
    await quietly();
    expect(page.heard).toEqual([]);
  });

  it('keeps the order of revisions when many save at once', async () => {
    const case_ = await unsealedCase(running);
    await openRound(case_, 'live');
    const page = await listen(running, case_.chair, case_.id);
    const { candidateSet, revision } = await readDifferential(case_, case_.chair);
    const saves = case_.contributors.flatMap((person) =>
      [10, 20, 30].map((first) =>
        person.agent
          .put(`/api/cases/${case_.id}/judgement/prior`)
          .send({ candidateSet, outOf100: [first, 60 - first, 40] })
          .expect(200),
      ),
    );
    await Promise.all(saves);
    await page.until(liveEvents.changed, (event) => event.revision === revision + 9);
    expect(page.of(liveEvents.changed).map((event) => event.revision)).toEqual(
      Array.from({ length: 9 }, (_, k) => revision + 1 + k),
    );
    const { assessment } = await readDifferential(case_, case_.chair);
    expect(page.of(liveEvents.standing).at(-1)?.standing).toEqual(assessment?.standing);
  });
});

describe('a sealed round', () => {
  it('tells of hand-ins and unsealing, never of a save, and sends no standing', async () => {
    const case_ = await acceptedCase(running);
    const round = await openRound(case_, 'sealed');
    const [ann] = firstOf(case_.contributors);
    const pages = await Promise.all(
      [...case_.contributors, case_.chair, case_.referrer, case_.liaison].map((person) =>
        listen(running, person, case_.id),
      ),
    );
    for (const page of pages) page.heard.length = 0;
    await judge(case_, ann, 0);
    await quietly();
    expect(pages.map((page) => page.of(liveEvents.changed).length)).toEqual([0, 0, 0, 0, 0, 0]);
    for (const person of case_.contributors) await handIn(round, person, { noMore: true });
    await quietly();
    for (const page of pages.slice(0, 5)) {
      expect(page.of(liveEvents.changed).map((event) => event.what)).toEqual(['round', 'round', 'round']);
      expect(page.of(liveEvents.standing)).toEqual([]);
    }
    await case_.chair.agent.post(`/api/rounds/${round.id}/unseal`).send({}).expect(200);
    for (const page of pages.slice(0, 5)) await page.until(liveEvents.standing);
    await quietly();
    expect(pages[5]?.heard).toEqual([]);
  });

  it('sends no standing of a later sealed round, whatever else changes', async () => {
    const case_ = await unsealedCase(running);
    const page = await listen(running, case_.chair, case_.id);
    await openRound(case_, 'sealed');
    await page.until(liveEvents.changed, (event) => event.what === 'round');
    const added = await case_.chair.agent
      .post(`/api/cases/${case_.id}/findings`)
      .send({ title: 'Sore throat', observed: 1 })
      .expect(201);
    expect(added.status).toBe(201);
    await page.until(liveEvents.changed, (event) => event.what === 'findings');
    expect(page.of(liveEvents.standing)).toEqual([]);
  });
});

describe('two pages of one person, and a connection that drops', () => {
  it('both hear it, and count as one present', async () => {
    const case_ = await unsealedCase(running);
    await openRound(case_, 'live');
    const [ann] = firstOf(case_.contributors);
    const first = await listen(running, ann, case_.id);
    const second = await listen(running, ann, case_.id);
    await savePrior(case_, ann, [70, 20, 10]);
    await first.until(liveEvents.standing);
    await second.until(liveEvents.standing);
    expect(first.of(liveEvents.present).at(-1)).toEqual({ caseId: case_.id, people: 1 });
    const chair = await listen(running, case_.chair, case_.id);
    await first.until(liveEvents.present, (event) => event.people === 2);
    chair.socket.disconnect();
    await first.until(liveEvents.present, (event) => event.people === 2);
    for (let tries = 0; tries < 100 && first.of(liveEvents.present).at(-1)?.people !== 1; tries += 1)
      await wait(10);
    expect(first.of(liveEvents.present).at(-1)?.people).toBe(1);
  });

  it('comes back, joins again and learns by the revision that it missed something', async () => {
    const case_ = await unsealedCase(running);
    await openRound(case_, 'live');
    const [ann, ben] = firstOf(case_.contributors);
    const page = await listen(running, ben, case_.id);
    const joined = (await page.watch(case_.id)) as { revision: number };
    page.socket.io.engine.close();
    await new Promise<void>((resolve) => page.socket.once('connect', resolve));
    page.heard.length = 0;
    await savePrior(case_, ann, [70, 20, 10]);
    await quietly();
    expect(page.of(liveEvents.standing)).toEqual([]);
    const again = (await page.watch(case_.id)) as { revision: number };
    expect(again.revision).toBe(joined.revision + 1);
    await savePrior(case_, ann, [60, 30, 10]);
    const told = await page.until(liveEvents.standing);
    expect(told.revision).toBe(again.revision + 1);
  });

  it('stops hearing what it no longer watches', async () => {
    const case_ = await unsealedCase(running);
    const page = await listen(running, case_.chair, case_.id);
    await page.socket.timeout(15_000).emitWithAck(liveEvents.unwatch, { caseId: case_.id });
    page.heard.length = 0;
    await openRound(case_, 'live');
    await quietly();
    expect(page.heard).toEqual([]);
  });
});
