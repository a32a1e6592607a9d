import { AuditEntry } from '@weighhouse/server/platform/audit-log/audit-entry.entity';
import { identitySchema } from '@weighhouse/shared/contracts/summaries';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { acceptedCase, type JudgedCase, seat, type SeatedPerson } from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { errorOf } from '../setup/refusals.js';

let running: RunningApp;
let case_: JudgedCase;

const card = {
  name: 'Rosalind Quickwater',
  birthDate: '1985-04-12',
  telephone: '+353 1 555 0100',
  language: 'Irish, some English',
  howToReach: 'In the evening; her daughter helps on the telephone.',
};

beforeAll(async () => {
  running = await startApp();
  case_ = await acceptedCase(running, { contributors: 2 });
});
afterAll(() => running.close());

const path = (of: JudgedCase = case_): string => `/api/cases/${of.id}/identity`;
const read = async (person: SeatedPerson, of?: JudgedCase) => {
  const { body } = await person.agent.get(path(of)).expect(200);
  return identitySchema.parse(body);
};
const openings = (of: JudgedCase): Promise<AuditEntry[]> =>
  running.source.manager.findBy(AuditEntry, { caseId: of.id, action: 'identity.opened' });

describe('the identity card', () => {
  it('is empty at first, which is no opening; the referrer writes it, the liaison reads it', async () => {
    expect(await read(case_.referrer)).toEqual({
      version: 0,
      card: null,
      abilities: ['identity.read', 'identity.write'],
    });
    expect(await openings(case_)).toHaveLength(0);
    await case_.referrer.agent
      .put(path())
      .send({ version: 0, ...card })
      .expect(200);
    expect(await read(case_.liaison)).toMatchObject({ version: 1, card });
    expect((await openings(case_)).map(({ actorId, sentence }) => [actorId, sentence])).toEqual([
      [case_.liaison.id, 'opened the identity card'],
    ]);
  });

  it('is closed to everybody else on the case, and to strangers of every role it does not exist', async () => {
    const admin = await seat(running, ['administrator', 'chair', 'liaison', 'referrer']);
    const other = await acceptedCase(running, { contributors: 2, ownPeople: true });
    const before = await openings(case_);
    const refusals = () =>
      running.source.manager.findBy(AuditEntry, { caseId: case_.id, action: 'identity.refused' });
    for (const person of [case_.chair, ...case_.contributors]) {
      await person.agent.get(path()).expect(403);
      await person.agent
        .put(path())
        .send({ version: 1, ...card })
        .expect(403);
    }
    for (const person of [admin, other.liaison, other.referrer, other.chair]) {
      await person.agent.get(path()).expect(404);
      await person.agent
        .put(path())
        .send({ version: 1, ...card })
        .expect(404);
    }
    expect(await openings(case_)).toHaveLength(before.length);
    // That somebody of the case asked stands in the trail, once an hour however often they ask.
    await case_.chair.agent.get(path()).expect(403);
    expect((await refusals()).map(({ actorId }) => actorId)).toEqual(
      [case_.chair, ...case_.contributors].map(({ id }) => id),
    );
  });

  it('is unreadable in the database, and does not open when it is moved to another case', async () => {
    const other = await acceptedCase(running, { contributors: 2 });
    const rows = await running.source.query<{ box: Buffer }[]>(
      'SELECT * FROM identity_card WHERE caseId = ?',
      [case_.id],
    );
    const everything = JSON.stringify(rows) + (rows[0]?.box.toString('latin1') ?? '');
    for (const word of ['Rosalind', '1985', '555', 'Irish', 'daughter'])
      expect(everything).not.toContain(word);
    await running.source.query(
      'INSERT INTO identity_card (caseId, version, box, changedAt, changedById) SELECT ?, version, box, changedAt, changedById FROM identity_card WHERE caseId = ?',
      [other.id, case_.id],
    );
    const { body } = await other.liaison.agent.get(path(other)).expect(500);
    expect(JSON.stringify(body)).not.toMatch(/Rosalind|decrypt|authenticate/);
    expect(await openings(other)).toHaveLength(0);
  });

  it('refuses the second of two writers with the card that is there, which is written down as an opening', async () => {
    const fresh = await acceptedCase(running, { contributors: 2 });
    const write = (name: string) => fresh.referrer.agent.put(path(fresh)).send({ version: 0, ...card, name });
    const responses = await Promise.all([write('One'), write('Two')]);
    expect(responses.map(({ status }) => status).sort()).toEqual([200, 409]);
    const won = identitySchema.parse(responses.find(({ status }) => status === 200)?.body);
    const lost = errorOf(responses.find(({ status }) => status === 409)?.body);
    expect(lost.id).toBe('stale');
    expect(identitySchema.parse(lost.current).card?.name).toBe(won.card?.name);
    expect(await openings(fresh)).toHaveLength(1);
    await fresh.liaison.agent
      .put(path(fresh))
      .send({ version: 1, ...card, telephone: '' })
      .expect(200);
    await fresh.referrer.agent
      .put(path(fresh))
      .send({ version: 1, ...card })
      .expect(409);
    expect((await read(fresh.referrer, fresh)).card?.telephone).toBe('');
  });

  it('names every fault, a birth date in the future among them', async () => {
    const wrong = { version: 'x', name: ' ', birthDate: '12.4.1985', telephone: '1'.repeat(41), language: 3 };
    const { body } = await case_.referrer.agent.put(path()).send(wrong).expect(400);
    expect(errorOf(body).fields?.map((fault) => fault.path)).toEqual([
      'version',
      'name',
      'birthDate',
      'telephone',
      'language',
      'howToReach',
    ]);
    const unborn = await case_.referrer.agent
      .put(path())
      .send({ version: 1, ...card, birthDate: '2999-01-01' })
      .expect(400);
    expect(errorOf(unborn.body).fields?.map((fault) => fault.path)).toEqual(['birthDate']);
  });

  it('appears in no other answer of the case, and in no line of the trail', async () => {
    const answers = [];
    for (const person of [case_.referrer, case_.chair, case_.liaison, case_.contributors[0]!]) {
      for (const what of ['', '/team', '/trail', '/summary', '/differential', '/plan', '/findings']) {
        answers.push((await person.agent.get(`/api/cases/${case_.id}${what}`)).body as unknown);
      }
      answers.push((await person.agent.get('/api/cases')).body, (await person.agent.get('/api/today')).body);
    }
    expect(JSON.stringify(answers)).not.toMatch(/Rosalind|1985-04-12|555 0100/);
    const lines = await running.source.manager.findBy(AuditEntry, { caseId: case_.id });
    expect(JSON.stringify(lines)).not.toMatch(/Rosalind|1985|555/);
  });
});

describe('the identity card of a withdrawn case', () => {
  it('stays open to the referrer alone, and is not written any more', async () => {
    const fresh = await acceptedCase(running, { contributors: 2 });
    await fresh.referrer.agent
      .put(path(fresh))
      .send({ version: 0, ...card })
      .expect(200);
    await fresh.referrer.agent
      .post(`/api/cases/${fresh.id}/withdraw`)
      .send({ words: 'Consent withdrawn.' })
      .expect(200);
    expect((await read(fresh.referrer, fresh)).abilities).toEqual(['identity.read']);
    await fresh.liaison.agent.get(path(fresh)).expect(403);
    await fresh.referrer.agent
      .put(path(fresh))
      .send({ version: 1, ...card })
      .expect(409);
  });
});
