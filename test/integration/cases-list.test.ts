import type { CaseListItem } from '@weighhouse/shared/contracts/cases';
import { CaseChanges } from '@weighhouse/server/cases/case-changes';
import { CaseDirectory } from '@weighhouse/server/cases/case-directory';
import { UnitOfWork } from '@weighhouse/server/platform/database/unit-of-work';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  caseInRound,
  draftCase,
  type Network,
  type SeatedPerson,
  seatNetwork,
  submittedCase,
  takenCase,
  wholeDraft,
} from '../factories/cases.js';
import { type RunningApp, serviceOf, startApp } from '../setup/app.js';

describe('the table of cases', () => {
  let running: RunningApp;
  let people: Network;
  const ids = { draft: '', submitted: '', taken: '', sealed: '', withdrawn: '', declined: '' };

  beforeAll(async () => {
    running = await startApp();
    people = await seatNetwork(running);
    const { referrer, chair } = people;
    ids.draft = (
      await draftCase(people, { ...wholeDraft, question: '100% sure_of nothing', urgency: null })
    ).id;
    ids.submitted = (await submittedCase(people)).id;
    ids.taken = (await takenCase(people)).id;
    ids.sealed = (await caseInRound(people)).id;
    ids.withdrawn = (await takenCase(people)).id;
    ids.declined = (await submittedCase(people)).id;
    await referrer.agent.post(`/api/cases/${ids.withdrawn}/withdraw`).send({ words: 'x' }).expect(200);
    await chair.agent.post(`/api/cases/${ids.declined}/decline`).send({ words: 'x' }).expect(200);
  });
  afterAll(() => running.close());

  const list = async (
    { agent }: SeatedPerson,
    query: Record<string, string> = {},
  ): Promise<{ items: CaseListItem[]; total: number }> => {
    const { body } = await agent.get('/api/cases').query(query).expect(200);
    return body as { items: CaseListItem[]; total: number };
  };
  const names = async (person: SeatedPerson, query: Record<string, string> = {}): Promise<string[]> => {
    const { items } = await list(person, query);
    return items
      .map(({ id }) => Object.entries(ids).find(([, known]) => known === id)?.[0] ?? 'unknown')
      .sort();
  };

  it('holds what one may open and nothing else', async () => {
    expect(await names(people.referrer)).toEqual(Object.keys(ids).sort());
    expect(await names(people.chair)).toEqual(['sealed', 'submitted', 'taken']);
    expect(await names(people.otherChair)).toEqual(['submitted']);
    expect(await names(people.first)).toEqual(['sealed', 'taken']);
    for (const person of [people.liaison, people.outsider, people.otherReferrer, people.administrator]) {
      expect(await list(person)).toEqual({ items: [], total: 0 });
    }
    await running.agent().get('/api/cases').expect(401);
  });

  it('says sealed instead of a leader to everybody while a sealed round is open', async () => {
    await writeStanding(ids.sealed);
    await writeStanding(ids.taken);
    for (const person of [people.referrer, people.chair, people.first]) {
      const { items } = await list(person);
      const sealed = items.find(({ id }) => id === ids.sealed);
      expect(sealed).toMatchObject({ leader: 'sealed', disagreementBits: 'sealed' });
      expect(JSON.stringify(sealed)).not.toContain('Leading candidate');
      expect(sealed?.round).toEqual({ number: 1, kind: 'sealed', open: true, handedIn: 0, contributors: 2 });
      expect(items.find(({ id }) => id === ids.taken)).toMatchObject({
        leader: { name: 'Leading candidate', share: 0.5 },
        disagreementBits: 0.25,
      });
    }
  });

  it('filters by state, open and closed', async () => {
    const { referrer } = people;
    expect(await names(referrer, { state: 'open' })).toEqual(['draft', 'sealed', 'submitted', 'taken']);
    expect(await names(referrer, { state: 'closed' })).toEqual(['declined', 'withdrawn']);
    expect(await names(referrer, { state: 'draft' })).toEqual(['draft']);
    await referrer.agent.get('/api/cases?state=sealed').expect(400);
  });

  it('searches number and question, with signs that mean themselves', async () => {
    const { referrer } = people;
    expect(await names(referrer, { q: '100%' })).toEqual(['draft']);
    expect(await names(referrer, { q: 'SURE_OF' })).toEqual(['draft']);
    expect(await names(referrer, { q: 'sure%of' })).toEqual([]);
    expect(await names(referrer, { q: '_' })).toEqual(['draft']);
    expect(await names(referrer, { q: "' OR 1=1 -- " })).toEqual([]);
    expect(await names(referrer, { q: '\\' })).toEqual([]);
    const { items } = await list(referrer, { state: 'draft' });
    expect(await names(referrer, { q: items[0]?.number ?? '' })).toEqual(['draft']);
    expect(await names(people.first, { q: 'sure' })).toEqual([]);
  });

  it('sorts by each column both ways, what is missing last', async () => {
    const { referrer } = people;
    const numbers = (await list(referrer, { sort: 'number' })).items.map(({ number }) => number);
    expect(numbers).toEqual([...numbers].sort());
    const backwards = (await list(referrer, { sort: '-number' })).items.map(({ number }) => number);
    expect(backwards).toEqual([...numbers].reverse());
    const states = (await list(referrer, { sort: 'state' })).items.map(({ state }) => state);
    expect(states).toEqual(['draft', 'submitted', 'accepted', 'judging', 'declined', 'withdrawn']);
    for (const sort of ['urgency', '-urgency']) {
      expect((await list(referrer, { sort })).items.at(-1)?.id).toBe(ids.draft);
    }
    const moments = (await list(referrer)).items.map(({ updatedAt }) => updatedAt);
    expect(moments).toEqual([...moments].sort().reverse());
    for (const sort of ['leaderName', 'id', '--number', 'number;DROP TABLE case_file', 'disagreementBits']) {
      await referrer.agent.get('/api/cases').query({ sort }).expect(400);
    }
  });

  it('comes a page at a time with the total', async () => {
    const { referrer } = people;
    const pages = await Promise.all(
      ['1', '2', '3', '4'].map((page) => list(referrer, { sort: 'number', page, size: '2' })),
    );
    expect(pages.map(({ items }) => items.length)).toEqual([2, 2, 2, 0]);
    expect(pages.map(({ total }) => total)).toEqual([6, 6, 6, 6]);
    expect(new Set(pages.flatMap(({ items }) => items.map(({ id }) => id))).size).toBe(6);
    for (const query of [
      { size: '101' },
      { size: '0' },
      { page: '0' },
      { page: 'x' },
      { q: 'x'.repeat(101) },
    ]) {
      await referrer.agent.get('/api/cases').query(query).expect(400);
    }
  });

  /** As the domain that pools writes it. */
  async function writeStanding(caseId: string): Promise<void> {
    const columns = { leaderName: 'Leading candidate', leaderShare: 0.5, disagreementBits: 0.25 };
    await serviceOf(running.app, UnitOfWork).run(async (work) => {
      const file = await serviceOf(running.app, CaseDirectory).byId(caseId, work.em);
      if (!file) throw new Error('no such case');
      await serviceOf(running.app, CaseChanges).commit(work, file, 'judgements', [], columns);
    });
  }
});
