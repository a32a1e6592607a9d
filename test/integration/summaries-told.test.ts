import { tellListSchema } from '@weighhouse/shared/contracts/summaries';
import { openApiDocument } from '@weighhouse/server/platform/http/open-api';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { seat } from '../factories/judgements.js';
import { concludedCase } from '../factories/plans.js';
import {
  approveSummary,
  contactInput,
  readSummary,
  saveSummary,
  summaryPath,
} from '../factories/summaries.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { mailbox } from '../setup/mailbox.js';
import { errorOf } from '../setup/refusals.js';

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

describe('the contact log', () => {
  it('keeps attempts, and refuses what cannot have happened', async () => {
    const case_ = await concludedCase(running);
    const log = (change: object) =>
      case_.liaison.agent.post(`${summaryPath(case_)}/contacts`).send(contactInput(running, change));
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
    const { version } = await saveSummary(case_, { version: 0, body: 'Text', ready: true });
    await approveSummary(case_, version);
    const unreached = await case_.liaison.agent
      .post(`${summaryPath(case_)}/told`)
      .send(contactInput(running, { reached: false }))
      .expect(400);
    expect(errorOf(unreached.body).fields?.map((fault) => fault.path)).toEqual(['reached']);
    const { contacts, state } = await readSummary(case_, case_.liaison);
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
    const { version } = await saveSummary(case_, { version: 0, body: 'Text', ready: true });
    await approveSummary(case_, version);
    await case_.liaison.agent
      .post(`${summaryPath(case_)}/contacts`)
      .send(contactInput(running, { reached: false }))
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
    const { version } = await saveSummary(case_, { version: 0, body: 'Of plan 1', ready: true });
    await approveSummary(case_, version);
    await case_.liaison.agent
      .post(`${summaryPath(case_)}/told`)
      .send(contactInput(running))
      .expect(200);
    const at = `/api/cases/${case_.id}`;
    await case_.chair.agent.post(`${at}/reopen`).send({ words: 'New result.' }).expect(200);
    expect(await readSummary(case_, case_.liaison)).toMatchObject({
      body: 'Of plan 1',
      state: 'told',
      abilities: ['summary.read'],
    });
    await case_.liaison.agent
      .post(`${summaryPath(case_)}/contacts`)
      .send(contactInput(running))
      .expect(409);
  });
});
