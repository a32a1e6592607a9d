import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  type JudgedCase,
  openRound,
  readDifferential,
  saveRow,
  seat,
  type SeatedPerson,
  unsealedCase,
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { paths, refusal } from '../setup/refusals.js';

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
    expect([none.status, ...paths(none)]).toEqual([400, 'exposure']);
    const odd = await ann.agent
      .put(rowRoute(1))
      .send({ candidateSet: set, exposure: 'daily', outOf100: [65, null, 10] });
    expect([odd.status, ...paths(odd)]).toEqual([400, 'exposure']);
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
    const [{ versions }] = await running.source.query<[{ versions: string }]>(
      'SELECT COUNT(*) AS versions FROM judgement_version WHERE personId = ? AND target = ?',
      [ann.id, case_.findings[1]?.id],
    );
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
