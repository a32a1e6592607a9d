import { type Today, type TodayKind, todaySchema } from '@weighhouse/shared/contracts/today';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  handIn,
  judge,
  type JudgedCase,
  openRound,
  seat,
  type SeatedPerson,
  unseal,
  unsealedCase,
} from '../factories/judgements.js';
import { signedIn } from '../factories/people.js';
import { askedCase, conclude, concludedCase, planWords, savePlan, wholePlan } from '../factories/plans.js';
import { type RunningApp, startApp } from '../setup/app.js';

let running: RunningApp;

beforeAll(async () => {
  running = await startApp();
});
afterAll(() => running.close());
afterEach(() => {
  running.clock.reset();
});

async function today(person: SeatedPerson): Promise<Today> {
  const { body } = await person.agent.get('/api/today').expect(200);
  return todaySchema.parse(body);
}

const kinds = async (person: SeatedPerson): Promise<TodayKind[]> =>
  (await today(person)).waiting.map(({ kind }) => kind);
/** What waits of one case: a chair is also shown what others' tests have submitted. */
const waits = async (person: SeatedPerson, case_: JudgedCase) =>
  (await today(person)).waiting.filter(({ caseId }) => caseId === case_.id);

describe('what waits for a referrer and for the chairs', () => {
  it('is the own draft, then the answer to a returned case; for every chair what nobody has taken', async () => {
    const referrer = await seat(running, 'referrer');
    const chair = await seat(running, 'chair');
    const { body } = await referrer.agent.post('/api/cases').send({}).expect(201);
    const { id } = body as { id: string };
    expect((await today(referrer)).waiting).toMatchObject([
      { kind: 'draft', caseId: id, title: 'A referral without a question yet', path: `/cases/${id}/edit` },
    ]);
    const whole = {
      version: (body as { version: number }).version,
      question: 'Why is she tired?',
      age: 30,
      sex: 'female',
      urgency: 'withinWeek',
      consent: { given: true, how: 'spoken', givenOn: '2026-01-15' },
      historyHtml: '<p>Tired.</p>',
    };
    await referrer.agent.patch(`/api/cases/${id}`).send(whole).expect(200);
    await referrer.agent.post(`/api/cases/${id}/submit`).send({}).expect(200);
    expect(await kinds(referrer)).toEqual([]);
    const review = (await today(chair)).waiting.find(({ caseId }) => caseId === id);
    expect(review).toMatchObject({
      kind: 'review',
      title: 'Why is she tired?',
      detail: 'Submitted, no chair yet; an answer is wanted within a week',
    });
    const specialist = await seat(running, 'specialist');
    expect(await kinds(specialist)).toEqual([]);
    await chair.agent.post(`/api/cases/${id}/return`).send({ words: 'Since when?' }).expect(200);
    expect((await today(referrer)).waiting).toMatchObject([
      { kind: 'answer', detail: 'Returned with a question: Since when?', path: `/cases/${id}/edit` },
    ]);
    expect((await today(chair)).waiting.some(({ caseId }) => caseId === id)).toBe(false);
  });
});

describe('what waits in a round', () => {
  it('is to judge until one is in, and to unseal once the quorum is in', async () => {
    const case_ = await acceptedCase(running, { quorum: 2, ownPeople: true });
    const [one, two, three] = case_.contributors as [SeatedPerson, SeatedPerson, SeatedPerson];
    const deadline = new Date(running.clock.now().getTime() + 3_600_000).toISOString();
    const round = await openRound(case_, 'sealed', deadline);
    expect(await waits(one, case_)).toMatchObject([
      {
        kind: 'judge',
        sealedRows: 3,
        dueOn: deadline,
        late: false,
        detail: 'round 1 is sealed, 0 of 3 are in',
      },
    ]);
    await judge(case_, one, 0);
    // The rows that one has judged oneself, and nobody else's.
    expect(await waits(one, case_)).toMatchObject([{ sealedRows: 1 }]);
    expect(await waits(two, case_)).toMatchObject([{ sealedRows: 3 }]);
    await handIn(round, one);
    expect(await waits(one, case_)).toEqual([]);
    expect(await waits(case_.chair, case_)).toEqual([]);
    const sealed = await today(case_.chair);
    expect(sealed.cases).toMatchObject([{ leader: 'sealed', detail: 'round 1 is sealed, 1 of 3 are in' }]);
    expect(JSON.stringify(await today(case_.referrer))).not.toMatch(/31\.7|71\.3|Still|Lymphoma/);
    await judge(case_, two, 1);
    await handIn(round, two);
    expect(await waits(case_.chair, case_)).toMatchObject([
      { kind: 'unseal', detail: 'The quorum is in: round 1 is sealed, 2 of 3 are in' },
    ]);
    await unseal(case_, round);
    expect(await waits(three, case_)).toEqual([]);
    const open = await today(three);
    expect(open.cases[0]?.leader).toMatchObject({ name: expect.any(String), share: expect.any(Number) });
    await openRound(case_, 'live');
    expect(await waits(three, case_)).toMatchObject([{ kind: 'judge', sealedRows: null }]);
  });

  it('is to unseal when the deadline is past and two are in, and late for who is not', async () => {
    const case_ = await acceptedCase(running);
    const deadline = new Date(running.clock.now().getTime() + 60_000);
    const round = await openRound(case_, 'sealed', deadline.toISOString());
    for (const which of [0, 1] as const) {
      await judge(case_, case_.contributors[which]!, which);
      await handIn(round, case_.contributors[which]!);
    }
    expect(await waits(case_.chair, case_)).toEqual([]);
    running.clock.set(new Date(deadline.getTime() + 60_000));
    expect(await waits(case_.chair, case_)).toMatchObject([
      {
        kind: 'unseal',
        waitsSince: deadline.toISOString(),
        detail: expect.stringContaining('The deadline is past'),
      },
    ]);
    expect(await waits(case_.contributors[2]!, case_)).toMatchObject([{ kind: 'judge', late: true }]);
  });
});

describe('what waits after judging', () => {
  it('is a word on the plan, the summary and the telling, the approval, and actions', async () => {
    const case_ = await askedCase(running);
    const [one, two] = case_.contributors as [SeatedPerson, SeatedPerson];
    expect(await waits(one, case_)).toMatchObject([{ kind: 'stance', path: `/cases/${case_.id}/plan` }]);
    await one.agent.post(`/api/cases/${case_.id}/agree`).expect(200);
    expect(await waits(one, case_)).toEqual([]);
    await conclude(case_);
    expect(await waits(two, case_)).toEqual([]);
    expect(await waits(one, case_)).toMatchObject([
      { kind: 'act', title: planWords.forDoctors, dueOn: '2027-03-05', late: false },
    ]);
    running.clock.set(new Date('2027-03-06T12:00:00Z'));
    const late = await seatAgain(one);
    expect(await waits(late, case_)).toMatchObject([{ kind: 'act', late: true }]);
    running.clock.reset();
    expect(await waits(case_.liaison, case_)).toMatchObject([{ kind: 'tell', title: 'Write the summary' }]);
    const at = `/api/cases/${case_.id}/summary`;
    await case_.liaison.agent.put(at).send({ version: 0, body: 'Text', ready: true }).expect(200);
    expect(await waits(case_.liaison, case_)).toEqual([]);
    expect(await waits(case_.chair, case_)).toMatchObject([
      { kind: 'approve', path: `/cases/${case_.id}/summary` },
    ]);
    await case_.chair.agent.post(`${at}/approve`).send({ version: 1 }).expect(200);
    expect(await waits(case_.chair, case_)).toEqual([]);
    expect(await waits(case_.liaison, case_)).toMatchObject([
      { kind: 'tell', title: 'Tell the patient', path: `/tell/${case_.id}`, number: case_.number },
    ]);
  });

  it('says to a liaison no clinical word, not even of an action of their own', async () => {
    const case_ = await askedCase(running, { ownPeople: true });
    const own = {
      what: 'Ring about the spleen',
      ownerId: case_.liaison.id,
      due: '2027-01-01',
      concernsPatient: true,
    };
    await savePlan(case_, { version: 1, actions: [...wholePlan(case_).actions, own] });
    await conclude(case_);
    const page = await today(case_.liaison);
    expect(page.waiting.map(({ kind }) => kind).sort()).toEqual(['act', 'tell']);
    expect(page.cases).toEqual([]);
    expect(page.nextConference).toBeNull();
    expect(JSON.stringify(page)).not.toMatch(/spleen|Still|fever|illness|blood/i);
  });
});

describe('what waits of a withdrawn case', () => {
  it('is the action of its owner, without what the case was about', async () => {
    const closed = await concludedCase(running, { ownPeople: true });
    const [owner] = closed.contributors;
    if (!owner) throw new Error('the first contributor owns an action');
    expect(await waits(owner, closed)).toMatchObject([{ detail: expect.stringContaining('fever') }]);
    await closed.referrer.agent
      .post(`/api/cases/${closed.id}/withdraw`)
      .send({ words: 'Consent is withdrawn.' })
      .expect(200);
    expect(await waits(owner, closed)).toMatchObject([{ kind: 'act', detail: 'Your action' }]);
    expect(JSON.stringify(await today(owner))).not.toMatch(/fever/i);
  });
});

describe('the cases one sits on', () => {
  it('are those under way, with the next conference of them; closed ones are counted', async () => {
    const case_ = await unsealedCase(running, { ownPeople: true });
    const at = new Date(running.clock.now().getTime() + 86_400_000).toISOString();
    await case_.chair.agent
      .patch(`/api/cases/${case_.id}/settings`)
      .send({ conferenceAt: at, reason: 'A date was found.' })
      .expect(200);
    const page = await today(case_.contributors[0]!);
    expect(page.cases).toMatchObject([
      { id: case_.id, number: case_.number, detail: 'round 1 is over', conferenceAt: at },
    ]);
    expect(page.nextConference).toMatchObject({ at, cases: [{ id: case_.id, number: case_.number }] });
    const closed = await concludedCase(running, { ownPeople: true });
    const after = await today(closed.chair);
    expect(after.cases).toEqual([]);
    expect(after.closedThisMonth).toBe(1);
  });

  it('are listed oldest first in what waits, and are gone when withdrawn', async () => {
    const referrer = await seat(running, 'referrer');
    const open = async () => {
      const { body } = await referrer.agent.post('/api/cases').send({ question: 'Q' }).expect(201);
      return (body as { id: string }).id;
    };
    const first = await open();
    running.clock.set(new Date(Date.now() + 60_000));
    const second = await open();
    expect((await today(referrer)).waiting.map(({ caseId }) => caseId)).toEqual([first, second]);
    await referrer.agent.post(`/api/cases/${first}/withdraw`).send({ words: 'No.' }).expect(200);
    expect((await today(referrer)).waiting.map(({ caseId }) => caseId)).toEqual([second]);
  });
});

/** Signs in once more, because a session does not outlast months. */
async function seatAgain(person: SeatedPerson): Promise<SeatedPerson> {
  return { ...person, agent: await signedIn(running, person) };
}
