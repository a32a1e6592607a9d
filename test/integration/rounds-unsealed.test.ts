import type { Case } from '@weighhouse/shared/contracts/cases';
import type { Round } from '@weighhouse/shared/contracts/rounds';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  castOf,
  handIn,
  judge,
  type JudgedCase,
  openRound,
  readDifferential,
  saveRow,
  unseal,
  unsealedCase,
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { paths, refusal } from '../setup/refusals.js';

let running: RunningApp;
beforeAll(async () => {
  running = await startApp();
  await castOf(running);
});
afterAll(() => running.close());

const roundsOf = async (case_: JudgedCase, person: { agent: JudgedCase['chair']['agent'] }) =>
  ((await person.agent.get(`/api/cases/${case_.id}/rounds`).expect(200)).body as { items: Round[] }).items;

describe('unsealing', () => {
  it('waits for the quorum, and says what is missing', async () => {
    const case_ = await acceptedCase(running, { contributors: 4 });
    const round = await openRound(case_, 'sealed');
    const [ann, ben, cam] = case_.contributors;
    for (const [k, person] of [ann, ben].entries()) {
      if (!person) throw new Error('contributors are needed');
      await judge(case_, person, k as 0 | 1);
      await handIn(round, person);
    }
    const route = `/api/rounds/${round.id}/unseal`;
    const early = await case_.chair.agent.post(route).send({ reason: 'no time' });
    expect([early.status, refusal(early).id]).toEqual([409, 'not-ready']);
    expect(paths(early)).toEqual(['quorum', 'deadline']);
    await ann?.agent.post(route).send({}).expect(403);
    if (!cam) throw new Error('a third contributor is needed');
    await handIn(round, cam, { noMore: true });
    const unsealed = await unseal(case_, round);
    expect(unsealed).toMatchObject({ state: 'unsealed', unsealReason: null, closedAt: null });
    const missing = unsealed.members.filter((member) => member.handedInAt === null);
    expect(missing.map((member) => member.person.id)).toEqual([case_.contributors[3]?.id]);
  });

  it('goes on after the deadline with two in and a reason', async () => {
    const case_ = await acceptedCase(running, { contributors: 3 });
    const now = running.clock.now().getTime();
    const round = await openRound(case_, 'sealed', new Date(now + 3_600_000).toISOString());
    const [ann, ben] = case_.contributors;
    if (!ann || !ben) throw new Error('two contributors are needed');
    const route = `/api/rounds/${round.id}/unseal`;
    await handIn(round, ann, { noMore: true });
    running.clock.set(new Date(now + 3_700_000));
    try {
      expect(paths(await case_.chair.agent.post(route).send({}))).toEqual(['quorum', 'handedIn', 'reason']);
      await handIn(round, ben, { noMore: true });
      expect(paths(await case_.chair.agent.post(route).send({}))).toEqual(['quorum', 'reason']);
      const unsealed = await unseal(case_, round, 'The third colleague is ill.');
      expect(unsealed.unsealReason).toBe('The third colleague is ill.');
    } finally {
      running.clock.reset();
    }
  });

  it('wins exactly once', async () => {
    const case_ = await acceptedCase(running, { quorum: 2 });
    const round = await openRound(case_, 'sealed');
    for (const person of case_.contributors) await handIn(round, person, { noMore: true });
    const ask = () => case_.chair.agent.post(`/api/rounds/${round.id}/unseal`).send({});
    const answers = await Promise.all([ask(), ask(), ask()]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409, 409]);
    expect(answers.filter((one) => one.status === 409).map((one) => refusal(one).id)).toEqual([
      'round-not-open',
      'round-not-open',
    ]);
  });

  it('and a hand-in at the same moment leave one truth: in, or not in and told so', async () => {
    const case_ = await acceptedCase(running, { quorum: 2 });
    const round = await openRound(case_, 'sealed');
    const [ann, ben, cam] = case_.contributors;
    if (!ann || !ben || !cam) throw new Error('three contributors are needed');
    for (const person of [ann, ben]) await handIn(round, person, { noMore: true });
    await judge(case_, cam, 2);
    const [unsealing, handing] = await Promise.all([
      case_.chair.agent.post(`/api/rounds/${round.id}/unseal`).send({}),
      cam.agent.post(`/api/rounds/${round.id}/hand-in`).send({}),
    ]);
    expect(unsealing.status).toBe(200);
    const [seen] = await roundsOf(case_, case_.chair);
    const member = seen?.members.find((one) => one.person.id === cam.id);
    if (handing.status === 200) expect(member?.digest).toBe((handing.body as { digest: string }).digest);
    else {
      expect(refusal(handing).id).toBe('round-not-open');
      expect(member?.handedInAt).toBeNull();
    }
    const { others } = await readDifferential(case_, case_.chair);
    expect(others?.some((other) => other.personId === cam.id)).toBe(handing.status === 200);
  });
});

describe('the rounds after the first', () => {
  it('may be live, and one who was not in comes in by a save', async () => {
    const case_ = await acceptedCase(running, { quorum: 2 });
    const first = await openRound(case_, 'sealed');
    const [ann, ben, cam] = case_.contributors;
    if (!ann || !ben || !cam) throw new Error('three contributors are needed');
    for (const [k, person] of [ann, ben, cam].entries()) await judge(case_, person, k as 0 | 1 | 2);
    for (const person of [ann, ben]) await handIn(first, person);
    await unseal(case_, first);
    const shown = await readDifferential(case_, ann);
    expect(shown.shownRound).toEqual({ number: 1, live: false, notIn: [cam.name] });
    expect(shown.others?.map((other) => other.personId)).toEqual([ben.id]);
    const second = await openRound(case_, 'live');
    expect(second.number).toBe(2);
    const stillOut = await readDifferential(case_, ann);
    expect(stillOut.shownRound).toEqual({ number: 2, live: true, notIn: [cam.name] });
    expect(stillOut.others?.map((other) => other.personId)).toEqual([ben.id]);

    await saveRow(case_, cam, 1, [40, 40, 40]);
    const withSave = (await readDifferential(case_, ann)).others?.find((other) => other.personId === cam.id);
    expect(withSave?.prior).toBeNull();
    expect(withSave?.findings.map((row) => row.outOf100)).toEqual([[40, 40, 40]]);

    await handIn(second, cam);
    const inNow = await readDifferential(case_, ann);
    const withAll = inNow.others?.find((other) => other.personId === cam.id);
    expect(withAll?.prior?.outOf100).toEqual([12.1, 61.3, 26.6]);
    expect(withAll?.findings).toHaveLength(2);
    expect(inNow.shownRound?.notIn).toEqual([]);
  });

  it('are not unsealed when live, and closed once', async () => {
    const case_ = await unsealedCase(running);
    const unsealedTwice = await case_.chair.agent.post(`/api/rounds/${case_.round.id}/unseal`).send({});
    expect([unsealedTwice.status, refusal(unsealedTwice).id]).toEqual([409, 'round-not-open']);
    const live = await openRound(case_, 'live');
    const odd = await case_.chair.agent.post(`/api/rounds/${live.id}/unseal`).send({});
    expect([odd.status, refusal(odd).id]).toEqual([409, 'wrong-state']);
    const old = await case_.chair.agent.post(`/api/rounds/${case_.round.id}/close`).send({});
    expect([old.status, refusal(old).id]).toEqual([409, 'round-not-open']);
    const closed = await case_.chair.agent.post(`/api/rounds/${live.id}/close`).expect(200);
    expect(closed.body).toMatchObject({ state: 'closed', unsealedAt: null });
    await case_.chair.agent.post(`/api/rounds/${live.id}/close`).send({}).expect(409);
    const file = (await case_.chair.agent.get(`/api/cases/${case_.id}`).expect(200)).body as Case;
    expect(file.round).toMatchObject({ number: 2, open: false });
    const { sealed, assessment } = await readDifferential(case_, case_.referrer);
    expect(sealed).toBe(false);
    expect(assessment).not.toBeNull();
  });

  it('stay sealed when the sealed one was closed without unsealing, and begin with a sealed one again', async () => {
    const case_ = await acceptedCase(running);
    const round = await openRound(case_, 'sealed');
    const [ann] = case_.contributors;
    if (!ann) throw new Error('a contributor is needed');
    await judge(case_, ann, 0);
    await handIn(round, ann);
    await case_.chair.agent.post(`/api/rounds/${round.id}/close`).send({}).expect(200);
    const seen = await readDifferential(case_, case_.chair);
    expect([seen.assessment, seen.others, seen.shownRound]).toEqual([null, null, null]);
    const panel = await case_.chair.agent.get(`/api/cases/${case_.id}/panel`);
    expect([panel.status, refusal(panel).id]).toEqual([403, 'sealed']);
    expect(
      paths(await case_.chair.agent.post(`/api/cases/${case_.id}/rounds`).send({ kind: 'live' })),
    ).toEqual(['kind']);
    await openRound(case_, 'sealed');
  });
});
