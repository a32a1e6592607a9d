import { randomUUID } from 'node:crypto';
import type { JudgementDraft } from '@weighhouse/shared/contracts/judgements';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  type JudgedCase,
  judge,
  openRound,
  readDifferential,
  savePrior,
  seat,
  type SeatedPerson,
  unsealedCase,
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { refusal } from '../setup/refusals.js';

let running: RunningApp;
let case_: JudgedCase;
let ann: SeatedPerson;
let ben: SeatedPerson;
let set: number;

beforeAll(async () => {
  running = await startApp();
  case_ = await acceptedCase(running);
  await openRound(case_, 'sealed');
  const [first, second] = case_.contributors;
  if (!first || !second) throw new Error('two contributors are needed');
  [ann, ben] = [first, second];
  set = (await readDifferential(case_, ann)).candidateSet;
});
afterAll(() => running.close());

describe('a draft', () => {
  const draft = (target: string) => ({
    target,
    candidateSet: set,
    exposure: null,
    typed: [['6'], ['4,'], ['']],
    reason: 'half a thou',
  });
  const route = (target: string) => `/api/cases/${case_.id}/judgement/drafts/${target}`;
  const own = async (person: SeatedPerson): Promise<JudgementDraft[]> =>
    (await readDifferential(case_, person)).mine?.drafts ?? [];

  it('is kept as typed, for its writer alone, and goes when its target is saved', async () => {
    const row = case_.findings[0]?.id ?? '';
    await ann.agent.put(route('prior')).send(draft('prior')).expect(200);
    await ann.agent.put(route(row)).send(draft(row)).expect(200);
    await ann.agent
      .put(route(row))
      .send({ ...draft(row), typed: [['65'], ['4'], ['']] })
      .expect(200);
    expect(await own(ann)).toMatchObject([
      { ...draft('prior') },
      { ...draft(row), typed: [['65'], ['4'], ['']] },
    ]);
    expect(await own(ben)).toEqual([]);
    expect((await readDifferential(case_, case_.chair)).mine).toBeNull();
    await savePrior(case_, ann, [31.7, 23.6, 44.7]);
    expect((await own(ann)).map((one) => one.target)).toEqual([row]);
    await ann.agent.delete(route(row)).expect(200);
    await ann.agent.delete(route(row)).expect(200);
    expect(await own(ann)).toEqual([]);
  });

  it('moves no version and no revision', async () => {
    const before = await readDifferential(case_, ben);
    await ben.agent.put(route('prior')).send(draft('prior')).expect(200);
    const after = await readDifferential(case_, ben);
    expect([after.revision, after.mine?.version]).toEqual([before.revision, before.mine?.version]);
  });

  it('is kept for rows of this case alone, and not larger than a row', async () => {
    const other = await acceptedCase(running);
    const foreign = other.findings[0]?.id ?? '';
    await ann.agent.put(route(foreign)).send(draft(foreign)).expect(404);
    const unknown = randomUUID();
    await ann.agent.put(route(unknown)).send(draft(unknown)).expect(404);
    await ann.agent.put(route('prior')).send(draft(unknown)).expect(400);
    await ann.agent.put(route('posterior')).send(draft('posterior')).expect(400);
    const large = { ...draft('prior'), typed: Array.from({ length: 32 }, () => ['1']) };
    await ann.agent.put(route('prior')).send(large).expect(400);
    await ann.agent
      .put(route('prior'))
      .send({ ...draft('prior'), typed: [['0123456789012']] })
      .expect(400);
  });

  it('is for contributors', async () => {
    await case_.chair.agent.put(route('prior')).send(draft('prior')).expect(403);
    await case_.liaison.agent.put(route('prior')).send(draft('prior')).expect(403);
    const stranger = await seat(running, 'specialist');
    await stranger.agent.put(route('prior')).send(draft('prior')).expect(404);
  });
});

describe('another candidate set', () => {
  it('asks for the prior again, keeps the cells, leaves the new column blank and drops the retired one', async () => {
    const changing = await unsealedCase(running);
    const [person, second] = changing.contributors;
    if (!person || !second) throw new Error('two contributors are needed');
    await changing.chair.agent
      .post(`/api/cases/${changing.id}/candidates`)
      .send({ name: 'Sarcoidosis' })
      .expect(201);
    const added = await readDifferential(changing, person);
    expect(added.mine).toMatchObject({ priorInForce: false, prior: { outOf100: [31.7, 23.6, 44.7] } });
    expect(added.mine?.findings[0]?.outOf100).toEqual([71.3, 48.9, null, 11.9]);
    expect(added.assessment).toMatchObject({ priorGiven: false });
    expect(added.assessment?.standing).toHaveLength(4);

    await changing.chair.agent
      .post(`/api/candidates/${changing.candidateIds[0] ?? ''}/retire`)
      .send({})
      .expect(200);
    const retired = await readDifferential(changing, person);
    expect(retired.mine?.findings[0]?.outOf100).toEqual([48.9, null, 11.9]);
    await openRound(changing, 'live');
    const stale = await person.agent
      .put(`/api/cases/${changing.id}/judgement/prior`)
      .send({ candidateSet: added.candidateSet, outOf100: [25, 25, 25, 25] });
    expect([stale.status, refusal(stale).id]).toEqual([409, 'stale']);
    await savePrior(changing, person, [20, 30, 50]);
    const given = await readDifferential(changing, second);
    expect(given.assessment?.priorGiven).toBe(true);
    for (const [k, share] of [0.2, 0.3, 0.5].entries())
      expect(given.assessment?.pooledPrior[k]).toBeCloseTo(share, 12);
    expect(given.others?.find((other) => other.personId === person.id)?.priorInForce).toBe(true);
    expect(given.mine?.priorInForce).toBe(false);
  });

  it('cannot come while a round is sealed', async () => {
    const frozen = await acceptedCase(running);
    await openRound(frozen, 'sealed');
    const [person] = frozen.contributors;
    if (!person) throw new Error('a contributor is needed');
    await judge(frozen, person, 0);
    await frozen.chair.agent
      .post(`/api/cases/${frozen.id}/candidates`)
      .send({ name: 'Sarcoidosis' })
      .expect(409);
    await frozen.chair.agent
      .post(`/api/candidates/${frozen.candidateIds[0] ?? ''}/retire`)
      .send({})
      .expect(409);
  });
});
