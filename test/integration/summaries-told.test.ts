import { type Summary, summarySchema, tellListSchema } from '@weighhouse/shared/contracts/summaries';
import { openApiDocument } from '@weighhouse/server/platform/http/open-api';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { type JudgedCase, seat, type SeatedPerson } from '../factories/judgements.js';
import { concludedCase } from '../factories/plans.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { mailbox } from '../setup/mailbox.js';

let running: RunningApp;
const box = mailbox();

beforeAll(async () => {
  running = await startApp();
});
afterAll(() => running.close());
beforeEach(() => {
  box.clear();
});
afterEach(() => {
  running.clock.reset();
});

const path = (of: JudgedCase): string => `/api/cases/${of.id}/summary`;
const errorOf = (body: unknown) =>
  (body as { error: { id: string; fields?: { path: string }[]; current?: unknown } }).error;

async function read(case_: JudgedCase, person: SeatedPerson): Promise<Summary> {
  const { body } = await person.agent.get(path(case_)).expect(200);
  return summarySchema.parse(body);
}

async function save(
  case_: JudgedCase,
  input: { version: number; body: string; ready?: boolean },
): Promise<Summary> {
  const { body } = await case_.liaison.agent.put(path(case_)).send(input).expect(200);
  return summarySchema.parse(body);
}

async function approve(case_: JudgedCase, version: number): Promise<Summary> {
  const { body } = await case_.chair.agent
    .post(`${path(case_)}/approve`)
    .send({ version })
    .expect(200);
  return summarySchema.parse(body);
}

const contact = (change: object = {}) => ({
  at: running.clock.now().toISOString(),
  how: 'telephone',
  reached: true,
  understood: 'partly',
  questions: 'Can I travel?',
  notes: 'Her daughter listened too.',
  ...change,
});

describe('the contact log', () => {
  it('keeps attempts, and refuses what cannot have happened', async () => {
    const case_ = await concludedCase(running);
    const log = (change: object) => case_.liaison.agent.post(`${path(case_)}/contacts`).send(contact(change));
    await log({ reached: false, understood: null, questions: '', notes: 'Nobody answered.' }).expect(200);
    const future = new Date(running.clock.now().getTime() + 3_600_000).toISOString();
    for (const [change, at] of [
      [{ at: future }, 'at'],
      [{ how: 'pigeon' }, 'how'],
      [{ reached: 'yes' }, 'reached'],
      [{ understood: 'maybe' }, 'understood'],
    ] as const) {
      const { body } = await log(change).expect(400);
      expect(errorOf(body).fields?.map((fault) => fault.path)).toEqual([at]);
    }
    const { version } = await save(case_, { version: 0, body: 'Text', ready: true });
    await approve(case_, version);
    const unreached = await case_.liaison.agent
      .post(`${path(case_)}/told`)
      .send(contact({ reached: false }))
      .expect(400);
    expect(errorOf(unreached.body).fields?.map((fault) => fault.path)).toEqual(['reached']);
    const { contacts, state } = await read(case_, case_.liaison);
    expect([state, contacts.map(({ told, notes }) => [told, notes])]).toEqual([
      'approved',
      [[false, 'Nobody answered.']],
    ]);
  });
});

describe('the liaison', () => {
  it('has a list of numbers, and how far each is', async () => {
    const case_ = await concludedCase(running, { ownPeople: true });
    const tell = async () => {
      const { body } = await case_.liaison.agent.get('/api/tell').expect(200);
      expect(JSON.stringify(body)).not.toMatch(/Still|fever|blood|spleen/i);
      return tellListSchema.parse(body).items;
    };
    expect(await tell()).toMatchObject([
      { caseId: case_.id, number: case_.number, state: 'draft', hasPlan: true, attempts: 0 },
    ]);
    const { version } = await save(case_, { version: 0, body: 'Text', ready: true });
    await approve(case_, version);
    await case_.liaison.agent
      .post(`${path(case_)}/contacts`)
      .send(contact({ reached: false }))
      .expect(200);
    expect(await tell()).toMatchObject([{ state: 'approved', attempts: 1 }]);
    const other = await seat(running, 'liaison');
    expect((await other.agent.get('/api/tell').expect(200)).body).toEqual({ items: [] });
  });

  it('reaches nothing else of the case through any route', async () => {
    const case_ = await concludedCase(running);
    const { agent } = case_.liaison;
    const at = `/api/cases/${case_.id}`;
    const open = ['/api/cases/{caseId}/summary', '/api/cases/{caseId}/identity', '/api/cases/{caseId}/trail'];
    const routes = Object.entries(openApiDocument(running.app).paths)
      .filter(([route, item]) => route.startsWith('/api/cases/{caseId}') && 'get' in item)
      .map(([route]) => route);
    expect(routes.length).toBeGreaterThan(10);
    for (const route of routes) {
      const { status } = await agent.get(`${route.replace('{caseId}', case_.id)}?format=fhir`);
      expect([route, status]).toEqual([route, open.includes(route) ? 200 : 403]);
    }
    for (const format of ['pdf', 'letter', 'panel'])
      await agent.get(`${at}/export?format=${format}`).expect(403);
    const { body: cases } = await agent.get('/api/cases').expect(200);
    expect(cases).toMatchObject({ items: [], total: 0 });
    const { body: today } = await agent.get('/api/today').expect(200);
    expect(JSON.stringify(today)).not.toMatch(/Still|fever|blood|spleen|marrow|lymphoma/i);
    const { body: trail } = await agent.get(`${at}/trail`).expect(200);
    expect(JSON.stringify(trail)).not.toMatch(/Still|fever|blood|spleen|marrow|lymphoma/i);
  });
});

describe('a reopened case', () => {
  it('gets a summary of its own for the later plan; the first stays with its contacts', async () => {
    const case_ = await concludedCase(running);
    const { version } = await save(case_, { version: 0, body: 'Of plan 1', ready: true });
    await approve(case_, version);
    await case_.liaison.agent
      .post(`${path(case_)}/told`)
      .send(contact())
      .expect(200);
    const at = `/api/cases/${case_.id}`;
    await case_.chair.agent.post(`${at}/reopen`).send({ words: 'New result.' }).expect(200);
    expect(await read(case_, case_.liaison)).toMatchObject({
      body: 'Of plan 1',
      state: 'told',
      abilities: ['summary.read'],
    });
    await case_.liaison.agent
      .post(`${path(case_)}/contacts`)
      .send(contact())
      .expect(409);
  });
});
