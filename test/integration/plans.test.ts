import { type PlanView, planSchema, planViewSchema } from '@weighhouse/shared/contracts/plans';
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
import { askedCase, conclude, concludedCase, planWords, savePlan, wholePlan } from '../factories/plans.js';
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

type Person = JudgedCase['chair'];
const errorOf = (body: unknown) =>
  (body as { error: { id: string; fields?: { path: string }[]; current?: unknown } }).error;
const pathsOf = (body: unknown): string[] => errorOf(body).fields?.map(({ path }) => path) ?? [];

async function readPlan(case_: JudgedCase, person: Person): Promise<PlanView> {
  const { body } = await person.agent.get(`/api/cases/${case_.id}/plan`).expect(200);
  return planViewSchema.parse(body);
}

async function letters(): Promise<{ to: string[]; subject: string; text: string }[]> {
  await running.outbox.flush();
  await running.outbox.flush();
  return box.messages();
}

describe('the draft of a plan', () => {
  it('is written by the chair in parts, and names what concluding still needs', async () => {
    const case_ = await acceptedCase(running);
    const empty = {
      workingDiagnosis: '',
      candidateId: null,
      certainty: null,
      remainingDoubt: '',
      safetyNet: '',
      actions: [],
    };
    const draft = await savePlan(case_, empty);
    expect(draft).toMatchObject({ number: 1, version: 1, signedAt: null, askedAt: null });
    const view = await readPlan(case_, case_.chair);
    expect(view.missing.map(({ path }) => path)).toEqual([
      'workingDiagnosis',
      'certainty',
      'remainingDoubt',
      'actions',
      'safetyNet',
      'stances',
      'stances',
      'stances',
      'round',
    ]);
    expect(view.abilities).toEqual(['plan.read', 'plan.write', 'plan.ask']);
    const seen = await readPlan(case_, case_.contributors[0]!);
    expect(seen.draft?.id).toBe(draft.id);
    expect(seen.abilities).toEqual(['plan.read', 'plan.stance']);
  });

  it('keeps the actions that are named again, in their new order, and drops the others', async () => {
    const case_ = await acceptedCase(running);
    const first = await savePlan(case_);
    const [a, b] = first.actions;
    const input = wholePlan(case_, { version: first.version });
    const third = { what: 'Third', ownerId: case_.liaison.id, due: null, concernsPatient: true };
    const second = await savePlan(case_, {
      version: first.version,
      actions: [{ ...input.actions[1]!, id: b!.id }, third],
    });
    expect(second.version).toBe(2);
    expect(second.actions.map(({ id }) => id === b!.id)).toEqual([true, false]);
    expect(second.actions.map(({ what }) => what)).toEqual([planWords.forDoctors, 'Third']);
    expect(second.actions.some(({ id }) => id === a!.id)).toBe(false);
  });

  it('refuses the second of two writers with the draft as it stands', async () => {
    const case_ = await acceptedCase(running);
    const { version } = await savePlan(case_);
    const save = (workingDiagnosis: string) =>
      case_.chair.agent
        .put(`/api/cases/${case_.id}/plan`)
        .send(wholePlan(case_, { version, workingDiagnosis }));
    const responses = await Promise.all(['One', 'Two', 'Three'].map(save));
    expect(responses.map(({ status }) => status).sort()).toEqual([200, 409, 409]);
    const won = planViewSchema.parse(responses.find(({ status }) => status === 200)?.body).draft;
    for (const { body } of responses.filter(({ status }) => status === 409)) {
      expect(errorOf(body).id).toBe('stale');
      expect(planSchema.parse(errorOf(body).current).workingDiagnosis).toBe(won?.workingDiagnosis);
    }
  });

  it('names every reference that leads nowhere: another case’s candidate and action, somebody off the team', async () => {
    const case_ = await acceptedCase(running);
    const other = await acceptedCase(running);
    const { actions } = await savePlan(other);
    const stranger = await seat(running, 'specialist');
    const { body } = await case_.chair.agent
      .put(`/api/cases/${case_.id}/plan`)
      .send(
        wholePlan(case_, {
          candidateId: other.candidateIds[0]!,
          actions: [
            { id: actions[0]!.id, what: 'X', ownerId: stranger.id, due: null, concernsPatient: false },
          ],
        }),
      )
      .expect(400);
    expect(pathsOf(body)).toEqual(['candidateId', 'actions[0].id', 'actions[0].ownerId']);
    expect((await readPlan(other, other.chair)).draft?.actions).toHaveLength(2);
  });

  it.each<[string, object, string[]]>([
    ['a certainty that is none', { certainty: 'sure' }, ['certainty']],
    ['a version below 0', { version: -1 }, ['version']],
    [
      'an action without words, with a name for an owner and a date of another form',
      { actions: [{ what: ' ', ownerId: 'me', due: '31.12.2026' }] },
      ['actions[0].what', 'actions[0].ownerId', 'actions[0].due'],
    ],
    [
      'more actions than anybody does',
      { actions: Array.from({ length: 61 }, () => ({ what: 'x', ownerId: null, due: null })) },
      ['actions'],
    ],
    ['a text beyond its length', { safetyNet: 'x'.repeat(4001) }, ['safetyNet']],
  ])('refuses %s', async (_, change, paths) => {
    const case_ = await acceptedCase(running, { contributors: 2 });
    const { body } = await case_.chair.agent
      .put(`/api/cases/${case_.id}/plan`)
      .send({ ...wholePlan(case_), ...change })
      .expect(400);
    expect(pathsOf(body)).toEqual(paths);
  });

  it('is a matter of the team: others write nothing, the liaison sees nothing, strangers find nothing', async () => {
    const case_ = await acceptedCase(running);
    const path = `/api/cases/${case_.id}`;
    const stranger = await seat(running, ['chair', 'specialist']);
    const statuses = async (person: Person) => {
      const answers = [
        await person.agent.get(`${path}/plan`),
        await person.agent.put(`${path}/plan`).send(wholePlan(case_)),
        await person.agent.post(`${path}/plan/ask`),
        await person.agent.post(`${path}/conclude`).send({ password: testPassword }),
      ];
      return answers.map(({ status }) => status);
    };
    expect(await statuses(case_.contributors[0]!)).toEqual([200, 403, 403, 403]);
    expect(await statuses(case_.referrer)).toEqual([200, 403, 403, 403]);
    expect(await statuses(case_.liaison)).toEqual([403, 403, 403, 403]);
    expect(await statuses(stranger)).toEqual([404, 404, 404, 404]);
  });
});

describe('agreement and dissent', () => {
  it('is asked for by a letter with number and link alone, once the text is whole', async () => {
    const case_ = await unsealedCase(running);
    await savePlan(case_, { safetyNet: '' });
    const half = await case_.chair.agent.post(`/api/cases/${case_.id}/plan/ask`).expect(409);
    expect([errorOf(half.body).id, pathsOf(half.body)]).toEqual(['not-ready', ['safetyNet']]);
    await savePlan(case_, { version: 1 });
    // What was written before goes out first, so that only what follows is looked at.
    await letters();
    box.clear();
    await case_.chair.agent.post(`/api/cases/${case_.id}/plan/ask`).expect(200);
    const sent = (await letters()).filter(({ subject }) => subject.includes(case_.number));
    expect(sent.flatMap(({ to }) => to).sort()).toEqual(case_.contributors.map(({ email }) => email).sort());
    for (const { subject, text } of sent) {
      expect(subject).toBe(`You are asked whether you agree with the plan of case ${case_.number}`);
      expect(text).toContain(`http://localhost:4180/cases/${case_.id}/plan`);
      expect(text).not.toMatch(/Still|lymphoma|fever|blood/i);
    }
  });

  it('stands under the contributor’s name, the last word counts, and a change of the text marks it as older', async () => {
    const case_ = await askedCase(running);
    const [one, two, three] = case_.contributors as [Person, Person, Person];
    const path = `/api/cases/${case_.id}`;
    await one.agent.post(`${path}/dissent`).send({ words: 'Too early.' }).expect(200);
    await one.agent.post(`${path}/agree`).expect(200);
    await two.agent
      .post(`${path}/dissent`)
      .send({ words: '  The spleen must be looked at first. ' })
      .expect(200);
    await two.agent.post(`${path}/dissent`).send({ words: ' ' }).expect(400);
    const { draft } = await readPlan(case_, three);
    expect(draft?.stances.map(({ person, stance, words }) => [person.id, stance, words])).toEqual([
      [one.id, 'agree', null],
      [two.id, 'dissent', 'The spleen must be looked at first.'],
      [three.id, null, null],
    ]);
    // The same text again changes nothing; another text makes what was said older.
    const again = wholePlan(case_, { version: draft!.version });
    const withIds = again.actions.map((action, k) => ({ ...action, id: draft!.actions[k]!.id }));
    const same = await savePlan(case_, { version: draft!.version, actions: withIds });
    expect(same.stances.map(({ changedSince }) => changedSince)).toEqual([false, false, undefined]);
    running.clock.set(new Date(Date.now() + 60_000));
    const changed = await savePlan(case_, {
      version: same.version,
      actions: withIds,
      remainingDoubt: 'Another',
    });
    expect(changed.stances.map(({ changedSince }) => changedSince)).toEqual([true, true, undefined]);
    expect(changed.stances[1]?.words).toBe('The spleen must be looked at first.');
    // Asked again, only those are written to who said nothing of the text as it stands.
    await two.agent.post(`${path}/agree`).expect(200);
    await letters();
    box.clear();
    await case_.chair.agent.post(`${path}/plan/ask`).expect(200);
    expect((await letters()).flatMap(({ to }) => to).sort()).toEqual([one.email, three.email].sort());
  });

  it('is no matter of others, nor of a case without a plan', async () => {
    const case_ = await unsealedCase(running, { contributors: 3 });
    const path = `/api/cases/${case_.id}`;
    const early = await case_.contributors[0]!.agent.post(`${path}/agree`).expect(409);
    expect(errorOf(early.body).id).toBe('wrong-state');
    await savePlan(case_);
    const stranger = await seat(running, 'specialist');
    const statuses = [];
    for (const person of [case_.chair, case_.referrer, case_.liaison, stranger]) {
      statuses.push((await person.agent.post(`${path}/dissent`).send({ words: 'No.' })).status);
    }
    expect(statuses).toEqual([403, 403, 403, 404]);
  });
});

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
