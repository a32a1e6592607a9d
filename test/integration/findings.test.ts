import { randomUUID } from 'node:crypto';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  caseInRound,
  draftCase,
  type Network,
  seatNetwork,
  submittedCase,
  takenCase,
} from '../factories/cases.js';
import { addFinding } from '../factories/findings.js';
import { uploadReport } from '../factories/reports.js';
import { type RunningApp, startApp } from '../setup/app.js';

const paths = (body: { error: { fields?: { path: string }[] } }): string[] =>
  (body.error.fields ?? []).map(({ path }) => path).sort();

describe('findings', () => {
  let running: RunningApp;
  let people: Network;

  beforeAll(async () => {
    running = await startApp();
    people = await seatNetwork(running);
  });
  afterAll(() => running.close());

  const list = async (caseId: string): Promise<Finding[]> => {
    const { body } = await people.chair.agent.get(`/api/cases/${caseId}/findings`).expect(200);
    return body.items as Finding[];
  };

  it('are added by the team and keep their order; the plainest needs a title alone', async () => {
    const { id } = await takenCase(people);
    const plain = await addFinding(people.first.agent, id, { title: 'Rash', observed: undefined });
    expect(plain).toMatchObject({
      version: 1,
      kind: 'symptom',
      levelLabels: ['absent', 'present'],
      observed: null,
      reliability: 1,
      groupId: null,
      source: null,
      enteredInError: null,
      addedBy: people.first.name,
    });
    const report = await uploadReport(people.referrer.agent, id);
    const rich = await addFinding(people.chair.agent, id, {
      title: 'Ferritin',
      detail: 'twice, a week apart',
      kind: 'laboratory',
      levelLabels: ['normal', 'raised', 'above five times'],
      observed: 2,
      reliability: 'fair',
      observedOn: '2026-03-05',
      cost: 12.5,
      waitDays: 0.5,
      burden: 1,
      source: { reportId: report.id, page: 3 },
    });
    expect(rich).toMatchObject({
      levelLabels: ['normal', 'raised', 'above five times'],
      observed: 2,
      reliability: 0.7,
      observedOn: '2026-03-05',
      cost: 12.5,
      waitDays: 0.5,
      burden: 1,
      source: { reportId: report.id, fileName: report.fileName, page: 3, text: null },
    });
    const exact = await addFinding(people.referrer.agent, id, { title: 'Gait', reliability: 0.123456789 });
    expect(exact.reliability).toBe(0.123456789);
    expect((await list(id)).map(({ title }) => title)).toEqual(['Rash', 'Ferritin', 'Gait']);
    expect(await list(id)).toEqual([plain, rich, exact]);
  });

  it('that do not fit the case are refused with every fault', async () => {
    const { id } = await takenCase(people);
    const elsewhere = await takenCase(people);
    const foreign = await uploadReport(people.referrer.agent, elsewhere.id);
    const { body: settings } = await people.chair.agent
      .patch(`/api/cases/${elsewhere.id}/settings`)
      .send({ groups: [{ label: 'Fever', overlap: 0.5 }], reason: 'one mechanism' })
      .expect(200);
    const post = (finding: object) => people.first.agent.post(`/api/cases/${id}/findings`).send(finding);
    const unfit = await post({
      title: 'x',
      levelLabels: ['low', 'Low'],
      observed: 2,
      groupId: (settings as { groups: { id: string }[] }).groups[0]?.id,
      source: { reportId: foreign.id },
    }).expect(400);
    expect(paths(unfit.body)).toEqual(['groupId', 'levelLabels[1]', 'observed', 'source.reportId']);
    const malformed = await post({
      title: ' ',
      kind: 'guess',
      levelLabels: ['one'],
      observed: -1,
      reliability: 'none',
      groupId: 'x',
      cost: -1,
      waitDays: 'soon',
      burden: 4,
      source: { page: 0 },
    }).expect(400);
    expect(paths(malformed.body)).toEqual(
      [
        ...['title', 'kind', 'levelLabels', 'observed', 'reliability', 'groupId'],
        ...['cost', 'waitDays', 'burden', 'source.page'],
      ].sort(),
    );
    for (const reliability of [0, 0.04, 1.1, null, '0.5'])
      await post({ title: 'x', reliability }).expect(400);
    await post({ title: 'x', observed: 1.5 }).expect(400);
    await post({ title: 'x', levelLabels: Array.from({ length: 7 }, (_, k) => `l${String(k)}`) }).expect(400);
    await post({ title: 'x'.repeat(301) }).expect(400);
    expect(await list(id)).toEqual([]);
  });

  it('are changed with the version that was last seen; of five racing changes one is saved', async () => {
    const { id } = await takenCase(people);
    const finding = await addFinding(people.first.agent, id, { title: 'Rash', observed: null });
    const patch = (title: string) =>
      people.second.agent.patch(`/api/findings/${finding.id}`).send({ version: 1, title });
    const answers = await Promise.all(['a', 'b', 'c', 'd', 'e'].map(patch));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409, 409]);
    const [saved] = await list(id);
    const losers = answers.filter(({ status }) => status === 409);
    for (const { body } of losers) expect(body.error).toMatchObject({ id: 'stale', current: saved });
    expect(answers.find(({ status }) => status === 200)?.body).toEqual(saved);
    await people.second.agent.patch(`/api/findings/${finding.id}`).send({ title: 'x' }).expect(400);
  });

  it('keep what a change leaves out, and take a result', async () => {
    const { id } = await takenCase(people);
    const { agent } = people.first;
    const finding = await addFinding(agent, id, {
      title: 'Biopsy',
      observed: null,
      cost: 1400,
      source: { text: 'asked for by telephone' },
    });
    const { body } = await agent
      .patch(`/api/findings/${finding.id}`)
      .send({ version: 1, observed: 1, cost: null })
      .expect(200);
    expect(body).toEqual({ ...finding, version: 2, observed: 1, cost: null });
    await agent.patch(`/api/findings/${finding.id}`).send({ version: 2, observed: 2 }).expect(400);
    const cleared = await agent
      .patch(`/api/findings/${finding.id}`)
      .send({ version: 2, source: null, observed: null })
      .expect(200);
    expect(cleared.body).toMatchObject({ version: 3, source: null, observed: null });
  });

  it('get other levels only before judging has begun', async () => {
    const { id } = await caseInRound(people);
    const [finding] = await list(id);
    const patch = (change: object) =>
      people.first.agent.patch(`/api/findings/${finding?.id ?? ''}`).send({ version: 1, ...change });
    const refused = await patch({ levelLabels: ['none', 'some', 'much'] }).expect(409);
    expect(refused.body.error.id).toBe('wrong-state');
    const renamed = await patch({ levelLabels: ['never', 'every evening'] }).expect(200);
    expect(renamed.body.levelLabels).toEqual(['never', 'every evening']);
    const early = await takenCase(people);
    const free = await addFinding(people.first.agent, early.id, { observed: 1 });
    const change = { version: 1, levelLabels: ['none', 'some', 'much'], observed: 2 };
    await people.first.agent.patch(`/api/findings/${free.id}`).send(change).expect(200);
    await people.first.agent
      .patch(`/api/findings/${free.id}`)
      .send({ version: 2, levelLabels: ['none', 'some'] })
      .expect(400);
  });

  it('entered in error stay in their places and count nowhere', async () => {
    const { id } = await takenCase(people);
    const { agent } = people.first;
    const wrong = await addFinding(agent, id, { title: 'Somebody else’s result' });
    await addFinding(agent, id, { title: 'Rash' });
    const mark = (words: string) => agent.post(`/api/findings/${wrong.id}/entered-in-error`).send({ words });
    await mark(' ').expect(400);
    const { body } = await mark('another patient’s').expect(200);
    expect(body).toMatchObject({
      version: 2,
      enteredInError: { words: 'another patient’s', by: people.first.name },
    });
    await mark('again').expect(409);
    await agent.patch(`/api/findings/${wrong.id}`).send({ version: 2, title: 'x' }).expect(409);
    expect((await list(id)).map(({ title }) => title)).toEqual(['Somebody else’s result', 'Rash']);
    const { body: seen } = await agent.get(`/api/cases/${id}`).expect(200);
    expect(seen.counts.findings).toBe(1);
  });

  it('are shut to liaisons and strangers, and to everybody at the wrong time', async () => {
    const { id } = await takenCase(people);
    const finding = await addFinding(people.first.agent, id);
    const change = { version: 1, title: 'Mine' };
    await people.liaison.agent.get(`/api/cases/${id}/findings`).expect(403);
    await people.liaison.agent.patch(`/api/findings/${finding.id}`).send(change).expect(403);
    for (const { agent } of [people.outsider, people.administrator, people.otherChair]) {
      await agent.get(`/api/cases/${id}/findings`).expect(404);
      await agent.patch(`/api/findings/${finding.id}`).send(change).expect(404);
      await agent.post(`/api/findings/${finding.id}/entered-in-error`).send({ words: 'x' }).expect(404);
    }
    await people.first.agent.patch(`/api/findings/${randomUUID()}`).send(change).expect(404);
    const waiting = await submittedCase(people);
    await people.referrer.agent.post(`/api/cases/${waiting.id}/findings`).send({ title: 'x' }).expect(409);
    await people.chair.agent.post(`/api/cases/${waiting.id}/findings`).send({ title: 'x' }).expect(403);
    const draft = await draftCase(people);
    await people.chair.agent.post(`/api/cases/${draft.id}/findings`).send({ title: 'x' }).expect(404);
    await addFinding(people.referrer.agent, draft.id);
  });

  it('added at once get places of their own', async () => {
    const { id } = await takenCase(people);
    await Promise.all(
      [1, 2, 3, 4, 5, 6].map((k) => addFinding(people.first.agent, id, { title: `F${String(k)}` })),
    );
    expect(new Set((await list(id)).map(({ title }) => title)).size).toBe(6);
  });
});
