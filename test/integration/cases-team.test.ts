import type { TeamMember } from '@weighhouse/shared/contracts/cases';
import { AccessChangedEvent } from '@weighhouse/server/platform/events/case-events';
import { EventEmitter2 } from '@nestjs/event-emitter';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  caseInRound,
  type Network,
  seatNetwork,
  smallestTeam,
  submittedCase,
  takenCase,
} from '../factories/cases.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { mailbox } from '../setup/mailbox.js';

describe('the team of a case', () => {
  let running: RunningApp;
  let people: Network;

  beforeAll(async () => {
    running = await startApp();
    people = await seatNetwork(running);
  });
  afterAll(() => running.close());

  const set = (caseId: string, team: object[]) =>
    people.chair.agent.put(`/api/cases/${caseId}/team`).send(team);
  const partsOf = (items: TeamMember[]): string[] =>
    items.map(({ person, part }) => `${person.id} ${part}`).sort();

  it('is set by the chair as a whole; the referrer and the chair stay', async () => {
    const { id } = await takenCase(people);
    const outsider = {
      personId: people.outsider.id,
      part: 'contributor',
      weight: 2.5,
      reason: 'sees it weekly',
    };
    const { body } = await set(id, [...smallestTeam(people).slice(1), outsider]).expect(200);
    expect(partsOf(body.items as TeamMember[])).toEqual(
      [
        `${people.referrer.id} referrer`,
        `${people.chair.id} chair`,
        `${people.second.id} contributor`,
        `${people.outsider.id} contributor`,
        `${people.liaison.id} liaison`,
      ].sort(),
    );
    const seen = (body.items as TeamMember[]).find(({ person }) => person.id === people.outsider.id);
    expect(seen).toMatchObject({ weight: 2.5, reason: 'sees it weekly' });
    await people.first.agent.get(`/api/cases/${id}`).expect(404);
    await people.outsider.agent.get(`/api/cases/${id}`).expect(200);
  });

  it('keeps its weights and reasons where they are left out', async () => {
    const { id } = await takenCase(people);
    const [first, ...rest] = smallestTeam(people);
    await set(id, [{ ...first, weight: 0.5, reason: 'new to the field' }, ...rest]).expect(200);
    const { body } = await set(id, smallestTeam(people)).expect(200);
    const kept = (body.items as TeamMember[]).find(({ person }) => person.id === people.first.id);
    expect(kept).toMatchObject({ weight: 0.5, reason: 'new to the field' });
  });

  it('asks those who are added later by letter, and tells who was taken off that their access has changed', async () => {
    const { id, number } = await takenCase(people);
    await running.outbox.flush();
    const letters = mailbox();
    letters.clear();
    const heard: AccessChangedEvent[] = [];
    const listen = (event: AccessChangedEvent): number => heard.push(event);
    running.app.get(EventEmitter2).on(AccessChangedEvent.eventName, listen);
    const team = smallestTeam(people).filter(({ personId }) => personId !== people.first.id);
    await set(id, [...team, { personId: people.outsider.id, part: 'contributor' }]).expect(200);
    running.app.get(EventEmitter2).off(AccessChangedEvent.eventName, listen);
    await running.outbox.flush();
    const sent = await letters.messages();
    expect(sent.map(({ subject }) => subject)).toEqual([`You are asked to judge case ${number}`]);
    expect(String(sent[0]?.to)).toContain(people.outsider.email);
    expect(heard.map(({ personId, caseId }) => [personId, caseId])).toEqual([[people.first.id, id]]);
  });

  it('cannot do without two contributors and a liaison once the case is accepted', async () => {
    const { id } = await takenCase(people);
    const { body } = await set(id, [{ personId: people.first.id, part: 'contributor' }]).expect(409);
    expect(body.error.id).toBe('not-ready');
    expect(body.error.fields).toHaveLength(2);
    const early = await submittedCase(people);
    await set(early.id, [{ personId: people.first.id, part: 'contributor' }]).expect(200);
  });

  it('refuses weights beyond 0 to 3, for others than contributors, and without a reason', async () => {
    const { id } = await takenCase(people);
    const [first, second, liaison] = smallestTeam(people);
    for (const weight of [-0.1, 3.1, '2', null]) {
      await set(id, [{ ...first, weight, reason: 'x' }, second!, liaison!]).expect(400);
    }
    const { body } = await set(id, [{ ...first, weight: 2 }, second!, { ...liaison, weight: 1 }]).expect(400);
    expect((body.error.fields as { path: string }[]).map(({ path }) => path)).toEqual([
      '[0].reason',
      '[2].weight',
    ]);
    await set(
      id,
      Array.from({ length: 61 }, () => first!),
    ).expect(400);
  });

  it('freezes the weights while a round is sealed, also against leaving and coming back', async () => {
    const { id } = await caseInRound(people, 'sealed');
    const [first, ...rest] = smallestTeam(people);
    const heavier = { ...first, weight: 2, reason: 'most experienced' };
    const refused = await set(id, [heavier, ...rest]).expect(409);
    expect(refused.body.error.id).toBe('weights-frozen');
    const others = [...rest, { personId: people.outsider.id, part: 'contributor' }];
    await set(id, others).expect(200);
    await set(id, [...others, heavier]).expect(409);
    const { body } = await set(id, [...others, first!]).expect(200);
    const back = (body.items as TeamMember[]).find(({ person }) => person.id === people.first.id);
    expect(back?.weight).toBe(1);
  });

  it('lets the weights be changed while a round is live', async () => {
    const { id } = await caseInRound(people, 'live');
    const [first, ...rest] = smallestTeam(people);
    await set(id, [{ ...first, weight: 0, reason: 'asked to be left out' }, ...rest]).expect(200);
  });

  it('can get another chair, who then alone is the chair', async () => {
    const { id } = await takenCase(people);
    const otherChair = { personId: people.otherChair.id, part: 'chair' };
    const { body } = await set(id, [...smallestTeam(people), otherChair]).expect(200);
    expect(
      (body.items as TeamMember[]).filter(({ part }) => part === 'chair').map(({ person }) => person.id),
    ).toEqual([people.otherChair.id]);
    await people.chair.agent.get(`/api/cases/${id}`).expect(404);
    await people.otherChair.agent.get(`/api/cases/${id}`).expect(200);
  });

  it('is set by nobody else', async () => {
    const { id } = await takenCase(people);
    const team = smallestTeam(people);
    await people.first.agent.put(`/api/cases/${id}/team`).send(team).expect(403);
    await people.referrer.agent.put(`/api/cases/${id}/team`).send(team).expect(403);
    await people.outsider.agent.put(`/api/cases/${id}/team`).send(team).expect(404);
    await people.otherChair.agent.put(`/api/cases/${id}/team`).send(team).expect(404);
  });

  it('does not take two chairs who set it at once for one another', async () => {
    const { id } = await takenCase(people);
    const teams = [people.outsider, people.first].map(({ id: personId }) => [
      { personId, part: 'contributor' },
      ...smallestTeam(people).slice(1),
    ]);
    const answers = await Promise.all(teams.map((team) => set(id, team)));
    expect(answers.map(({ status }) => status)).toEqual([200, 200]);
    const { body } = await people.chair.agent.get(`/api/cases/${id}`).expect(200);
    expect((body.team as TeamMember[]).filter(({ part }) => part === 'contributor')).toHaveLength(2);
  });
});
