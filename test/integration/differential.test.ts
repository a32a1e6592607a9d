import type { CaseListItem } from '@weighhouse/shared/contracts/cases';
import type { Differential, PanelView } from '@weighhouse/shared/contracts/differential';
import { assess } from '@weighhouse/shared/reasoning/assess';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  castOf,
  handIn,
  judge,
  type JudgedCase,
  openRound,
  readDifferential,
  savePrior,
  saveRow,
  seat,
  type SeatedPerson,
  teamOf,
  unseal,
  unsealedCase,
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { refusal } from '../setup/refusals.js';

let running: RunningApp;
beforeAll(async () => {
  running = await startApp();
  await castOf(running);
});
afterAll(() => running.close());

const panelFor = async (case_: JudgedCase, person: SeatedPerson): Promise<PanelView> =>
  (await person.agent.get(`/api/cases/${case_.id}/panel`).expect(200)).body as PanelView;
const listed = async (case_: JudgedCase, person: SeatedPerson) =>
  ((await person.agent.get('/api/cases?size=100').expect(200)).body as { items: CaseListItem[] }).items.find(
    (item) => item.id === case_.id,
  );

/** The assessment as the answer carries it. */
const assessed = (panel: PanelView) => JSON.parse(JSON.stringify(assess(panel))) as unknown;

describe('the differential', () => {
  it('is exactly what assess() makes of the panel route, for each who may see it', async () => {
    const case_ = await unsealedCase(running, { weights: [1.5, 1, 0.5] });
    for (const person of [case_.chair, case_.referrer, ...case_.contributors]) {
      const panel = await panelFor(case_, person);
      const { assessment } = await readDifferential(case_, person);
      expect(assessment).toEqual(assessed(panel));
      expect(panel.contributors.map((one) => one.weight).sort()).toEqual([0.5, 1, 1.5]);
      expect(panel).toMatchObject({ coexistence: 0, tempering: 0.6, candidates: case_.candidateIds });
    }
  });

  it('names the contributors to each other and to the chair', async () => {
    const case_ = await unsealedCase(running);
    const [ann, ben, cam] = case_.contributors;
    if (!ann || !ben || !cam) throw new Error('three contributors are needed');
    const seen = await readDifferential(case_, ann);
    expect(seen.others?.map((other) => other.personId).sort()).toEqual([ben.id, cam.id].sort());
    const shown = seen.others?.find((other) => other.personId === ben.id);
    expect(shown).toMatchObject({ key: ben.id, name: ben.name, prior: { outOf100: [52.9, 17.4, 29.7] } });
    expect(Object.keys(seen.assessment?.own ?? {}).sort()).toEqual([ann.id, ben.id, cam.id].sort());
    expect(seen.mine).toMatchObject({ key: ann.id, prior: { outOf100: [31.7, 23.6, 44.7] } });
    expect((await readDifferential(case_, case_.chair)).others).toHaveLength(3);
  });

  it('gives the referrer the numbers and nothing that tells whose they are', async () => {
    const case_ = await unsealedCase(running, { contributors: 3 });
    const seen = await readDifferential(case_, case_.referrer);
    expect(seen.mine).toBeNull();
    expect(seen.others?.map((other) => other.prior?.outOf100).sort()).toEqual([
      [12.1, 61.3, 26.6],
      [31.7, 23.6, 44.7],
      [52.9, 17.4, 29.7],
    ]);
    expect(Object.keys(seen.assessment?.own ?? {}).sort()).toEqual(['c1', 'c2', 'c3']);
    const panel = await panelFor(case_, case_.referrer);
    const text = JSON.stringify([seen.others, seen.assessment, panel]);
    for (const person of case_.contributors) {
      expect(text).not.toContain(person.id);
      expect(text).not.toContain(person.name);
    }
    const moments = seen.others?.flatMap((one) => [
      one.prior?.savedAt,
      ...one.findings.map((row) => row.savedAt),
    ]);
    expect(new Set(moments).size).toBe(1);
    expect(new Set(seen.others?.map((one) => one.prior?.version))).toEqual(new Set([0]));
  });

  it('does not number contributors in the order of the team', async () => {
    const orders = new Set<string>();
    for (let k = 0; k < 8 && orders.size < 2; k += 1) {
      const case_ = await unsealedCase(running);
      const { others } = await readDifferential(case_, case_.referrer);
      const first = (key: string) => others?.find((other) => other.key === key)?.prior?.outOf100[0];
      orders.add(['c1', 'c2', 'c3'].map(first).join(' '));
    }
    expect(orders.size).toBe(2);
  });

  it('marks where the panel stood before the round that is open', async () => {
    const case_ = await unsealedCase(running);
    expect((await readDifferential(case_, case_.chair)).before).toBeNull();
    const unsealed = (await readDifferential(case_, case_.chair)).assessment?.standing;
    await openRound(case_, 'live');
    const [ann] = case_.contributors;
    if (!ann) throw new Error('a contributor is needed');
    await savePrior(case_, ann, [90, 5, 5]);
    const moved = await readDifferential(case_, case_.referrer);
    expect(moved.before).toEqual(unsealed);
    expect(moved.assessment?.standing).not.toEqual(unsealed);
    await case_.chair.agent
      .post(`/api/cases/${case_.id}/candidates`)
      .send({ name: 'Sarcoidosis' })
      .expect(201);
    const widened = await readDifferential(case_, case_.referrer);
    expect(widened.before).toEqual([unsealed?.[0], unsealed?.[1], null, unsealed?.[2]]);
  });

  it('follows weights, findings and settings, and so does the list', async () => {
    const case_ = await unsealedCase(running);
    const leader = async (): Promise<number> => {
      const { assessment } = await readDifferential(case_, case_.chair);
      const item = await listed(case_, case_.chair);
      const largest = Math.max(...(assessment?.standing ?? []));
      expect(item?.leader).toMatchObject({ share: largest });
      expect(item?.disagreementBits).toBeCloseTo(assessment?.disagreementBits ?? NaN, 12);
      return largest;
    };
    const shares = [await leader()];
    const people = { ...case_, contributors: case_.contributors };
    await case_.chair.agent
      .put(`/api/cases/${case_.id}/team`)
      .send(teamOf(people, [3, 1, 0.5]))
      .expect(200);
    shares.push(await leader());
    await case_.chair.agent
      .patch(`/api/cases/${case_.id}/settings`)
      .send({ tempering: 1, reason: 'few findings, far apart' })
      .expect(200);
    shares.push(await leader());
    const rash = case_.findings[1];
    await case_.chair.agent
      .patch(`/api/findings/${rash?.id ?? ''}`)
      .send({ version: rash?.version, observed: 1 })
      .expect(200);
    shares.push(await leader());
    await case_.chair.agent
      .put(`/api/cases/${case_.id}/team`)
      .send(teamOf({ ...people, contributors: people.contributors.slice(0, 2) }, [3, 1]))
      .expect(200);
    shares.push(await leader());
    expect(new Set(shares).size).toBe(5);
    expect((await panelFor(case_, case_.chair)).contributors).toHaveLength(2);
  });

  it('stands alone for its contributor by their own numbers only', async () => {
    const case_ = await acceptedCase(running);
    await openRound(case_, 'sealed');
    const [ann] = case_.contributors;
    if (!ann) throw new Error('a contributor is needed');
    expect((await readDifferential(case_, ann)).mine?.standing).toBeNull();
    await judge(case_, ann, 0);
    const { mine, settings } = await readDifferential(case_, ann);
    const [fever, rash] = case_.findings;
    const alone = assess({
      candidates: case_.candidateIds,
      tempering: settings.tempering,
      findings: [
        { id: fever?.id ?? '', observed: 1 },
        { id: rash?.id ?? '', observed: 0 },
      ],
      contributors: [
        {
          id: 'own',
          prior: [0.317, 0.236, 0.447],
          likelihoods: {
            [fever?.id ?? '']: { given: [0.713, 0.489, 0.119] },
            [rash?.id ?? '']: { given: [0.687, 0.093, 0.211] },
          },
        },
      ],
    });
    expect(mine?.standing).toHaveLength(3);
    for (const [k, share] of (mine?.standing ?? []).entries())
      expect(share).toBeCloseTo(alone.standing[k] ?? 0, 12);
  });

  it('shows no pool while everybody in it weighs nothing, and says so on the panel route', async () => {
    const case_ = await unsealedCase(running);
    await case_.chair.agent
      .put(`/api/cases/${case_.id}/team`)
      .send(teamOf(case_, [0, 0, 0]))
      .expect(200);
    expect((await readDifferential(case_, case_.chair)).assessment).toBeNull();
    const panel = await case_.chair.agent.get(`/api/cases/${case_.id}/panel`);
    expect([panel.status, refusal(panel).id]).toEqual([422, 'panel-refused']);
    expect((await listed(case_, case_.chair))?.leader).toBeNull();
  });
});

describe('a later sealed round', () => {
  it('leaves the pool, the panel and everybody’s numbers as they were before it opened', async () => {
    const case_ = await unsealedCase(running);
    const [ann, ben] = case_.contributors;
    if (!ann || !ben) throw new Error('two contributors are needed');
    const everybody = [case_.chair, case_.referrer, ben];
    const before = new Map<SeatedPerson, [Differential, PanelView]>();
    for (const person of everybody)
      before.set(person, [await readDifferential(case_, person), await panelFor(case_, person)]);
    const round = await openRound(case_, 'sealed');
    await savePrior(case_, ann, [97.1, 1.6, 1.3]);
    await saveRow(case_, ann, 2, [[1.7, 1.9, 96.4], null, null]);
    await handIn(round, ann);
    for (const person of everybody) {
      const [old, panel] = before.get(person) ?? [];
      const now = await readDifferential(case_, person);
      expect(now.assessment).toEqual(old?.assessment);
      expect(now.others).toEqual(old?.others);
      expect(now.before).toEqual(old?.assessment?.standing);
      expect(now).toMatchObject({ sealed: true, shownRound: { number: 1, live: false } });
      expect(await panelFor(case_, person)).toEqual(panel);
      expect(await listed(case_, person)).toMatchObject({ leader: 'sealed', disagreementBits: 'sealed' });
    }
    for (const person of case_.contributors.slice(1)) await handIn(round, person);
    await unseal(case_, round);
    const after = await readDifferential(case_, case_.chair);
    expect(after.others?.find((other) => other.personId === ann.id)?.prior?.outOf100).toEqual([
      97.1, 1.6, 1.3,
    ]);
    expect(after.assessment).not.toEqual(before.get(case_.chair)?.[0].assessment);
  });
});

describe('who may read it', () => {
  it('are the panel’s people, each at the right time', async () => {
    const case_ = await acceptedCase(running);
    const stranger = await seat(running, ['chair', 'specialist', 'administrator']);
    for (const route of [`/api/cases/${case_.id}/differential`, `/api/cases/${case_.id}/panel`]) {
      await case_.liaison.agent.get(route).expect(403);
      await stranger.agent.get(route).expect(404);
      await running.agent().get(route).expect(401);
    }
    const early = await case_.chair.agent.get(`/api/cases/${case_.id}/panel`);
    expect([early.status, refusal(early).id]).toEqual([409, 'wrong-state']);
    const empty = await readDifferential(case_, case_.chair);
    expect(empty).toMatchObject({
      round: null,
      shownRound: null,
      sealed: false,
      assessment: null,
      others: null,
    });
    await openRound(case_, 'sealed');
    const sealed = await case_.chair.agent.get(`/api/cases/${case_.id}/panel`);
    expect([sealed.status, refusal(sealed).id]).toEqual([403, 'sealed']);
  });
});
