import { summarySchema } from '@weighhouse/shared/contracts/summaries';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { acceptedCase, seat, type SeatedPerson, unsealedCase } from '../factories/judgements.js';
import { concludedCase, planWords } from '../factories/plans.js';
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

async function letterTo(person: SeatedPerson): Promise<{ subject: string; text: string }[]> {
  await running.outbox.flush();
  await running.outbox.flush();
  return (await box.messages()).filter(({ to }) => to.includes(person.email));
}

describe('the summary', () => {
  it('is nothing before a plan is signed', async () => {
    const case_ = await unsealedCase(running);
    const summary = await readSummary(case_, case_.liaison);
    expect(summary).toMatchObject({
      state: 'none',
      version: 0,
      body: '',
      planNumber: null,
      safetyNet: null,
      actions: [],
    });
    await case_.liaison.agent.put(summaryPath(case_)).send({ version: 0, body: 'Too early' }).expect(409);
    const early = await acceptedCase(running, { contributors: 2 });
    await early.liaison.agent.get(summaryPath(early)).expect(409);
  });

  it('is drafted from the signed plan in plain words: what was found, how sure, what is next, when to get help', async () => {
    const case_ = await concludedCase(running);
    const summary = await readSummary(case_, case_.liaison);
    expect(summary).toMatchObject({
      state: 'draft',
      version: 0,
      planNumber: 1,
      safetyNet: planWords.safetyNet,
    });
    expect(summary.body).toContain(`The best explanation so far is this: ${planWords.workingDiagnosis}.`);
    expect(summary.body).toMatch(/About \d+ of them would have this\./);
    expect(summary.body).toContain('– A blood test every two weeks, by 12 March 2027.');
    expect(summary.body).toContain(planWords.safetyNet);
    expect(summary.body).toContain('does not replace the advice of the people who treat you');
    // What does not concern the patient stays out of the text and of the list.
    expect(JSON.stringify(summary)).not.toContain(planWords.forDoctors);
    expect(summary.actions.map(({ what, mine }) => [what, mine])).toEqual([[planWords.forPatient, false]]);
    expect(summary.abilities).toEqual(['summary.read', 'summary.write', 'summary.tell']);
  });

  it('goes from the liaison’s hand to the chair’s approval to the patient, with letters of number and link', async () => {
    const case_ = await concludedCase(running);
    const saved = await saveSummary(case_, { version: 0, body: 'You have an illness of the joints.' });
    expect(saved).toMatchObject({ state: 'draft', version: 1 });
    await letterTo(case_.chair);
    box.clear();
    const handed = await saveSummary(case_, { version: 1, body: saved.body, ready: true });
    expect(handed.state).toBe('waiting');
    const [asked] = await letterTo(case_.chair);
    expect(asked?.subject).toBe(`The summary of case ${case_.number} waits for your approval`);
    expect(asked?.text).not.toMatch(/joints/);
    const early = await case_.liaison.agent
      .post(`${summaryPath(case_)}/told`)
      .send(contactInput(running))
      .expect(409);
    expect(errorOf(early.body).id).toBe('wrong-state');
    const approved = await approveSummary(case_, handed.version);
    expect(approved).toMatchObject({ state: 'approved', approvedBy: case_.chair.name, body: saved.body });
    expect((await letterTo(case_.liaison)).at(-1)?.subject).toBe(
      `The summary of case ${case_.number} is approved and can be told`,
    );
    const { body } = await case_.liaison.agent
      .post(`${summaryPath(case_)}/told`)
      .send(contactInput(running))
      .expect(200);
    const told = summarySchema.parse(body);
    expect(told.state).toBe('told');
    expect(told.toldAt).not.toBeNull();
    expect(told.contacts).toMatchObject([
      {
        how: 'telephone',
        reached: true,
        told: true,
        understood: 'partly',
        questions: 'Can I travel?',
        by: case_.liaison.name,
      },
    ]);
    // What was told stays as it was; it can be told again.
    await case_.liaison.agent
      .put(summaryPath(case_))
      .send({ version: told.version, body: 'Changed' })
      .expect(409);
    await case_.liaison.agent
      .post(`${summaryPath(case_)}/told`)
      .send(contactInput(running, { how: 'meeting' }))
      .expect(200);
    expect((await readSummary(case_, case_.liaison)).toldAt).toBe(told.toldAt);
  });

  it('is approved in the version that the chair read; a change of an approved text needs approval again', async () => {
    const case_ = await concludedCase(running);
    const first = await saveSummary(case_, { version: 0, body: 'First', ready: true });
    const second = await saveSummary(case_, { version: first.version, body: 'Second' });
    expect(second.state).toBe('waiting');
    const stale = await case_.chair.agent
      .post(`${summaryPath(case_)}/approve`)
      .send({ version: first.version })
      .expect(409);
    expect(errorOf(stale.body).id).toBe('stale');
    expect(summarySchema.parse(errorOf(stale.body).current).body).toBe('Second');
    const approved = await approveSummary(case_, second.version);
    await case_.chair.agent
      .post(`${summaryPath(case_)}/approve`)
      .send({ version: approved.version })
      .expect(409);
    const third = await saveSummary(case_, { version: approved.version, body: 'Third' });
    expect(third).toMatchObject({ state: 'draft', approvedAt: null, approvedBy: null });
    await case_.liaison.agent
      .post(`${summaryPath(case_)}/told`)
      .send(contactInput(running))
      .expect(409);
  });

  it('comes back with the chair’s words, and they go when it is handed in again', async () => {
    const case_ = await concludedCase(running);
    const { version } = await saveSummary(case_, { version: 0, body: 'Text', ready: true });
    await case_.chair.agent
      .post(`${summaryPath(case_)}/return`)
      .send({ words: '' })
      .expect(400);
    await case_.chair.agent
      .post(`${summaryPath(case_)}/return`)
      .send({ words: 'Say more of the spleen.' })
      .expect(200);
    const returned = await readSummary(case_, case_.liaison);
    expect(returned).toMatchObject({
      state: 'draft',
      returnedWords: 'Say more of the spleen.',
      body: 'Text',
    });
    expect((await letterTo(case_.liaison)).at(-1)?.text).not.toMatch(/spleen/);
    await case_.liaison.agent.put(summaryPath(case_)).send({ version, body: 'Old' }).expect(409);
    const again = await saveSummary(case_, { version: returned.version, body: 'Longer', ready: true });
    expect(again).toMatchObject({ state: 'waiting', returnedWords: null });
  });

  it('refuses the second of two writers with the text as it stands, and an empty text for approval', async () => {
    const case_ = await concludedCase(running);
    const write = (body: string) => case_.liaison.agent.put(summaryPath(case_)).send({ version: 0, body });
    const responses = await Promise.all([write('One'), write('Two')]);
    expect(responses.map(({ status }) => status).sort()).toEqual([200, 409]);
    const won = summarySchema.parse(responses.find(({ status }) => status === 200)?.body);
    const lost = errorOf(responses.find(({ status }) => status === 409)?.body);
    expect([lost.id, summarySchema.parse(lost.current).body]).toEqual(['stale', won.body]);
    const empty = await case_.liaison.agent
      .put(summaryPath(case_))
      .send({ version: 1, body: '  ', ready: true })
      .expect(400);
    expect(errorOf(empty.body).fields?.map((fault) => fault.path)).toEqual(['body']);
  });

  it('is written, approved and told by the right part alone', async () => {
    const case_ = await concludedCase(running);
    const { version } = await saveSummary(case_, { version: 0, body: 'Text', ready: true });
    const stranger = await seat(running, ['liaison', 'chair']);
    const statuses = async (person: SeatedPerson) => [
      (await person.agent.get(summaryPath(case_))).status,
      (await person.agent.put(summaryPath(case_)).send({ version, body: 'X' })).status,
      (await person.agent.post(`${summaryPath(case_)}/approve`).send({ version })).status,
      (await person.agent.post(`${summaryPath(case_)}/return`).send({ words: 'X' })).status,
      (await person.agent.post(`${summaryPath(case_)}/told`).send(contactInput(running))).status,
      (await person.agent.post(`${summaryPath(case_)}/contacts`).send(contactInput(running))).status,
    ];
    expect(await statuses(case_.contributors[0]!)).toEqual([200, 403, 403, 403, 403, 403]);
    expect(await statuses(case_.referrer)).toEqual([200, 403, 403, 403, 403, 403]);
    expect(await statuses(stranger)).toEqual([404, 404, 404, 404, 404, 404]);
    await case_.chair.agent.put(summaryPath(case_)).send({ version, body: 'X' }).expect(403);
    await case_.liaison.agent
      .post(`${summaryPath(case_)}/approve`)
      .send({ version })
      .expect(403);
    await case_.liaison.agent
      .post(`${summaryPath(case_)}/contacts`)
      .send(contactInput(running))
      .expect(200);
    // How the patient was reached is no matter of the contributors.
    expect((await readSummary(case_, case_.contributors[0]!)).contacts).toEqual([]);
    expect((await readSummary(case_, case_.referrer)).contacts).toHaveLength(1);
  });
});
