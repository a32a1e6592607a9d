import { planSchema, planViewSchema } from '@weighhouse/shared/contracts/plans';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { acceptedCase, type JudgedCase, seat, unsealedCase } from '../factories/judgements.js';
import { testPassword } from '../factories/people.js';
import { askedCase, planWords, readPlan, savePlan, wholePlan } from '../factories/plans.js';
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
