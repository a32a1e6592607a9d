import type { Round } from '@weighhouse/shared/contracts/rounds';
import type { RunningApp } from '../setup/app.js';
import {
  acceptedCase,
  handIn,
  type JudgedCase,
  openRound,
  savePrior,
  saveRow,
  type SeatedPerson,
} from './judgements.js';

/** Ten candidates, of which two share nearly everything: many columns are small. */
const names = Array.from({ length: 10 }, (_, index) => `Illness ${String(index + 1)}`);

const findings = [
  { title: 'Fever every evening', observed: 1, kind: 'symptom' },
  { title: 'Rash', observed: 0, kind: 'sign' },
  {
    title: 'Node biopsy',
    observed: null,
    kind: 'test',
    levelLabels: ['Lymphoma', 'Granulomas', 'Reactive'],
    cost: 900,
    waitDays: 5,
    burden: 2,
  },
  { title: 'Serology', observed: null, kind: 'laboratory', cost: 50, waitDays: 2, burden: 0 },
  { title: 'PET-CT', observed: null, kind: 'imaging', cost: 1300 },
];

/** The columns one by one: the first, the second, and what all the others have. */
const spread = <T>(first: T, second: T, rest: T): T[] => [
  first,
  second,
  ...Array.from({ length: 9 }, () => rest),
];

/** A biopsy that tells the first two apart, a serology that tells nothing, a PET-CT that nobody judged. */
export async function pendingCase(running: RunningApp): Promise<JudgedCase & { round: Round }> {
  const case_ = await acceptedCase(running, { contributors: 2, quorum: 2, candidates: names, findings });
  const round = await openRound(case_, 'sealed');
  const [first, second] = case_.contributors;
  if (!first || !second) throw new Error('two contributors judge');
  await judgePending(case_, first, 30);
  await judgePending(case_, second, 70);
  return { ...case_, round };
}

/** @param fever of 100 with the first illness, how many would show it: where the two are apart */
async function judgePending(case_: JudgedCase, person: SeatedPerson, fever: number): Promise<void> {
  await savePrior(case_, person, spread(45, 46, 1));
  await saveRow(case_, person, 0, spread(fever, 50, 20));
  await saveRow(case_, person, 1, spread(20, 20, 30));
  await saveRow(case_, person, 2, spread([5, 5, 90], [90, 5, 5], [10, 80, 10]));
  await saveRow(case_, person, 3, spread(40, 40, 40));
}

/** Both hand in, the chair unseals and opens a live round. */
export async function openPendingCase(case_: JudgedCase & { round: Round }): Promise<void> {
  for (const person of case_.contributors) await handIn(case_.round, person);
  await case_.chair.agent.post(`/api/rounds/${case_.round.id}/unseal`).send({}).expect(200);
  await openRound(case_, 'live');
}
