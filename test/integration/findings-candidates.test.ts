import { randomUUID } from 'node:crypto';
import type { Candidate, CandidateSet, Finding } from '@weighhouse/shared/contracts/findings';
import type { Settings } from '@weighhouse/shared/contracts/cases';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { caseInRound, draftCase, type Network, seatNetwork, takenCase } from '../factories/cases.js';
import { addCandidate, addFinding } from '../factories/findings.js';
import { type RunningApp, startApp } from '../setup/app.js';

const paths = (body: { error: { fields?: { path: string }[] } }): string[] =>
  (body.error.fields ?? []).map(({ path }) => path).sort();

describe('candidates and settings', () => {
  let running: RunningApp;
  let people: Network;

  beforeAll(async () => {
    running = await startApp();
    people = await seatNetwork(running);
  });
  afterAll(() => running.close());

  const candidates = async (caseId: string): Promise<CandidateSet> => {
    const { body } = await people.first.agent.get(`/api/cases/${caseId}/candidates`).expect(200);
    return body as CandidateSet;
  };
  const change = (caseId: string, settings: object) =>
    people.chair.agent.patch(`/api/cases/${caseId}/settings`).send({ reason: 'agreed', ...settings });

  it('each candidate added or retired makes the next set', async () => {
    const { id } = await takenCase(people);
    expect(await candidates(id)).toEqual({ candidateSet: 0, items: [] });
    const still = await addCandidate(people.first.agent, id, 'Still’s disease', { mustNotMiss: true });
    expect(still).toEqual({
      id: still.id,
      name: 'Still’s disease',
      detail: '',
      mustNotMiss: true,
      addedBy: people.first.name,
      retired: false,
      retiredWords: null,
    });
    const lymphoma = await addCandidate(people.chair.agent, id, 'Lymphoma');
    expect(await candidates(id)).toEqual({ candidateSet: 2, items: [still, lymphoma] });
    await people.first.agent.post(`/api/candidates/${still.id}/retire`).send({}).expect(403);
    const { body } = await people.chair.agent
      .post(`/api/candidates/${still.id}/retire`)
      .send({ words: 'the rash does not fit' })
      .expect(200);
    expect(body).toEqual({ candidateSet: 3, items: [lymphoma] });
    await people.chair.agent.post(`/api/candidates/${still.id}/retire`).send({}).expect(409);
    const again = await addCandidate(people.first.agent, id, 'Still’s disease');
    expect(again.id).not.toBe(still.id);
    expect((await candidates(id)).items.map(({ name }) => name)).toEqual(['Lymphoma', 'Still’s disease']);
  });

  it('a name is there once, however it is typed, and none of these is always there', async () => {
    const { id } = await takenCase(people);
    await addCandidate(people.first.agent, id, 'Still’s disease');
    for (const name of ['STILL’S DISEASE', "  still's   disease ", 'Still\u200Bʼs disease']) {
      const { body } = await people.chair.agent
        .post(`/api/cases/${id}/candidates`)
        .send({ name })
        .expect(409);
      expect(body.error.id).toBe('duplicate');
      expect(paths(body)).toEqual(['name']);
    }
    for (const name of ['None of these', '', 'x'.repeat(161), 5]) {
      const { body } = await people.chair.agent
        .post(`/api/cases/${id}/candidates`)
        .send({ name })
        .expect(400);
      expect(paths(body)).toEqual(['name']);
    }
    const racing = await Promise.all(
      [people.first, people.second, people.chair].map(({ agent }) =>
        agent.post(`/api/cases/${id}/candidates`).send({ name: 'Lymphoma' }),
      ),
    );
    expect(racing.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
    expect((await candidates(id)).candidateSet).toBe(2);
  });

  it('the set is frozen while a round is sealed', async () => {
    const { id } = await caseInRound(people, 'sealed');
    const before = await candidates(id);
    const added = await people.first.agent
      .post(`/api/cases/${id}/candidates`)
      .send({ name: 'Lupus' })
      .expect(409);
    expect(added.body.error.id).toBe('set-frozen');
    const [first] = before.items as [Candidate];
    const retired = await people.chair.agent.post(`/api/candidates/${first.id}/retire`).send({}).expect(409);
    expect(retired.body.error.id).toBe('set-frozen');
    expect(await candidates(id)).toEqual(before);
    const live = await caseInRound(people, 'live');
    await addCandidate(people.first.agent, live.id, 'Lupus');
  });

  it('thirty candidates are the most', async () => {
    const { id } = await takenCase(people);
    for (let k = 1; k <= 30; k += 1) await addCandidate(people.chair.agent, id, `Candidate ${String(k)}`);
    const { body } = await people.chair.agent
      .post(`/api/cases/${id}/candidates`)
      .send({ name: 'One more' })
      .expect(409);
    expect(body.error.id).toBe('wrong-state');
    const { items } = await candidates(id);
    await people.chair.agent
      .post(`/api/candidates/${items[0]?.id ?? ''}/retire`)
      .send({})
      .expect(200);
    await addCandidate(people.chair.agent, id, 'One more');
  });

  it('candidates are shut to the referrer’s pen, to liaisons and to strangers', async () => {
    const { id } = await takenCase(people);
    const { id: candidateId } = await addCandidate(people.first.agent, id, 'Lupus');
    await people.referrer.agent.get(`/api/cases/${id}/candidates`).expect(200);
    await people.referrer.agent.post(`/api/cases/${id}/candidates`).send({ name: 'x' }).expect(403);
    await people.liaison.agent.get(`/api/cases/${id}/candidates`).expect(403);
    await people.outsider.agent.get(`/api/cases/${id}/candidates`).expect(404);
    await people.otherChair.agent.post(`/api/candidates/${candidateId}/retire`).send({}).expect(404);
    await people.chair.agent.post(`/api/candidates/${randomUUID()}/retire`).send({}).expect(404);
    const draft = await draftCase(people);
    await people.referrer.agent.post(`/api/cases/${draft.id}/candidates`).send({ name: 'x' }).expect(403);
  });

  it('settings are changed by the chair with a reason, exactly as given', async () => {
    const { id } = await takenCase(people);
    const conferenceAt = '2027-02-03T11:30:00.000Z';
    const { body } = await change(id, {
      tempering: 0.55,
      coexistence: 0.123456,
      quorum: 2,
      conferenceAt,
    }).expect(200);
    expect(body).toEqual({
      tempering: 0.55,
      coexistence: 0.123456,
      quorum: 2,
      conferenceAt,
      groups: [],
      together: [],
      lastChange: { by: expect.stringMatching(/\w/), at: expect.any(String), reason: expect.any(String) },
    });
    const why = 'Half the panel is on leave that week';
    const kept = await people.chair.agent
      .patch(`/api/cases/${id}/settings`)
      .send({ quorum: 4, reason: why })
      .expect(200);
    expect(kept.body).toEqual({ ...body, quorum: 4, lastChange: expect.objectContaining({ reason: why }) });
    // The team reads why, with the numbers.
    const seen = await people.first.agent.get(`/api/cases/${id}/differential`).expect(200);
    expect(seen.body.settings.lastChange).toEqual(kept.body.lastChange);
    expect((await change(id, { conferenceAt: null }).expect(200)).body.conferenceAt).toBeNull();
    await people.chair.agent.patch(`/api/cases/${id}/settings`).send({ quorum: 2 }).expect(400);
    const beyond = { tempering: 0.29, coexistence: 0.51, quorum: 1, conferenceAt: 'soon' };
    expect(paths((await change(id, beyond).expect(400)).body)).toEqual(Object.keys(beyond).sort());
    for (const { agent } of [people.first, people.referrer, people.liaison]) {
      await agent.patch(`/api/cases/${id}/settings`).send({ quorum: 2, reason: 'x' }).expect(403);
    }
    await people.outsider.agent
      .patch(`/api/cases/${id}/settings`)
      .send({ quorum: 2, reason: 'x' })
      .expect(404);
  });

  it('groups are kept, renamed, and dissolved when they are left out', async () => {
    const { id } = await takenCase(people);
    const first = await change(id, {
      groups: [
        { label: 'General', overlap: 1 / 3, reason: 'one cause makes them all' },
        { label: 'Joints', overlap: 0 },
      ],
    }).expect(200);
    const { groups } = first.body as Settings;
    expect(groups.map(({ label, overlap, reason }) => [label, overlap, reason])).toEqual([
      ['General', 1 / 3, 'one cause makes them all'],
      ['Joints', 0, null],
    ]);
    const [general, joints] = groups;
    const finding = await addFinding(people.first.agent, id, { groupId: general?.id });
    const other = await addFinding(people.first.agent, id, { groupId: joints?.id });
    const second = await change(id, { groups: [{ id: joints?.id, label: 'Knees', overlap: 1 }] }).expect(200);
    expect(second.body.groups).toEqual([{ id: joints?.id, label: 'Knees', overlap: 1, reason: null }]);
    const { body } = await people.first.agent.get(`/api/cases/${id}/findings`).expect(200);
    expect((body.items as Finding[]).map((item) => [item.id, item.groupId])).toEqual([
      [finding.id, null],
      [other.id, joints?.id],
    ]);
    const elsewhere = await takenCase(people);
    const stolen = {
      groups: [
        { id: joints?.id, label: 'Mine', overlap: 0 },
        { label: 'mine', overlap: 2 },
      ],
    };
    expect(paths((await change(elsewhere.id, stolen).expect(400)).body)).toEqual(['groups[1].overlap']);
    const theirs = { groups: [{ id: joints?.id, label: 'Mine', overlap: 0 }] };
    expect(paths((await change(elsewhere.id, theirs).expect(400)).body)).toEqual(['groups[0].id']);
  });

  it('pairs are of two candidates in force, and go when one of them is retired', async () => {
    const { id } = await takenCase(people);
    const a = await addCandidate(people.first.agent, id, 'Still’s disease');
    const b = await addCandidate(people.first.agent, id, 'Haemophagocytic syndrome');
    const pair = { a: a.id, b: b.id, times: 3.5, reason: 'one leads to the other' };
    expect((await change(id, { together: [pair] }).expect(200)).body.together).toEqual([pair]);
    const turned = { ...pair, a: b.id, b: a.id };
    const wrong = [pair, turned, { ...pair, b: a.id }, { ...pair, b: randomUUID() }];
    expect(paths((await change(id, { together: wrong }).expect(400)).body)).toEqual([
      'together[1]',
      'together[2]',
      'together[3].b',
    ]);
    await people.chair.agent.post(`/api/candidates/${b.id}/retire`).send({}).expect(200);
    expect((await change(id, { quorum: 2 }).expect(200)).body.together).toEqual([]);
  });
});
