import { randomUUID } from 'node:crypto';
import type { ErrorBody } from '@weighhouse/shared/contracts/errors';
import type { JudgementDraft } from '@weighhouse/shared/contracts/judgements';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  type JudgedCase,
  judge,
  openRound,
  readDifferential,
  savePrior,
  saveRow,
  seat,
  type SeatedPerson,
  unsealedCase,
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';

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

const refusal = (answer: { body: unknown }) => (answer.body as ErrorBody).error;
const paths = (answer: { body: unknown }) => refusal(answer).fields?.map((field) => field.path);
const priorRoute = () => `/api/cases/${case_.id}/judgement/prior`;
const rowRoute = (finding: number) =>
  `/api/cases/${case_.id}/judgement/findings/${case_.findings[finding]?.id ?? ''}`;

describe('a prior', () => {
  it('is refused with every fault named', async () => {
    const wrong = await ann.agent
      .put(priorRoute())
      .send({ candidateSet: 'two', outOf100: [0, 100, '5'], reason: 7, version: -1 });
    expect(wrong.status).toBe(400);
    expect(paths(wrong)).toEqual(
      expect.arrayContaining([
        'candidateSet',
        'version',
        'outOf100[0]',
        'outOf100[1]',
        'outOf100[2]',
        'reason',
      ]),
    );
  });

  it.each([
    ['too few columns', [50, 50], 'outOf100'],
    ['too many columns', [25, 25, 25, 25], 'outOf100'],
    ['a sum over 100', [50, 50, 50], 'outOf100'],
    ['a sum that is off by its last digit', [33.3, 33.3, 33.3], 'outOf100'],
    ['two decimals', [33.33, 33.33, 33.34], 'outOf100[0]'],
    ['a column too many by far', Array.from({ length: 5000 }, () => 0.1), 'outOf100'],
  ])('is refused with %s', async (_, outOf100, path) => {
    const answer = await ann.agent.put(priorRoute()).send({ candidateSet: set, outOf100 });
    expect(answer.status).toBe(400);
    expect(paths(answer)).toContain(path);
  });

  it('is a new version with every save, and the older ones stay in the table', async () => {
    await ben.agent
      .put(priorRoute())
      .send({ candidateSet: set, version: 0, outOf100: [50, 25, 25] })
      .expect(200);
    const second = await ben.agent
      .put(priorRoute())
      .send({ candidateSet: set, version: 1, outOf100: [40, 35, 25], reason: '  seen such a case  ' })
      .expect(200);
    expect(second.body).toMatchObject({ version: 2 });
    const { mine } = await readDifferential(case_, ben);
    expect(mine).toMatchObject({ version: 2, priorInForce: true });
    expect(mine?.prior).toMatchObject({ version: 2, outOf100: [40, 35, 25], reason: 'seen such a case' });
    const kept: { version: number; thousandths: number }[] = await running.source.query(
      `SELECT v.version, w.thousandths FROM judgement_version v
       JOIN judgement_value w ON w.judgementVersionId = v.id
       WHERE v.personId = ? AND v.target = 'prior' ORDER BY v.version, w.id`,
      [ben.id],
    );
    expect(kept.map((row) => [row.version, row.thousandths])).toEqual([
      [1, 500],
      [1, 250],
      [1, 250],
      [2, 400],
      [2, 350],
      [2, 250],
    ]);
  });

  it('is refused with an older version or candidate set, and shows what stands now', async () => {
    const { mine } = await readDifferential(case_, ben);
    const old = await ben.agent
      .put(priorRoute())
      .send({ candidateSet: set, version: 1, outOf100: [20, 20, 60] });
    expect([old.status, refusal(old).id]).toEqual([409, 'stale']);
    expect(refusal(old).current).toEqual({
      version: mine?.version,
      prior: mine?.prior,
      priorInForce: true,
      findings: [],
    });
    const wrongSet = await ben.agent.put(priorRoute()).send({ candidateSet: set - 1, outOf100: [50, 50] });
    expect([wrongSet.status, refusal(wrongSet).id]).toEqual([409, 'stale']);
    expect(refusal(wrongSet).current).toMatchObject({
      candidateSet: set,
      items: case_.candidateIds.map((id) => ({ id })),
    });
  });

  it('is saved once when two pages save over the same version at once', async () => {
    const { mine } = await readDifferential(case_, ben);
    const save = (first: number) =>
      ben.agent
        .put(priorRoute())
        .send({ candidateSet: set, version: mine?.version, outOf100: [first, 50 - first, 50] });
    const answers = await Promise.all([save(10), save(20), save(30), save(40)]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409, 409, 409]);
  });

  it('is nobody’s who does not contribute', async () => {
    const body = { candidateSet: set, outOf100: [20, 20, 60] };
    for (const person of [case_.chair, case_.referrer, case_.liaison])
      await person.agent.put(priorRoute()).send(body).expect(403);
    const stranger = await seat(running, 'specialist');
    await stranger.agent.put(priorRoute()).send(body).expect(404);
    await stranger.agent.put(`/api/cases/${randomUUID()}/judgement/prior`).send(body).expect(404);
  });
});

describe('a row', () => {
  it('takes numbers and blanks, and levels where there are more than two', async () => {
    await saveRow(case_, ann, 0, [65, null, 0.1], { exposure: 'seldom', reason: 'rare here' });
    await saveRow(case_, ann, 2, [[10.5, 20.5, 69], null, [33.3, 33.3, 33.4]]);
    const { mine } = await readDifferential(case_, ann);
    expect(mine?.findings).toMatchObject([
      {
        findingId: case_.findings[0]?.id,
        exposure: 'seldom',
        outOf100: [65, null, 0.1],
        reason: 'rare here',
      },
      { findingId: case_.findings[2]?.id, outOf100: [[10.5, 20.5, 69], null, [33.3, 33.3, 33.4]] },
    ]);
  });

  it('asks for the exposure, unless nothing is given', async () => {
    const none = await ann.agent.put(rowRoute(1)).send({ candidateSet: set, outOf100: [65, null, 10] });
    expect([none.status, ...(paths(none) ?? [])]).toEqual([400, 'exposure']);
    const odd = await ann.agent
      .put(rowRoute(1))
      .send({ candidateSet: set, exposure: 'daily', outOf100: [65, null, 10] });
    expect([odd.status, ...(paths(odd) ?? [])]).toEqual([400, 'exposure']);
  });

  it.each([
    ['a number where there are three levels', 2, [50, null, null], ['outOf100[0]']],
    ['two shares where there are three levels', 2, [[50, 50], null, null], ['outOf100[0]']],
    ['shares that do not sum to 100', 2, [null, [20, 20, 20], [1, 1, 1]], ['outOf100[1]', 'outOf100[2]']],
    ['shares of two levels that do not sum to 100', 0, [null, [20, 20], null], ['outOf100[1]']],
    ['a column missing', 0, [50, 50], ['outOf100']],
    ['certainty', 0, [100, 50, 50], ['outOf100[0]']],
  ])('is refused with %s', async (_, finding, outOf100, faults) => {
    const answer = await ann.agent
      .put(rowRoute(finding))
      .send({ candidateSet: set, exposure: 'often', outOf100 });
    expect(answer.status).toBe(400);
    expect(paths(answer)).toEqual(faults);
  });

  it('is taken back by a version without numbers, and the numbers before stay in the table', async () => {
    const version = await saveRow(case_, ann, 1, [60, 50, 40]);
    await ann.agent
      .put(rowRoute(1))
      .send({ candidateSet: set, version, outOf100: [null, null, null] })
      .expect(200);
    const { mine } = await readDifferential(case_, ann);
    expect(mine?.version).toBe(version + 1);
    expect(mine?.findings.map((row) => row.findingId)).not.toContain(case_.findings[1]?.id);
    const [{ versions }] = (await running.source.query(
      'SELECT COUNT(*) AS versions FROM judgement_version WHERE personId = ? AND target = ?',
      [ann.id, case_.findings[1]?.id],
    )) as [{ versions: string }];
    expect(Number(versions)).toBe(2);
  });

  it('is of this case: another case’s finding and an unknown one are not there', async () => {
    const other = await acceptedCase(running);
    const body = { candidateSet: set, exposure: 'often', outOf100: [50, 50, 50] };
    for (const id of [other.findings[0]?.id ?? '', randomUUID()])
      await ann.agent.put(`/api/cases/${case_.id}/judgement/findings/${id}`).send(body).expect(404);
    await ann.agent.put(`/api/cases/${case_.id}/judgement/findings/1`).send(body).expect(400);
  });

  it('is refused once its finding was entered in error', async () => {
    const mistaken = await acceptedCase(running, {
      findings: [1, 2, 3, 4].map((n) => ({ title: `Finding ${String(n)}`, observed: 1 })),
    });
    await openRound(mistaken, 'sealed');
    const [person] = mistaken.contributors;
    if (!person) throw new Error('a contributor is needed');
    await mistaken.chair.agent
      .post(`/api/findings/${mistaken.findings[0]?.id ?? ''}/entered-in-error`)
      .send({ words: 'another patient’s' })
      .expect(200);
    const { candidateSet } = await readDifferential(mistaken, person);
    const answer = await person.agent
      .put(`/api/cases/${mistaken.id}/judgement/findings/${mistaken.findings[0]?.id ?? ''}`)
      .send({ candidateSet, exposure: 'often', outOf100: [50, 50, 50] });
    expect([answer.status, refusal(answer).id]).toEqual([409, 'wrong-state']);
  });
});

describe('saving', () => {
  it('waits for a round', async () => {
    const early = await acceptedCase(running);
    const [person] = early.contributors;
    const { candidateSet } = await readDifferential(early, early.chair);
    const answer = await person?.agent
      .put(`/api/cases/${early.id}/judgement/prior`)
      .send({ candidateSet, outOf100: [20, 20, 60] });
    expect(answer?.status).toBe(409);
    const over = await unsealedCase(running);
    const between = await over.contributors[0]?.agent
      .put(`/api/cases/${over.id}/judgement/prior`)
      .send({ candidateSet, outOf100: [20, 20, 60] });
    expect(between && [between.status, refusal(between).id]).toEqual([409, 'round-not-open']);
  });

  it('goes on after a hand-in in a live round and raises the revision each time', async () => {
    const open = await unsealedCase(running);
    const live = await openRound(open, 'live');
    const [person] = open.contributors;
    if (!person) throw new Error('a contributor is needed');
    await person.agent.post(`/api/rounds/${live.id}/hand-in`).send({}).expect(200);
    const before = await readDifferential(open, person);
    expect(before.abilities).toContain('judgement.give');
    expect(before.abilities).not.toContain('judgement.handIn');
    const answer = await person.agent
      .put(`/api/cases/${open.id}/judgement/prior`)
      .send({ candidateSet: before.candidateSet, outOf100: [80, 10, 10] })
      .expect(200);
    expect(answer.body).toMatchObject({ version: 4, revision: before.revision + 1 });
    expect((await readDifferential(open, open.chair)).revision).toBe(before.revision + 1);
  });
});

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
