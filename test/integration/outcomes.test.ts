import { outcomeSchema } from '@weighhouse/shared/contracts/outcomes';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { acceptedCase, type JudgedCase, seat } from '../factories/judgements.js';
import { concludedCase } from '../factories/plans.js';
import { type RunningApp, startApp } from '../setup/app.js';

let running: RunningApp;

beforeAll(async () => {
  running = await startApp();
});
afterAll(() => running.close());

const path = (of: JudgedCase): string => `/api/cases/${of.id}/outcome`;
const outcome = (case_: JudgedCase, change: object = {}) => ({
  candidateId: case_.candidateIds[1] ?? null,
  diagnosis: 'Lymphoma',
  howKnown: 'Biopsy of a node, read twice',
  knownOn: '2026-11-20',
  ...change,
});
const pathsOf = (body: unknown): string[] =>
  (body as { error: { fields?: { path: string }[] } }).error.fields?.map((fault) => fault.path) ?? [];

describe('the outcome', () => {
  it('is null until chair or referrer records it, once; the case then stands as known', async () => {
    const case_ = await concludedCase(running);
    const unknown = await case_.contributors[0]!.agent.get(path(case_)).expect(200);
    expect([unknown.text, unknown.headers['content-type']]).toEqual([
      'null',
      'application/json; charset=utf-8',
    ]);
    const { body } = await case_.referrer.agent.post(path(case_)).send(outcome(case_)).expect(200);
    expect(outcomeSchema.parse(body)).toMatchObject({
      diagnosis: 'Lymphoma',
      recordedBy: case_.referrer.name,
    });
    const read = await case_.contributors[0]!.agent.get(path(case_)).expect(200);
    expect(read.body).toEqual(body);
    expect((await case_.chair.agent.get(`/api/cases/${case_.id}`).expect(200)).body).toMatchObject({
      state: 'outcomeKnown',
    });
    await case_.chair.agent.post(path(case_)).send(outcome(case_)).expect(409);
    const lines = await running.source.query<{ sentence: string }[]>(
      "SELECT sentence FROM audit_entry WHERE caseId = ? AND action = 'case.outcomeKnown'",
      [case_.id],
    );
    expect(lines).toEqual([{ sentence: 'recorded the outcome' }]);
  });

  it('is recorded once when two do it at once', async () => {
    const case_ = await concludedCase(running);
    const responses = await Promise.all(
      [case_.chair, case_.referrer].map(({ agent }) => agent.post(path(case_)).send(outcome(case_))),
    );
    expect(responses.map(({ status }) => status).sort()).toEqual([200, 409]);
  });

  it('names every fault: another case’s candidate, a day to come, no words', async () => {
    const case_ = await concludedCase(running);
    const other = await acceptedCase(running, { contributors: 2 });
    const wrong = outcome(case_, { candidateId: other.candidateIds[0], knownOn: '2999-01-01' });
    expect(pathsOf((await case_.chair.agent.post(path(case_)).send(wrong).expect(400)).body)).toEqual([
      'candidateId',
      'knownOn',
    ]);
    const bare = await case_.chair.agent
      .post(path(case_))
      .send({ diagnosis: '', knownOn: 'soon' })
      .expect(400);
    expect(pathsOf(bare.body)).toEqual(['candidateId', 'diagnosis', 'howKnown', 'knownOn']);
  });

  it('waits for a plan, and is a matter of chair and referrer', async () => {
    const early = await acceptedCase(running, { contributors: 2 });
    await early.chair.agent.post(path(early)).send(outcome(early)).expect(409);
    const case_ = await concludedCase(running);
    const stranger = await seat(running, 'chair');
    await case_.contributors[0]!.agent.post(path(case_)).send(outcome(case_)).expect(403);
    await case_.liaison.agent.post(path(case_)).send(outcome(case_)).expect(403);
    await case_.liaison.agent.get(path(case_)).expect(403);
    await stranger.agent.get(path(case_)).expect(404);
  });
});
