import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Round } from '@weighhouse/shared/contracts/rounds';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { acceptedCase, handIn, judge, openRound, readDifferential, unseal } from '../factories/judgements.js';
import { makePerson, testPassword } from '../factories/people.js';
import { type RunningApp, startApp } from '../setup/app.js';

let running: RunningApp;
beforeAll(async () => {
  running = await startApp();
});
afterAll(() => running.close());

/** The database takes small and capital letters, and letters with and without marks, for the same. */
describe('an identifier written in capitals', () => {
  it('hands in for the very round: who is in is seen, and at unsealing so are their numbers', async () => {
    const case_ = await acceptedCase(running, { quorum: 2, ownPeople: true });
    const [ann, ben, cleo] = case_.contributors;
    if (!ann || !ben || !cleo) throw new Error('three contributors are needed');
    const round = await openRound(case_, 'sealed');
    await judge(case_, ann, 0);
    await judge(case_, ben, 1);
    await handIn(round, ann);
    await handIn({ ...round, id: round.id.toUpperCase() }, ben);
    const rounds = (await case_.chair.agent.get(`/api/cases/${case_.id}/rounds`).expect(200)).body as {
      items: Round[];
    };
    const inNow = rounds.items[0]?.members.filter(({ digest }) => digest !== null);
    expect(inNow?.map(({ person }) => person.id)).toEqual([ann.id, ben.id]);
    await unseal(case_, round);
    const seen: Differential = await readDifferential(case_, cleo);
    expect(seen.others?.map(({ personId }) => personId).sort()).toEqual([ann.id, ben.id].sort());
  });

  it('writes the identity card of the very case, which opens afterwards', async () => {
    const case_ = await acceptedCase(running);
    const card = { name: 'Rosalind', birthDate: '1985-04-12', telephone: '', language: '', howToReach: '' };
    await case_.referrer.agent
      .put(`/api/cases/${case_.id.toUpperCase()}/identity`)
      .send({ version: 0, ...card })
      .expect(200);
    const { body } = await case_.liaison.agent.get(`/api/cases/${case_.id}/identity`).expect(200);
    expect(body).toMatchObject({ version: 1, card });
  });
});

describe('an e-mail in another spelling', () => {
  it.each([
    ['a mark on a letter', 'hunted@', 'hünted@'],
    ['a sign that nobody sees', 'hunted@', 'hun\u200bted@'],
    ['a wide letter', 'hunted@', 'ｈunted@'],
  ])('lets nobody in, so that guesses are not counted apart: %s', async (_, plain, other) => {
    const email = `${plain}${String(Math.random()).slice(2)}.example`;
    await makePerson(running, 'specialist', { email });
    const attempt = (address: string) =>
      running.agent().post('/api/session').send({ email: address, password: testPassword });
    await attempt(email.replace(plain, other)).expect(401);
    await attempt(email).expect(200);
  });
});
