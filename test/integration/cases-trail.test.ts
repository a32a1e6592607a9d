import type { TrailEntry } from '@weighhouse/shared/contracts/trail';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { caseInRound, type Network, type SeatedPerson, seatNetwork, takenCase } from '../factories/cases.js';
import { type RunningApp, startApp } from '../setup/app.js';

describe('the trail', () => {
  let running: RunningApp;
  let people: Network;

  beforeAll(async () => {
    running = await startApp();
    people = await seatNetwork(running);
  });
  afterAll(() => running.close());

  const trail = async (
    { agent }: SeatedPerson,
    caseId: string,
    query: Record<string, string> = {},
  ): Promise<{ items: TrailEntry[]; total: number }> => {
    const { body } = await agent.get(`/api/cases/${caseId}/trail`).query(query).expect(200);
    return body as { items: TrailEntry[]; total: number };
  };

  it('tells the referrer and the chair everything, everybody else their own acts', async () => {
    const { id } = await takenCase(people);
    await people.first.agent.post(`/api/cases/${id}/findings`).send({ title: 'Rash' }).expect(201);
    const { items, total } = await trail(people.referrer, id);
    expect(total).toBe(items.length);
    expect(items.map(({ sentence }) => sentence)).toContain(
      `took ${people.chair.name} as chair onto the team`,
    );
    expect(items[0]).toMatchObject({
      who: people.first.name,
      action: 'finding.added',
      sentence: 'added a finding',
    });
    expect(items.map(({ action }) => action)).toEqual([
      'finding.added',
      ...Array.from({ length: 4 }, () => 'team.joined'),
      'case.accepted',
      'case.submitted',
      'case.opened',
    ]);
    expect(items.map(({ id: line }) => line)).toEqual([8, 7, 6, 5, 4, 3, 2, 1]);
    expect(await trail(people.chair, id)).toEqual({ items, total });
    expect((await trail(people.first, id)).items.map(({ who }) => who)).toEqual([people.first.name]);
    expect(await trail(people.second, id)).toEqual({ items: [], total: 0 });
    expect(await trail(people.liaison, id)).toEqual({ items: [], total: 0 });
    await people.outsider.agent.get(`/api/cases/${id}/trail`).expect(404);
    await people.administrator.agent.get(`/api/cases/${id}/trail`).expect(404);
  });

  it('holds no clinical word', async () => {
    const { id } = await caseInRound(people);
    const { items } = await trail(people.chair, id);
    expect(JSON.stringify(items)).not.toMatch(/fever|rash|ferritin|lymphoma|still|illness/i);
  });

  it('tells one line for a draft that is saved again and again', async () => {
    const { id, version } = (await people.referrer.agent.post('/api/cases').send({}).expect(201)).body as {
      id: string;
      version: number;
    };
    for (const [step, question] of ['W', 'Wh', 'Why'].entries()) {
      const draft = { version: version + step, question };
      await people.referrer.agent.patch(`/api/cases/${id}`).send(draft).expect(200);
    }
    expect((await trail(people.referrer, id)).items.map(({ action }) => action)).toEqual([
      'case.changed',
      'case.opened',
    ]);
  });

  it('shows what is done in a sealed round to whoever did it alone, until it is unsealed', async () => {
    const { id } = await caseInRound(people, 'sealed');
    const before = await trail(people.chair, id);
    const referrersBefore = await trail(people.referrer, id);
    const { body: differential } = await people.first.agent.get(`/api/cases/${id}/differential`).expect(200);
    const { candidateSet } = differential as { candidateSet: number };
    await people.first.agent
      .put(`/api/cases/${id}/judgement/prior`)
      .send({ candidateSet, outOf100: [31.7, 23.6, 44.7] })
      .expect(200);
    expect(await trail(people.chair, id)).toEqual(before);
    expect(await trail(people.referrer, id)).toEqual(referrersBefore);
    const own = await trail(people.first, id);
    expect(own.items.map(({ action }) => action).join()).toMatch(/prior|judgement/);
    expect(JSON.stringify(own)).not.toMatch(/31|23\.6|44/);
    expect(await trail(people.second, id)).toEqual({ items: [], total: 0 });

    await people.chair.agent
      .patch(`/api/cases/${id}/settings`)
      .send({ quorum: 2, reason: 'two contributors' })
      .expect(200);
    const { body: rounds } = await people.chair.agent.get(`/api/cases/${id}/rounds`).expect(200);
    const [{ id: roundId }] = rounds.items as [{ id: string }];
    for (const { agent } of [people.first, people.second]) {
      await agent.post(`/api/rounds/${roundId}/hand-in`).send({ noMore: true }).expect(200);
    }
    const savedIn = ({ items }: { items: TrailEntry[] }) =>
      items.filter(({ who, action }) => who === people.first.name && action === own.items[0]?.action);
    expect(savedIn(await trail(people.chair, id))).toHaveLength(0);
    await people.chair.agent.post(`/api/rounds/${roundId}/unseal`).send({}).expect(200);
    expect(savedIn(await trail(people.chair, id))).toHaveLength(1);
    expect((await trail(people.second, id)).items.every(({ who }) => who === people.second.name)).toBe(true);
  });

  it('comes a page at a time, the latest first', async () => {
    const { id } = await takenCase(people);
    const whole = await trail(people.chair, id);
    const pages = await Promise.all(
      ['1', '2', '3'].map((page) => trail(people.chair, id, { page, size: '3' })),
    );
    expect(pages.flatMap(({ items }) => items)).toEqual(whole.items);
    await people.chair.agent.get(`/api/cases/${id}/trail?size=201`).expect(400);
  });
});
