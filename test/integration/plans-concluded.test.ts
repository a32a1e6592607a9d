import type { Case } from '@weighhouse/shared/contracts/cases';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  type JudgedCase,
  judge,
  openRound,
  seat,
  unsealedCase,
} from '../factories/judgements.js';
import { testPassword } from '../factories/people.js';
import {
  askedCase,
  conclude,
  concludedCase,
  planWords,
  readPlan,
  savePlan,
  wholePlan,
} from '../factories/plans.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { lettersSent, mailbox } from '../setup/mailbox.js';
import { errorOf, pathsOf } from '../setup/refusals.js';

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

type Person = JudgedCase['chair'];

const letters = () => lettersSent(running, box);

describe('concluding', () => {
  it('asks for the password again, signs, closes the live round and keeps where the panel stood', async () => {
    const case_ = await askedCase(running);
    const live = await openRound(case_, 'live');
    await judge(case_, case_.contributors[0]!, 0);
    const path = `/api/cases/${case_.id}`;
    const wrong = await case_.chair.agent.post(`${path}/conclude`).send({ password: 'no' }).expect(403);
    expect(errorOf(wrong.body).id).toBe('wrong-password');
    await case_.contributors[1]!.agent.post(`${path}/dissent`).send({ words: 'I would wait.' }).expect(200);
    const differential = await case_.chair.agent.get(`${path}/differential`).expect(200);
    await letters();
    box.clear();
    const view = await conclude(case_);
    expect(view.draft).toBeNull();
    const [plan] = view.signed;
    expect(plan).toMatchObject({
      number: 1,
      signedBy: { id: case_.chair.id },
      workingDiagnosis: planWords.workingDiagnosis,
    });
    expect(plan?.standing?.map(({ name }) => name)).toEqual(['Still’s disease', 'Lymphoma', 'none of these']);
    const { assessment } = differential.body as { assessment: { standing: number[]; method: string } };
    expect(plan?.standing?.map(({ share }) => share)).toEqual(assessment.standing);
    expect(plan?.method).toBe(assessment.method);
    expect(plan?.stances.find(({ stance }) => stance === 'dissent')?.words).toBe('I would wait.');
    expect(plan?.stances).toHaveLength(3);
    const { body } = await case_.chair.agent.get(path).expect(200);
    expect(body).toMatchObject({ state: 'concluded', round: { number: 2, open: false } });
    await case_.chair.agent.post(`/api/rounds/${live.id}/close`).expect(409);
    const sent = await letters();
    expect(sent.map(({ to }) => to.join()).sort()).toEqual(
      [case_.liaison.email, case_.contributors[0]!.email, case_.referrer.email].sort(),
    );
    const toLiaison = sent.find(({ to }) => to.includes(case_.liaison.email));
    expect(toLiaison?.text).toContain(`http://localhost:4180/tell/${case_.id}`);
    expect(JSON.stringify(sent)).not.toMatch(/Still|lymphoma|blood|marrow|breath/i);
  });

  it('names everything that is missing at once', async () => {
    const case_ = await unsealedCase(running, { contributors: 3 });
    const path = `/api/cases/${case_.id}/conclude`;
    const bare = await case_.chair.agent.post(path).send({ password: testPassword }).expect(409);
    expect([errorOf(bare.body).id, pathsOf(bare.body)]).toEqual([
      'not-ready',
      ['plan', 'stances', 'stances', 'stances'],
    ]);
    const open = { what: 'X', ownerId: null, due: null, concernsPatient: false };
    await savePlan(case_, { certainty: null, actions: [open] });
    await case_.contributors[2]!.agent.post(`/api/cases/${case_.id}/agree`).expect(200);
    const half = await case_.chair.agent.post(path).send({ password: testPassword }).expect(409);
    expect(pathsOf(half.body)).toEqual([
      'certainty',
      'actions[0].ownerId',
      'actions[0].due',
      'stances',
      'stances',
    ]);
    expect(errorOf((await case_.chair.agent.post(path).send({}).expect(400)).body).id).toBe('invalid');
  });

  it('waits for an open sealed round, and for a first one to be unsealed', async () => {
    const early = await acceptedCase(running);
    await savePlan(early);
    const path = `/api/cases/${early.id}/conclude`;
    expect(
      errorOf((await early.chair.agent.post(path).send({ password: testPassword }).expect(409)).body).id,
    ).toBe('wrong-state');
    const round = await openRound(early, 'sealed');
    const sealed = await early.chair.agent.post(path).send({ password: testPassword }).expect(409);
    expect(errorOf(sealed.body).id).toBe('round-open');
    await early.chair.agent.post(`/api/rounds/${round.id}/close`).expect(200);
    await early.chair.agent.post(`/api/cases/${early.id}/plan/ask`).expect(200);
    const closed = await early.chair.agent.post(path).send({ password: testPassword }).expect(409);
    expect(pathsOf(closed.body)).toEqual(['round']);
  });

  it('happens once when asked twice at once', async () => {
    const case_ = await askedCase(running);
    const sign = () =>
      case_.chair.agent.post(`/api/cases/${case_.id}/conclude`).send({ password: testPassword });
    const responses = await Promise.all([sign(), sign(), sign()]);
    expect(responses.map(({ status }) => status).sort()).toEqual([200, 409, 409]);
    const { signed } = await readPlan(case_, case_.chair);
    expect(signed).toHaveLength(1);
  });

  it('leaves a plan that nobody changes: neither by a route nor after reopening, which leads to plan 2', async () => {
    const case_ = await concludedCase(running);
    const path = `/api/cases/${case_.id}`;
    const before = (await readPlan(case_, case_.chair)).signed;
    const refused = [
      await case_.chair.agent.put(`${path}/plan`).send(wholePlan(case_, { version: 1 })),
      await case_.chair.agent.post(`${path}/plan/ask`),
      await case_.contributors[0]!.agent.post(`${path}/dissent`).send({ words: 'Late.' }),
      await case_.chair.agent.post(`${path}/conclude`).send({ password: testPassword }),
    ];
    expect(refused.map(({ status }) => status)).toEqual([409, 409, 409, 409]);
    await case_.chair.agent.post(`${path}/reopen`).send({ words: 'The biopsy is back.' }).expect(200);
    const reopened = (await case_.contributors[0]!.agent.get(path).expect(200)).body as Case;
    expect(reopened).toMatchObject({
      state: 'judging',
      words: { move: 'reopened', text: 'The biopsy is back.' },
    });
    const stolen = await case_.chair.agent
      .put(`${path}/plan`)
      .send(
        wholePlan(case_, {
          actions: [
            {
              id: before[0]!.actions[0]!.id,
              what: 'Changed',
              ownerId: null,
              due: null,
              concernsPatient: false,
            },
          ],
        }),
      )
      .expect(400);
    expect(pathsOf(stolen.body)).toEqual(['actions[0].id']);
    const draft = await savePlan(case_, { workingDiagnosis: 'Lymphoma after all' });
    expect(draft).toMatchObject({
      number: 2,
      version: 1,
      stances: [{ stance: null }, { stance: null }, { stance: null }],
    });
    await case_.chair.agent.post(`${path}/plan/ask`).expect(200);
    const { signed } = await conclude(case_);
    expect(signed.map(({ number }) => number)).toEqual([1, 2]);
    expect(signed[0]).toEqual(before[0]);
  });

  it('stands in the trail, without a word of the plan', async () => {
    const case_ = await concludedCase(running);
    const rows = await running.source.query<{ action: string; sentence: string }[]>(
      'SELECT action, sentence FROM audit_entry WHERE caseId = ? ORDER BY id',
      [case_.id],
    );
    const lines = rows
      .filter(({ action }) => /^(plan|case\.concluded)/.test(action))
      .map(({ sentence }) => sentence);
    expect(lines).toEqual([
      'began the plan',
      'asked 3 contributors for agreement or dissent',
      'signed plan 1 and closed the case with it',
    ]);
    expect(JSON.stringify(rows)).not.toMatch(/Adult-onset|spleen|marrow|breathless/i);
  });
});

describe('an action', () => {
  const done = (person: Person, id: string) =>
    person.agent.post(`/api/actions/${id}/done`).send({ words: 'Ferritin is down.' });

  it('is reported by its owner, once', async () => {
    const case_ = await concludedCase(running);
    const [plan] = (await readPlan(case_, case_.chair)).signed;
    const [first, second] = plan!.actions;
    const stranger = await seat(running, 'specialist');
    expect((await done(stranger, first!.id)).status).toBe(404);
    expect((await done(case_.chair, first!.id)).status).toBe(403);
    expect((await done(case_.liaison, first!.id)).status).toBe(403);
    expect((await done(case_.referrer, '00000000-0000-4000-8000-000000000000')).status).toBe(404);
    await case_.referrer.agent.post(`/api/actions/${first!.id}/done`).send({ words: '' }).expect(400);
    const responses = await Promise.all([done(case_.referrer, first!.id), done(case_.referrer, first!.id)]);
    expect(responses.map(({ status }) => status).sort()).toEqual([200, 409]);
    const [after] = (await readPlan(case_, case_.contributors[0]!)).signed;
    expect(after?.actions[0]).toMatchObject({ doneWords: 'Ferritin is down.' });
    expect(after?.actions[0]?.doneAt).not.toBeNull();
    expect(after?.actions[1]).toEqual(second);
  });

  it('of a draft cannot be done yet', async () => {
    const case_ = await askedCase(running);
    const { draft } = await readPlan(case_, case_.chair);
    expect((await done(case_.referrer, draft!.actions[0]!.id)).status).toBe(409);
  });

  it('stays its owner’s when the case is withdrawn or the owner has left the team; a liaison sees no plan by it', async () => {
    const case_ = await askedCase(running);
    const { draft } = await readPlan(case_, case_.chair);
    const own = {
      what: 'Call the patient',
      ownerId: case_.liaison.id,
      due: '2027-01-01',
      concernsPatient: true,
    };
    await savePlan(case_, { version: draft!.version, actions: [...wholePlan(case_).actions, own] });
    const { signed } = await conclude(case_);
    const [, ofContributor, ofLiaison] = signed[0]!.actions;
    const byLiaison = await done(case_.liaison, ofLiaison!.id).expect(200);
    expect(byLiaison.body).toEqual({ draft: null, signed: [], missing: [], abilities: [] });
    await case_.referrer.agent
      .post(`/api/cases/${case_.id}/withdraw`)
      .send({ words: 'Consent is withdrawn.' })
      .expect(200);
    const byContributor = await done(case_.contributors[0]!, ofContributor!.id).expect(200);
    expect(byContributor.body).toEqual({ draft: null, signed: [], missing: [], abilities: [] });
  });
});
