import { randomUUID } from 'node:crypto';
import type { AgendaItem } from '@weighhouse/shared/contracts/differential';
import { liveEvents } from '@weighhouse/shared/contracts/live';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { caseInRound, type Network, seatNetwork, takenCase } from '../factories/cases.js';
import { addFinding } from '../factories/findings.js';
import { closeListeners, listen, quietly } from '../factories/live.js';
import type { Agent } from '../factories/people.js';
import { type RunningApp, startApp } from '../setup/app.js';

const note = 'Two of us read the rash quite differently.';

let running: RunningApp;
let people: Network;

beforeAll(async () => {
  running = await startApp();
  people = await seatNetwork(running);
});
afterAll(async () => {
  closeListeners();
  await running.close();
});

const findingIds = async (caseId: string): Promise<[string, string, string]> => {
  const { body } = await people.chair.agent.get(`/api/cases/${caseId}/findings`).expect(200);
  return (body.items as { id: string }[]).map(({ id }) => id) as [string, string, string];
};
const put = (caseId: string, findingId: string, body: object, agent: Agent = people.chair.agent) =>
  agent.put(`/api/cases/${caseId}/agenda/${findingId}`).send(body);
const takeOff = (caseId: string, findingId: string, query = '', agent: Agent = people.chair.agent) =>
  agent.delete(`/api/cases/${caseId}/agenda/${findingId}${query}`);
const agendaOf = async (caseId: string, agent: Agent = people.chair.agent): Promise<AgendaItem[]> => {
  const { body } = await agent.get(`/api/cases/${caseId}/differential`).expect(200);
  return body.agenda as AgendaItem[];
};

describe('the agenda', () => {
  it('holds what the chair puts on it, in that order, for everybody who sees the ledger', async () => {
    const { id } = await caseInRound(people);
    const [fever, rash, ferritin] = await findingIds(id);
    const first = await put(id, rash, { note: `  ${note} ` }).expect(200);
    const second = await put(id, fever, { note: 'How high?', version: 0 }).expect(200);
    expect(first.body).toEqual({
      findingId: rash,
      note,
      version: expect.any(Number) as number,
      addedBy: people.chair.name,
      addedAt: expect.any(String) as string,
    });
    for (const { agent } of [people.chair, people.first, people.referrer])
      expect(await agendaOf(id, agent)).toEqual([first.body, second.body]);

    const { version } = first.body as AgendaItem;
    const changed = await put(id, rash, { note: 'Only the rash.', version }).expect(200);
    expect(changed.body).toMatchObject({
      ...first.body,
      note: 'Only the rash.',
      version: changed.body.version,
    });
    expect(changed.body.version).toBeGreaterThan(version);
    await takeOff(id, fever).expect(200, { done: true });
    expect(await agendaOf(id)).toEqual([changed.body]);
    expect(await agendaOf(id)).not.toContainEqual(expect.objectContaining({ findingId: ferritin }));

    const { body: trail } = await people.chair.agent.get(`/api/cases/${id}/trail`).expect(200);
    const lines = (trail.items as { action: string; sentence: string }[])
      .filter(({ action }) => action.startsWith('agenda.'))
      .map(({ sentence }) => sentence);
    expect(lines).toEqual([
      'took a finding off the agenda',
      'changed a note on the agenda',
      'put a finding on the agenda',
      'put a finding on the agenda',
    ]);
    expect(JSON.stringify(trail)).not.toMatch(/rash/i);
  });

  it('is the chair’s alone: 403 to the wrong part, 404 to a stranger', async () => {
    const { id } = await caseInRound(people);
    const [fever] = await findingIds(id);
    await put(id, fever, { note }).expect(200);
    for (const { agent } of [people.first, people.referrer, people.liaison]) {
      await put(id, fever, { note: 'mine' }, agent).expect(403);
      await takeOff(id, fever, '', agent).expect(403);
    }
    for (const { agent } of [people.outsider, people.otherChair, people.administrator]) {
      await put(id, fever, { note: 'mine' }, agent).expect(404);
      await takeOff(id, fever, '', agent).expect(404);
    }
    expect(await agendaOf(id)).toMatchObject([{ note }]);
    const chair = await people.chair.agent.get(`/api/cases/${id}/differential`).expect(200);
    const contributor = await people.first.agent.get(`/api/cases/${id}/differential`).expect(200);
    expect(chair.body.abilities).toContain('agenda.change');
    expect(contributor.body.abilities).not.toContain('agenda.change');
  });

  it('takes findings of its own case only, and none that was entered in error', async () => {
    const { id } = await caseInRound(people);
    const [fever, rash] = await findingIds(id);
    const elsewhere = await caseInRound(people);
    const [foreign] = await findingIds(elsewhere.id);
    await put(elsewhere.id, foreign, { note }).expect(200);
    await put(id, foreign, { note }).expect(404);
    await takeOff(id, foreign).expect(404);
    await put(id, randomUUID(), { note }).expect(404);
    await takeOff(id, rash).expect(404);
    expect(await agendaOf(elsewhere.id)).toHaveLength(1);

    await put(id, fever, { note }).expect(200);
    const words = { words: 'another patient’s' };
    await people.first.agent.post(`/api/findings/${fever}/entered-in-error`).send(words).expect(200);
    expect(await agendaOf(id)).toEqual([]);
    const refused = await put(id, fever, { note: 'again' }).expect(409);
    expect(refused.body.error.id).toBe('wrong-state');
    await takeOff(id, fever).expect(200);
  });

  it('wants a note in words', async () => {
    const { id } = await caseInRound(people);
    const [fever] = await findingIds(id);
    for (const body of [{}, { note: '' }, { note: '   ' }, { note: 7 }, { note: 'x'.repeat(1001) }]) {
      const { body: answer } = await put(id, fever, body).expect(400);
      expect(answer.error.fields).toMatchObject([{ path: 'note' }]);
    }
    for (const version of [-1, 0.5, '1', null]) {
      const { body: answer } = await put(id, fever, { note, version }).expect(400);
      expect(answer.error.fields).toMatchObject([{ path: 'version' }]);
    }
    await put(id, 'fever', { note }).expect(400);
    await takeOff(id, fever, '?version=soon').expect(400);
    expect(await agendaOf(id)).toEqual([]);
    const longest = '–'.repeat(1000);
    expect((await put(id, fever, { note: longest }).expect(200)).body.note).toBe(longest);
  });

  it('loses nobody’s note: the second is told, with the text that stands', async () => {
    const { id } = await caseInRound(people);
    const [fever] = await findingIds(id);
    const answers = await Promise.all(
      ['a', 'b', 'c'].map((text) => put(id, fever, { note: text, version: 0 })),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409]);
    const [item] = await agendaOf(id);
    expect(answers.find(({ status }) => status === 200)?.body).toEqual(item);
    for (const { body } of answers.filter(({ status }) => status === 409))
      expect(body.error).toMatchObject({ id: 'stale', current: item });

    const version = item?.version ?? 0;
    await put(id, fever, { note: 'newer', version }).expect(200);
    const late = await takeOff(id, fever, `?version=${String(version)}`).expect(409);
    expect(late.body.error).toMatchObject({ id: 'stale', current: { note: 'newer' } });

    // Taken off and put back is not what was seen before, whatever it was called then.
    await takeOff(id, fever).expect(200);
    const gone = await put(id, fever, { note: 'too late', version }).expect(409);
    expect(gone.body.error).toMatchObject({ id: 'stale', current: null });
    await put(id, fever, { note: 'put back' }).expect(200);
    await put(id, fever, { note: 'too late', version }).expect(409);
    expect(await agendaOf(id)).toMatchObject([{ note: 'put back' }]);
  });

  it('waits until judging has begun, and ends with a withdrawn case', async () => {
    const taken = await takenCase(people);
    const early = await addFinding(people.first.agent, taken.id);
    const refused = await put(taken.id, early.id, { note }).expect(409);
    expect(refused.body.error.id).toBe('wrong-state');

    const { id } = await caseInRound(people);
    const [fever] = await findingIds(id);
    await put(id, fever, { note }).expect(200);
    await people.referrer.agent
      .post(`/api/cases/${id}/withdraw`)
      .send({ words: 'consent ended' })
      .expect(200);
    await put(id, fever, { note: 'still' }).expect(403);
    await takeOff(id, fever).expect(403);
    expect(await agendaOf(id, people.referrer.agent)).toMatchObject([{ note }]);
  });

  it('tells the panel’s open pages, also in a sealed round, and moves no standing', async () => {
    const { id } = await caseInRound(people);
    const [fever] = await findingIds(id);
    const pages = [
      await listen(running, people.first, id),
      await listen(running, people.liaison, id),
    ] as const;
    for (const page of pages) page.heard.length = 0;
    await put(id, fever, { note }).expect(200);
    const told = await pages[0].until(liveEvents.changed);
    expect(told.what).toBe('agenda');
    await quietly();
    expect(pages[0].heard).toHaveLength(1);
    expect(pages[1].heard).toEqual([]);
  });
});
