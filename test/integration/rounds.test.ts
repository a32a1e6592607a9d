import { randomUUID } from 'node:crypto';
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
  savePrior,
  saveRow,
  seat,
  teamOf,
  unsealedCase,
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { mailbox } from '../setup/mailbox.js';
import { paths, refusal } from '../setup/refusals.js';

let running: RunningApp;
beforeAll(async () => {
  running = await startApp();
  await castOf(running);
});
afterAll(() => running.close());

const roundsOf = async (case_: JudgedCase, person: { agent: JudgedCase['chair']['agent'] }) =>
  ((await person.agent.get(`/api/cases/${case_.id}/rounds`).expect(200)).body as { items: Round[] }).items;

describe('opening a round', () => {
  it('names everything that is missing', async () => {
    const case_ = await acceptedCase(running, {
      candidates: ['Still’s disease'],
      findings: [{ title: 'Fever', observed: 1 }],
    });
    const answer = await case_.chair.agent.post(`/api/cases/${case_.id}/rounds`).send({ kind: 'live' });
    expect(answer.status).toBe(409);
    expect(refusal(answer).id).toBe('not-ready');
    expect(paths(answer)).toEqual(['candidates', 'findings', 'kind']);
  });

  it('counts no finding that was entered in error', async () => {
    const case_ = await acceptedCase(running);
    await case_.chair.agent
      .post(`/api/findings/${case_.findings[0]?.id ?? ''}/entered-in-error`)
      .send({ words: 'belongs to another patient' })
      .expect(200);
    const answer = await case_.chair.agent.post(`/api/cases/${case_.id}/rounds`).send({ kind: 'sealed' });
    expect([answer.status, ...paths(answer)]).toEqual([409, 'findings']);
  });

  it('sets the case to judging and shows everybody on the team who is not in yet', async () => {
    const case_ = await acceptedCase(running);
    const round = await openRound(case_, 'sealed');
    expect(round).toMatchObject({ number: 1, kind: 'sealed', state: 'open', unsealedAt: null });
    expect(round.members.map((member) => [member.person.id, member.handedInAt, member.digest])).toEqual(
      case_.contributors.map((person) => [person.id, null, null]),
    );
    const seen = (await case_.referrer.agent.get(`/api/cases/${case_.id}`).expect(200)).body as Case;
    expect(seen.state).toBe('judging');
    expect(seen.round).toEqual({ number: 1, kind: 'sealed', open: true, handedIn: 0, contributors: 3 });
    expect(await roundsOf(case_, case_.referrer)).toEqual([round]);
  });

  it('is refused while one is open, in the past, and to everybody but the chair', async () => {
    const case_ = await acceptedCase(running);
    const route = `/api/cases/${case_.id}/rounds`;
    const late = await case_.chair.agent
      .post(route)
      .send({ kind: 'sealed', deadline: new Date(running.clock.now().getTime() - 1000).toISOString() });
    expect([late.status, ...paths(late)]).toEqual([400, 'deadline']);
    const [contributor] = case_.contributors;
    for (const person of [contributor, case_.referrer, case_.liaison])
      await person?.agent.post(route).send({ kind: 'sealed' }).expect(403);
    const stranger = await seat(running, ['chair', 'specialist']);
    await stranger.agent.post(route).send({ kind: 'sealed' }).expect(404);
    await stranger.agent.get(route).expect(404);
    await case_.liaison.agent.get(route).expect(403);
    await running.agent().get(route).expect(401);
    await case_.chair.agent.post(route).send({ kind: 'open', deadline: 'soon' }).expect(400);
    await openRound(case_, 'sealed');
    const second = await case_.chair.agent.post(route).send({ kind: 'sealed' });
    expect([second.status, refusal(second).id]).toEqual([409, 'round-open']);
  });

  it('opens one round when two are asked for at once', async () => {
    const case_ = await acceptedCase(running);
    const ask = () => case_.chair.agent.post(`/api/cases/${case_.id}/rounds`).send({ kind: 'sealed' });
    const answers = await Promise.all([ask(), ask(), ask()]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 409, 409]);
    expect(await roundsOf(case_, case_.chair)).toHaveLength(1);
  });
});

describe('the letter when a round opens', () => {
  const box = mailbox();

  it.each(['sealed', 'live'] as const)('goes to everybody who judges but who opened it: %s', async (kind) => {
    const case_ = kind === 'live' ? await unsealedCase(running) : await acceptedCase(running);
    const { id, number, chair, contributors } = case_;
    const team = [...teamOf(case_), { personId: chair.id, part: 'contributor' as const }];
    await chair.agent.put(`/api/cases/${id}/team`).send(team).expect(200);
    await running.outbox.flush();
    box.clear();
    const round = await openRound(case_, kind);
    await running.outbox.flush();
    const sent = await box.messages();
    expect(sent.map(({ to }) => String(to)).sort()).toEqual(contributors.map(({ email }) => email).sort());
    for (const { subject, text } of sent) {
      expect(subject).toBe(`Round ${String(round.number)} of case ${number} is open`);
      expect(text).toContain(`/cases/${id}`);
      expect(text).not.toMatch(/fever|rash|ferritin|still|lymphoma|illness/i);
    }
  });

  it('is not written when the round is not opened', async () => {
    const case_ = await acceptedCase(running, { findings: [] });
    await running.outbox.flush();
    box.clear();
    await case_.chair.agent.post(`/api/cases/${case_.id}/rounds`).send({ kind: 'sealed' }).expect(409);
    await running.outbox.flush();
    expect(await box.messages()).toEqual([]);
  });
});

describe('withdrawing a case', () => {
  const withdraw = async (case_: JudgedCase) => {
    const words = { words: 'Consent was withdrawn' };
    await case_.referrer.agent.post(`/api/cases/${case_.id}/withdraw`).send(words).expect(200);
    const { body } = await case_.referrer.agent.get(`/api/cases/${case_.id}/trail`).expect(200);
    return (body.items as { action: string; sentence: string }[])[0];
  };

  it('ends a sealed round sealed for good: its numbers are shown to nobody', async () => {
    const case_ = await acceptedCase(running);
    const round = await openRound(case_, 'sealed');
    for (const [k, person] of case_.contributors.entries()) {
      await judge(case_, person, k as 0 | 1 | 2);
      await handIn(round, person);
    }
    expect(await withdraw(case_)).toMatchObject({
      action: 'case.withdrawn',
      sentence: 'withdrew the case, which closed round 1; its numbers stay sealed for good',
    });
    const [ended] = await roundsOf(case_, case_.referrer);
    expect(ended).toMatchObject({ id: round.id, state: 'closed', unsealedAt: null });
    expect(ended?.closedAt).not.toBeNull();
    const seen = (await case_.referrer.agent.get(`/api/cases/${case_.id}`).expect(200)).body as Case;
    expect(seen.round).toMatchObject({ number: 1, open: false, handedIn: 3 });
    const ledger = await readDifferential(case_, case_.referrer);
    expect(ledger).toMatchObject({
      assessment: null,
      others: null,
      mine: null,
      shownRound: null,
      before: null,
    });
    await case_.referrer.agent.get(`/api/cases/${case_.id}/panel`).expect(403);
    const { body } = await case_.referrer.agent.get(`/api/cases/${case_.id}/seals`).expect(200);
    for (const seal of body.items as { random: unknown; document: unknown }[])
      expect(seal).toMatchObject({ random: null, document: null });
    for (const { agent } of [case_.chair, ...case_.contributors]) {
      await agent.post(`/api/rounds/${round.id}/unseal`).send({ reason: 'all the same' }).expect(403);
      await agent.get(`/api/cases/${case_.id}/differential`).expect(403);
    }
  });

  it('closes a live round, and opens nothing again', async () => {
    const case_ = await unsealedCase(running);
    await openRound(case_, 'live');
    expect(await withdraw(case_)).toMatchObject({ sentence: 'withdrew the case, which closed round 2' });
    const rounds = await roundsOf(case_, case_.referrer);
    expect(rounds.map(({ state }) => state)).toEqual(['unsealed', 'closed']);
  });

  it('says nothing of rounds where none is open', async () => {
    expect(await withdraw(await acceptedCase(running))).toMatchObject({ sentence: 'withdrew the case' });
  });
});

describe('handing in', () => {
  it('needs a prior and half of the rows, or the word that no more will come', async () => {
    const case_ = await acceptedCase(running);
    const round = await openRound(case_, 'sealed');
    const [ann, ben] = case_.contributors;
    if (!ann || !ben) throw new Error('two contributors are needed');
    const route = `/api/rounds/${round.id}/hand-in`;
    const nothing = await ann.agent.post(route).send({});
    expect([nothing.status, refusal(nothing).id]).toEqual([409, 'not-ready']);
    expect(paths(nothing)).toEqual(['prior', 'findings']);
    await savePrior(case_, ann, [40, 30, 30]);
    await saveRow(case_, ann, 0, [70, null, 10]);
    expect(paths(await ann.agent.post(route).send({}))).toEqual(['findings']);
    await saveRow(case_, ann, 1, [null, null, 5]);
    const done = await ann.agent.post(route).expect(200);
    expect(done.body).toEqual({
      digest: expect.stringMatching(/^[0-9a-f]{64}$/) as string,
      handedInAt: expect.any(String) as string,
      version: 3,
    });
    await ben.agent.post(route).send({ noMore: true }).expect(200);
    const [seen] = await roundsOf(case_, case_.referrer);
    expect(seen?.members.filter((member) => member.digest !== null)).toHaveLength(2);
    const file = (await case_.chair.agent.get(`/api/cases/${case_.id}`).expect(200)).body as Case;
    expect(file.round?.handedIn).toBe(2);
  });

  it('wins exactly once when it is done twice at once, and ends saving in a sealed round', async () => {
    const case_ = await acceptedCase(running);
    const round = await openRound(case_, 'sealed');
    const [ann] = case_.contributors;
    if (!ann) throw new Error('a contributor is needed');
    await judge(case_, ann, 0);
    const ask = () => ann.agent.post(`/api/rounds/${round.id}/hand-in`).send({});
    const answers = await Promise.all([ask(), ask(), ask()]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409, 409]);
    const late = answers.filter((answer) => answer.status === 409);
    expect(late.map((answer) => refusal(answer).id)).toEqual(['already-handed-in', 'already-handed-in']);
    const { candidateSet, abilities } = await readDifferential(case_, ann);
    const again = await ann.agent
      .put(`/api/cases/${case_.id}/judgement/prior`)
      .send({ candidateSet, outOf100: [20, 20, 60] });
    expect([again.status, refusal(again).id]).toEqual([409, 'already-handed-in']);
    expect(abilities).not.toContain('judgement.give');
    expect(abilities).not.toContain('judgement.handIn');
  });

  it('is refused with a version that is not the last, and shows the last', async () => {
    const case_ = await acceptedCase(running);
    const round = await openRound(case_, 'sealed');
    const [ann] = case_.contributors;
    if (!ann) throw new Error('a contributor is needed');
    await judge(case_, ann, 0);
    const old = await ann.agent.post(`/api/rounds/${round.id}/hand-in`).send({ version: 2 });
    expect([old.status, refusal(old).id]).toEqual([409, 'stale']);
    expect(refusal(old).current).toMatchObject({ version: 3, prior: { outOf100: [31.7, 23.6, 44.7] } });
    await ann.agent.post(`/api/rounds/${round.id}/hand-in`).send({ version: 3 }).expect(200);
  });

  it('is for this case’s contributors alone', async () => {
    const case_ = await acceptedCase(running);
    const other = await acceptedCase(running, { ownPeople: true });
    const round = await openRound(case_, 'sealed');
    await openRound(other, 'sealed');
    const route = `/api/rounds/${round.id}/hand-in`;
    await other.contributors[0]?.agent.post(route).send({ noMore: true }).expect(404);
    await other.chair.agent.post(`/api/rounds/${round.id}/unseal`).send({}).expect(404);
    for (const person of [case_.chair, case_.referrer, case_.liaison])
      await person.agent.post(route).send({ noMore: true }).expect(403);
    await case_.contributors[0]?.agent.post(`/api/rounds/${randomUUID()}/hand-in`).send({}).expect(404);
    await case_.contributors[0]?.agent.post('/api/rounds/1/hand-in').send({}).expect(400);
  });
});
