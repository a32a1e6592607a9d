import { DraftsService } from '@weighhouse/server/cases/drafts.service';
import type { Case } from '@weighhouse/shared/contracts/cases';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { draftCase, type Network, seatNetwork, submittedCase, wholeDraft } from '../factories/cases.js';
import { type RunningApp, serviceOf, startApp } from '../setup/app.js';

describe('drafts', () => {
  let running: RunningApp;
  let people: Network;

  beforeAll(async () => {
    running = await startApp();
    people = await seatNetwork(running);
  });
  afterAll(() => running.close());

  it('are opened by referrers alone, empty or not', async () => {
    const empty = await draftCase(people, {});
    expect(empty).toMatchObject({
      state: 'draft',
      question: '',
      age: null,
      consent: null,
      tempering: 0.6,
      coexistence: 0,
      quorum: 3,
      round: null,
      parts: ['referrer'],
      counts: { reports: 0, findings: 0, pending: 0, candidates: 0 },
    });
    expect(empty.missing.map((part) => part.path)).toEqual([
      'question',
      'age',
      'sex',
      'consent',
      'urgency',
      'historyHtml',
    ]);
    const whole = await draftCase(people);
    expect(whole).toMatchObject({ ...wholeDraft, missing: [] });
    for (const other of [people.first, people.chair, people.liaison, people.administrator]) {
      const { body } = await other.agent.post('/api/cases').send({}).expect(403);
      expect(body.error.id).toBe('forbidden');
    }
  });

  it('get running numbers of their year, also when many are opened at once', async () => {
    const opened = await Promise.all(Array.from({ length: 10 }, () => draftCase(people, {})));
    const numbers = opened.map(({ number }) => number).sort();
    const year = String(running.clock.now().getUTCFullYear()).slice(2);
    expect(new Set(numbers).size).toBe(10);
    expect(numbers.every((number) => new RegExp(`^${year}-\\d{4}$`).test(number))).toBe(true);
    const counted = numbers.map((number) => Number(number.slice(3)));
    expect(Math.max(...counted) - Math.min(...counted)).toBe(9);
  });

  it('start counting anew in another year', async () => {
    running.clock.set(new Date('2031-03-01T12:00:00Z'));
    try {
      const { number } = await serviceOf(running.app, DraftsService).open(people.referrer.actor, {});
      expect(number).toBe('31-0001');
    } finally {
      running.clock.reset();
    }
  });

  it('are saved with the version that was last seen; a stale one gets the current text', async () => {
    const { id, version } = await draftCase(people);
    const { body } = await people.referrer.agent
      .patch(`/api/cases/${id}`)
      .send({ version, question: 'Is it Still’s disease?' })
      .expect(200);
    expect(body).toMatchObject({ question: 'Is it Still’s disease?', age: 41, version: version + 1 });
    const stale = await people.referrer.agent
      .patch(`/api/cases/${id}`)
      .send({ version, question: 'Something else' })
      .expect(409);
    expect(stale.body.error).toMatchObject({
      id: 'stale',
      current: { question: 'Is it Still’s disease?', version: version + 1 },
    });
  });

  it('are saved by one of five racing writers', async () => {
    const { id, version } = await draftCase(people);
    const answers = await Promise.all(
      [1, 2, 3, 4, 5].map((k) =>
        people.referrer.agent.patch(`/api/cases/${id}`).send({ version, question: `Question ${String(k)}` }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409, 409]);
    const winner = answers.find(({ status }) => status === 200)?.body as Case;
    const { body } = await people.referrer.agent.get(`/api/cases/${id}`).expect(200);
    expect(body.question).toBe(winner.question);
    expect(body.version).toBe(version + 1);
  });

  it('keep of a history only what is harmless', async () => {
    const { id, version } = await draftCase(people);
    const historyHtml =
      '<h2 onclick="x()">Course</h2><p>Fever<img src="https://a.example/b.png" onerror="x()"></p>' +
      '<script>steal()</script><a href="javascript:x()">see</a><table><tr><td colspan="2">1</td></tr></table>';
    const { body } = await people.referrer.agent
      .patch(`/api/cases/${id}`)
      .send({ version, historyHtml })
      .expect(200);
    expect(body.historyHtml).toBe(
      '<h2>Course</h2><p>Fever</p>see<table><tr><td colspan="2">1</td></tr></table>',
    );
  });

  it('name every fault of the input with its path', async () => {
    const { id } = await draftCase(people);
    const { body } = await people.referrer.agent
      .patch(`/api/cases/${id}`)
      .send({
        version: -1,
        question: 'x'.repeat(301),
        age: 12.5,
        sex: 'unsaid',
        urgency: 'now',
        consent: { given: 'yes', how: 'nodded', givenOn: '2026-02-30' },
        historyHtml: 5,
      })
      .expect(400);
    expect(body.error.id).toBe('invalid');
    expect((body.error.fields as { path: string }[]).map(({ path }) => path).sort()).toEqual([
      'age',
      'consent.given',
      'consent.givenOn',
      'consent.how',
      'historyHtml',
      'question',
      'sex',
      'urgency',
      'version',
    ]);
  });

  it('take no consent from the future and no columns that are not theirs', async () => {
    const { id, version } = await draftCase(people);
    const consent = { given: true, how: 'signed', givenOn: '2999-01-01' };
    const refused = await people.referrer.agent
      .patch(`/api/cases/${id}`)
      .send({ version, consent })
      .expect(400);
    expect(refused.body.error.fields).toEqual([
      { path: 'consent.givenOn', message: 'must not lie in the future' },
    ]);
    const { body } = await people.referrer.agent
      .patch(`/api/cases/${id}`)
      .send({ version, state: 'accepted', tempering: 1, referrerId: people.otherReferrer.id, revision: 99 })
      .expect(200);
    expect(body).toMatchObject({ state: 'draft', tempering: 0.6, referrer: { id: people.referrer.id } });
  });

  it('answer strangers as if they did not exist', async () => {
    const { id, version } = await draftCase(people);
    const { otherReferrer, first, chair, liaison, administrator } = people;
    for (const { agent } of [otherReferrer, first, chair, liaison, administrator]) {
      await agent.get(`/api/cases/${id}`).expect(404);
      await agent.patch(`/api/cases/${id}`).send({ version, question: 'Mine' }).expect(404);
      await agent.post(`/api/cases/${id}/submit`).send({}).expect(404);
      await agent.post(`/api/cases/${id}/withdraw`).send({ words: 'no' }).expect(404);
    }
    const unknown = await people.chair.agent
      .get('/api/cases/5f2b1c38-53a4-4d5e-9a35-0d2a4cbf0f10')
      .expect(404);
    const strange = await people.chair.agent.get(`/api/cases/${id}`).expect(404);
    expect(strange.body).toEqual(unknown.body);
    await people.chair.agent.get('/api/cases/not-an-id').expect(400);
    await running.agent().get(`/api/cases/${id}`).expect(401);
  });

  it('are submitted when nothing is missing, and told what is', async () => {
    const { id } = await draftCase(people, {
      question: 'Why?',
      consent: { ...wholeDraft.consent, given: false },
    });
    const { body } = await people.referrer.agent.post(`/api/cases/${id}/submit`).send({}).expect(409);
    expect(body.error.id).toBe('not-ready');
    expect((body.error.fields as { path: string }[]).map(({ path }) => path)).toEqual([
      'age',
      'sex',
      'consent',
      'urgency',
      'historyHtml',
    ]);
    const submitted = await submittedCase(people);
    expect(submitted).toMatchObject({ state: 'submitted', missing: [] });
    expect(submitted.submittedAt).not.toBeNull();
    expect(submitted.abilities).not.toContain('case.edit');
    const again = await people.referrer.agent
      .patch(`/api/cases/${submitted.id}`)
      .send({ version: submitted.version, question: 'Late' })
      .expect(409);
    expect(again.body.error.id).toBe('wrong-state');
    await people.referrer.agent.post(`/api/cases/${submitted.id}/submit`).send({}).expect(409);
  });

  it('are not made stale by an upload or a move, only by another save', async () => {
    const { id, version } = await draftCase(people);
    await people.referrer.agent
      .post(`/api/cases/${id}/reports`)
      .attach('file', Buffer.from('Normal.'), { filename: 'a.txt', contentType: 'text/plain' })
      .expect(201);
    const { body } = await people.referrer.agent
      .patch(`/api/cases/${id}`)
      .send({ version, question: 'Saved while a file went up' })
      .expect(200);
    expect(body.counts.reports).toBe(1);
    expect(body.revision).toBeGreaterThan(2);
  });
});
