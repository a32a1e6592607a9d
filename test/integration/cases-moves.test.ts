import type { Case } from '@weighhouse/shared/contracts/cases';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import {
  caseInRound,
  draftCase,
  type Network,
  seat,
  seatNetwork,
  smallestTeam,
  submittedCase,
  takenCase,
  wholeDraft,
} from '../factories/cases.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { mailbox } from '../setup/mailbox.js';

const paths = (body: { error: { fields?: { path: string }[] } }): string[] =>
  (body.error.fields ?? []).map(({ path }) => path);

describe('the moves of a case', () => {
  let running: RunningApp;
  let people: Network;
  const letters = mailbox();

  beforeAll(async () => {
    running = await startApp();
    people = await seatNetwork(running);
  });
  beforeEach(async () => {
    await running.outbox.flush();
    letters.clear();
  });
  afterAll(() => running.close());

  const received = async (): Promise<{ to: string; subject: string; text: string }[]> => {
    await running.outbox.flush();
    const messages = await letters.messages();
    return messages.map(({ to, subject, text }) => ({ to: String(to), subject, text }));
  };

  it('a chair returns a case with a question, the referrer answers and submits again', async () => {
    const { id, number } = await submittedCase(people);
    await people.chair.agent.post(`/api/cases/${id}/return`).send({ words: '  ' }).expect(400);
    const { body } = await people.chair.agent
      .post(`/api/cases/${id}/return`)
      .send({ words: 'Was a ferritin taken?' })
      .expect(200);
    expect(body).toMatchObject({
      state: 'returned',
      words: { move: 'returned', text: 'Was a ferritin taken?', by: people.chair.name },
    });
    const [letter, ...others] = await received();
    expect(others).toEqual([]);
    expect(letter).toMatchObject({
      to: people.referrer.email,
      subject: `Case ${number} has been returned to you with a question`,
    });
    expect(letter?.text).toContain(`/cases/${id}`);
    expect(letter?.text).not.toMatch(/ferritin|fever/i);
    const again = await people.referrer.agent
      .post(`/api/cases/${id}/submit`)
      .send({ words: 'Yes, see the history.' })
      .expect(200);
    expect(again.body).toMatchObject({ state: 'submitted', words: { move: 'submitted' } });
  });

  it('a chair declines with a reason, which ends the case', async () => {
    const { id } = await submittedCase(people);
    await people.chair.agent
      .post(`/api/cases/${id}/decline`)
      .send({ words: 'Outside our field' })
      .expect(200);
    const { body } = await people.referrer.agent.get(`/api/cases/${id}`).expect(200);
    expect(body).toMatchObject({ state: 'declined', words: { move: 'declined', text: 'Outside our field' } });
    await people.referrer.agent.post(`/api/cases/${id}/submit`).send({}).expect(409);
    await people.chair.agent.get(`/api/cases/${id}`).expect(404);
  });

  it('only chairs may judge a submitted case, and only while it is submitted', async () => {
    const { id } = await submittedCase(people);
    const accept = { team: smallestTeam(people), conferenceAt: null };
    await people.referrer.agent.post(`/api/cases/${id}/accept`).send(accept).expect(403);
    await people.referrer.agent.post(`/api/cases/${id}/return`).send({ words: 'x' }).expect(403);
    for (const { agent } of [people.first, people.liaison, people.administrator, people.otherReferrer]) {
      await agent.post(`/api/cases/${id}/accept`).send(accept).expect(404);
      await agent.get(`/api/cases/${id}`).expect(404);
    }
    await people.otherChair.agent.get(`/api/cases/${id}`).expect(200);
    await people.chair.agent.post(`/api/cases/${id}/reopen`).send({ words: 'x' }).expect(403);
    await people.chair.agent.post(`/api/cases/${id}/accept`).send(accept).expect(200);
    const late = await people.chair.agent.post(`/api/cases/${id}/return`).send({ words: 'x' }).expect(409);
    expect(late.body.error.id).toBe('wrong-state');
    await people.otherChair.agent.get(`/api/cases/${id}`).expect(404);
  });

  it('accepting names everything that is missing at once', async () => {
    const { id } = await submittedCase(people);
    const nothing = await people.chair.agent.post(`/api/cases/${id}/accept`).send({}).expect(409);
    expect(nothing.body.error.id).toBe('not-ready');
    expect(paths(nothing.body)).toEqual(['team', 'team', 'conferenceAt']);
    const unknown = '5f2b1c38-53a4-4d5e-9a35-0d2a4cbf0f10';
    const wrong = await people.chair.agent
      .post(`/api/cases/${id}/accept`)
      .send({
        team: [
          { personId: unknown, part: 'contributor' },
          { personId: people.liaison.id, part: 'contributor' },
          { personId: people.first.id, part: 'liaison', weight: 2 },
          { personId: people.otherChair.id, part: 'chair' },
          { personId: people.otherReferrer.id, part: 'referrer' },
          { personId: people.second.id, part: 'contributor', weight: 2 },
          { personId: people.second.id, part: 'contributor', weight: 2, reason: 'knows it well' },
        ],
      })
      .expect(400);
    expect(paths(wrong.body)).toEqual([
      'team[0].personId',
      'team[1].part',
      'team[2].part',
      'team[2].weight',
      'team[3].personId',
      'team[4].personId',
      'team[5].reason',
      'team[6]',
      'conferenceAt',
    ]);
    const { body } = await people.referrer.agent.get(`/api/cases/${id}`).expect(200);
    expect(body).toMatchObject({ state: 'submitted', chair: null });
  });

  it('accepting makes the chair the chair, asks the contributors and tells the referrer, without clinical words', async () => {
    const { id, number } = await submittedCase(people);
    const conferenceAt = '2027-02-03T11:30:00.000Z';
    const { body } = await people.chair.agent
      .post(`/api/cases/${id}/accept`)
      .send({ team: smallestTeam(people), conferenceAt, quorum: 2 })
      .expect(200);
    const accepted = body as Case;
    expect(accepted).toMatchObject({
      state: 'accepted',
      conferenceAt,
      quorum: 2,
      chair: { id: people.chair.id },
    });
    expect(accepted.team.map(({ person, part, weight }) => [person.id, part, weight])).toEqual([
      [people.referrer.id, 'referrer', null],
      [people.chair.id, 'chair', null],
      [people.first.id, 'contributor', 1],
      [people.second.id, 'contributor', 1],
      [people.liaison.id, 'liaison', null],
    ]);
    const sent = await received();
    const asked = `You are asked to judge case ${number}`;
    expect(sent.map(({ to, subject }) => [to, subject]).sort()).toEqual(
      [
        [people.first.email, asked],
        [people.second.email, asked],
        [people.referrer.email, `Case ${number} has been accepted`],
      ].sort(),
    );
    for (const { text, subject } of sent)
      expect(text + subject).not.toMatch(/fever|illness|female|four months/i);
  });

  it('two chairs who accept at once: one becomes the chair', async () => {
    const { id } = await submittedCase(people);
    const accept = { team: smallestTeam(people), conferenceAt: null };
    const answers = await Promise.all(
      [people.chair, people.otherChair].map(({ agent }) =>
        agent.post(`/api/cases/${id}/accept`).send(accept),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 404]);
    const { body } = await people.referrer.agent.get(`/api/cases/${id}`).expect(200);
    expect((body as Case).team.filter(({ part }) => part === 'chair')).toHaveLength(1);
  });

  it('a team that was set before is enough, unless somebody was deactivated meanwhile', async () => {
    const leaving = await seat(running, 'specialist');
    const { id } = await submittedCase(people);
    const team = [...smallestTeam(people), { personId: leaving.id, part: 'contributor' }];
    await people.chair.agent.put(`/api/cases/${id}/team`).send(team).expect(200);
    expect((await received()).map(({ subject }) => subject).join()).not.toContain('asked to judge');
    const { body: listed } = await people.administrator.agent.get('/api/people').expect(200);
    const known = (listed.items as { id: string; version: number }[]).find(
      (entry) => entry.id === leaving.id,
    );
    await people.administrator.agent
      .patch(`/api/people/${leaving.id}`)
      .send({ version: known?.version, active: false })
      .expect(200);
    const refused = await people.chair.agent
      .post(`/api/cases/${id}/accept`)
      .send({ conferenceAt: null })
      .expect(400);
    expect(paths(refused.body)).toEqual(['team[4].personId']);
    await people.chair.agent.put(`/api/cases/${id}/team`).send(smallestTeam(people)).expect(200);
    await people.chair.agent.post(`/api/cases/${id}/accept`).send({ conferenceAt: null }).expect(200);
  });

  it('withdrawing shuts everybody out but the referrer, at once and also while a round is sealed', async () => {
    const { id } = await caseInRound(people, 'sealed');
    await people.chair.agent.post(`/api/cases/${id}/withdraw`).send({ words: 'x' }).expect(403);
    const { body } = await people.referrer.agent
      .post(`/api/cases/${id}/withdraw`)
      .send({ words: 'Consent was withdrawn' })
      .expect(200);
    expect(body).toMatchObject({ state: 'withdrawn', words: { move: 'withdrawn' } });
    for (const { agent } of [people.chair, people.first, people.liaison]) {
      await agent.get(`/api/cases/${id}`).expect(403);
      await agent.post(`/api/cases/${id}/findings`).send({ title: 'x' }).expect(403);
    }
    await people.referrer.agent.get(`/api/cases/${id}`).expect(200);
    await people.referrer.agent.post(`/api/cases/${id}/submit`).send({}).expect(409);
    await people.referrer.agent.post(`/api/cases/${id}/withdraw`).send({ words: 'again' }).expect(409);
  });

  it('a liaison is refused every look at the case', async () => {
    const { id } = await takenCase(people);
    for (const path of ['', '/reports', '/findings', '/candidates', '/differential', '/rounds']) {
      const { body } = await people.liaison.agent.get(`/api/cases/${id}${path}`).expect(403);
      expect(JSON.stringify(body)).not.toMatch(/fever/i);
    }
    await people.liaison.agent.post(`/api/cases/${id}/findings`).send({ title: 'x' }).expect(403);
    await people.liaison.agent.put(`/api/cases/${id}/team`).send([]).expect(403);
  });

  it('nothing is reopened that is not closed, nor declined while a round is open', async () => {
    const { id } = await caseInRound(people, 'live');
    const reopened = await people.chair.agent
      .post(`/api/cases/${id}/reopen`)
      .send({ words: 'x' })
      .expect(409);
    expect(reopened.body.error.id).toBe('wrong-state');
    await people.chair.agent.post(`/api/cases/${id}/decline`).send({ words: 'x' }).expect(409);
    const draft = await draftCase(people, wholeDraft);
    await people.referrer.agent.post(`/api/cases/${draft.id}/reopen`).send({ words: 'x' }).expect(403);
  });
});
