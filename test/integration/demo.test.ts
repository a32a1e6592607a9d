import { seedDemo } from '@weighhouse/db/demo/seed-demo';
import { demoCases } from '@weighhouse/db/demo/demo-case';
import { caseListSchema, type CaseListItem } from '@weighhouse/shared/contracts/cases';
import { differentialSchema } from '@weighhouse/shared/contracts/differential';
import { reportListSchema } from '@weighhouse/shared/contracts/reports';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Agent } from '../factories/people.js';
import { type RunningApp, startApp } from '../setup/app.js';

const password = 'lantern-coast-demo';

describe('the demo, seeded through the services', () => {
  let running: RunningApp;

  beforeAll(async () => {
    running = await startApp();
    await seedDemo(running.app);
  });
  afterAll(() => running.close());

  async function as(id: string): Promise<Agent> {
    const agent = running.agent();
    await agent
      .post('/api/session')
      .send({ email: `${id}@lantern.example`, password })
      .expect(200);
    return agent;
  }

  async function casesOf(agent: Agent): Promise<CaseListItem[]> {
    return caseListSchema.parse((await agent.get('/api/cases').expect(200)).body).items;
  }

  it('lets all fifteen people sign in', async () => {
    const people = ['adm-1', 'lia-2', 'sp-neuro', 'ref-2', 'chair-2'];
    for (const id of people) await as(id);
    const listed = await (await as('adm-1')).get('/api/people').expect(200);
    expect((listed.body as { items: unknown[] }).items).toHaveLength(15);
  });

  it('has case A in its live second round, with a standing that sums to one', async () => {
    const agent = await as('chair-1');
    const [a] = await casesOf(agent);
    expect(a?.round).toMatchObject({ number: 2, kind: 'live', open: true, handedIn: 4, contributors: 5 });
    const ledger = differentialSchema.parse(
      (await agent.get(`/api/cases/${a?.id ?? ''}/differential`).expect(200)).body,
    );
    expect(ledger.sealed).toBe(false);
    expect(ledger.others).toHaveLength(5);
    expect(ledger.findings).toHaveLength(demoCases.a.findings.length + demoCases.a.tests.length);
    expect(ledger.assessment?.standing.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
    expect(ledger.before).not.toBeNull();
  });

  it('tells case A in the order in which it happened, everybody by name', async () => {
    const agent = await as('chair-1');
    const [a] = await casesOf(agent);
    const { body } = await agent.get(`/api/cases/${a?.id ?? ''}/trail?size=200`).expect(200);
    const { items, total } = body as { items: { at: string; sentence: string }[]; total: number };
    expect(items).toHaveLength(total);
    const moments = items.map(({ at }) => at);
    expect(moments).toEqual([...moments].sort().reverse());
    expect(items.map(({ sentence }) => sentence).filter((sentence) => sentence.includes('  '))).toEqual([]);
  });

  it('has case B in its first sealed round with two of five in, and shows its chair no number', async () => {
    const agent = await as('chair-2');
    const b = (await casesOf(agent)).find((one) => one.round?.kind === 'sealed');
    expect(b?.round).toMatchObject({ number: 1, open: true, handedIn: 2, contributors: 5 });
    expect(b?.leader).toBe('sealed');
    const ledger = differentialSchema.parse(
      (await agent.get(`/api/cases/${b?.id ?? ''}/differential`).expect(200)).body,
    );
    expect(ledger).toMatchObject({ sealed: true, assessment: null, others: null, mine: null, before: null });
  });

  it('counts a group of n members with the exponent that the story gives it', async () => {
    const agent = await as('chair-1');
    const [a] = await casesOf(agent);
    const { body } = await agent.get(`/api/cases/${a?.id ?? ''}/differential`).expect(200);
    const { settings } = differentialSchema.parse(body);
    for (const group of demoCases.a.groups) {
      const overlap = settings.groups.find((one) => one.label === group.label)?.overlap ?? Number.NaN;
      expect(1 / (1 + (group.members.length - 1) * overlap)).toBeCloseTo(group.discount, 2);
    }
  });

  it('keeps the reports as PDF files that can be read', async () => {
    const agent = await as('ref-1');
    const [a] = await casesOf(agent);
    const { body } = await agent.get(`/api/cases/${a?.id ?? ''}/reports`).expect(200);
    const { items } = reportListSchema.parse(body);
    expect(items).toHaveLength(3);
    const content = await agent
      .get(`/api/reports/${items[0]?.id ?? ''}/content`)
      .buffer(true)
      .expect(200);
    expect((content.body as Buffer).subarray(0, 5).toString('latin1')).toBe('%PDF-');
  });

  it('sets the conference in the week after this one', async () => {
    const [a] = await casesOf(await as('chair-1'));
    const days = (Date.parse(a?.conferenceAt ?? '') - Date.now()) / 86_400_000;
    expect(days).toBeGreaterThan(1);
    expect(days).toBeLessThan(11);
  });

  it('says that it is there when it is seeded again', async () => {
    expect(await seedDemo(running.app)).toBe('The demo is there already.');
  });
});

describe('a database with other data', () => {
  it('is refused with the way out', async () => {
    const running = await startApp();
    const { makePerson } = await import('../factories/people.js');
    await makePerson(running, 'chair');
    await expect(seedDemo(running.app)).rejects.toThrow(/DEMO=0.*DATA_DIR/);
    await running.close();
  });
});
