import type { Case, Part } from '@weighhouse/shared/contracts/cases';
import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import type { Round } from '@weighhouse/shared/contracts/rounds';
import type { Role } from '@weighhouse/shared/contracts/people';
import type { RunningApp } from '../setup/app.js';
import { type Agent, makePerson, signedIn, type TestPerson } from './people.js';

/** Somebody of the tests with a browser in which they are signed in. */
export interface SeatedPerson extends TestPerson {
  agent: Agent;
}

/** A case that has been accepted, with its team, its candidates and findings. */
export interface JudgedCase {
  id: string;
  number: string;
  referrer: SeatedPerson;
  chair: SeatedPerson;
  /** Contributors, in the order of the team. */
  contributors: SeatedPerson[];
  liaison: SeatedPerson;
  candidateIds: string[];
  findings: Finding[];
}

export interface CaseWishes {
  contributors?: number;
  quorum?: number;
  candidates?: string[];
  findings?: Record<string, unknown>[];
  weights?: number[];
  /** People of this case alone; otherwise the cases of a test file share theirs. */
  ownPeople?: boolean;
}

interface Cast {
  referrer: SeatedPerson;
  chair: SeatedPerson;
  liaison: SeatedPerson;
  specialists: SeatedPerson[];
}

const threeFindings = [
  { title: 'Fever every evening', observed: 1 },
  { title: 'Rash', observed: 0 },
  { title: 'Ferritin', observed: null, levelLabels: ['normal', 'raised', 'above five times'] },
];

/** Invites somebody with a role and signs them in. */
export async function seat(running: RunningApp, role: Role | Role[]): Promise<SeatedPerson> {
  const person = await makePerson(running, role);
  return { ...person, agent: await signedIn(running, person) };
}

const casts = new WeakMap<RunningApp, Promise<Cast>>();

/** Signing in is slow on purpose, so the cases of one running application share their people; made in `beforeAll`. */
export function castOf(running: RunningApp): Promise<Cast> {
  const known = casts.get(running) ?? makeCast(running);
  casts.set(running, known);
  return known;
}

async function makeCast(running: RunningApp): Promise<Cast> {
  const [referrer, chair, liaison, ...specialists] = await Promise.all([
    seat(running, 'referrer'),
    seat(running, 'chair'),
    seat(running, 'liaison'),
    ...[1, 2, 3, 4].map(() => seat(running, 'specialist')),
  ]);
  return { referrer, chair, liaison, specialists };
}

/** Plays a case through the API from the draft to the accepted one, ready for its first round. */
export async function acceptedCase(running: RunningApp, wishes: CaseWishes = {}): Promise<JudgedCase> {
  const cast = wishes.ownPeople === true ? await makeCast(running) : await castOf(running);
  const { referrer, chair, liaison } = cast;
  const wanted = wishes.contributors ?? 3;
  while (cast.specialists.length < wanted) cast.specialists.push(await seat(running, 'specialist'));
  const contributors = cast.specialists.slice(0, wanted);

  const opened = await referrer.agent
    .post('/api/cases')
    .send({
      question: 'Which illness explains the fever?',
      age: 41,
      sex: 'female',
      urgency: 'withinMonth',
      consent: { given: true, how: 'signed', givenOn: '2026-01-15' },
      historyHtml: '<p>Fever every evening for four months.</p>',
    })
    .expect(201);
  const { id, number } = opened.body as Case;
  await referrer.agent.post(`/api/cases/${id}/submit`).send({}).expect(200);
  await chair.agent
    .post(`/api/cases/${id}/accept`)
    .send({
      team: teamOf({ referrer, chair, liaison, contributors }, wishes.weights),
      conferenceAt: null,
      ...(wishes.quorum === undefined ? {} : { quorum: wishes.quorum }),
    })
    .expect(200);

  const candidateIds: string[] = [];
  for (const name of wishes.candidates ?? ['Still’s disease', 'Lymphoma']) {
    const added = await chair.agent.post(`/api/cases/${id}/candidates`).send({ name }).expect(201);
    candidateIds.push((added.body as { id: string }).id);
  }
  const findings: Finding[] = [];
  for (const finding of wishes.findings ?? threeFindings) {
    const added = await chair.agent.post(`/api/cases/${id}/findings`).send(finding).expect(201);
    findings.push(added.body as Finding);
  }
  return { id, number, referrer, chair, liaison, contributors, candidateIds, findings };
}

/** The team as PUT team and accept take it. */
export function teamOf(
  people: {
    referrer: { id: string };
    chair: { id: string };
    liaison: { id: string };
    contributors: { id: string }[];
  },
  weights: number[] = [],
): { personId: string; part: Part; weight?: number; reason?: string }[] {
  return [
    { personId: people.referrer.id, part: 'referrer' },
    { personId: people.chair.id, part: 'chair' },
    { personId: people.liaison.id, part: 'liaison' },
    ...people.contributors.map(({ id: personId }, k) => {
      const weight = weights[k];
      return weight === undefined
        ? { personId, part: 'contributor' as const }
        : { personId, part: 'contributor' as const, weight, reason: 'sees such patients every week' };
    }),
  ];
}

export async function openRound(
  case_: JudgedCase,
  kind: 'sealed' | 'live',
  deadline: string | null = null,
): Promise<Round> {
  const answer = await case_.chair.agent
    .post(`/api/cases/${case_.id}/rounds`)
    .send({ kind, deadline })
    .expect(201);
  return answer.body as Round;
}

/** Any body for a prior: the shares, over the candidate set that the case has now. */
export async function savePrior(
  case_: JudgedCase,
  person: SeatedPerson,
  outOf100: number[],
  more: Record<string, unknown> = {},
): Promise<number> {
  const { candidateSet } = await readDifferential(case_, person);
  const answer = await person.agent
    .put(`/api/cases/${case_.id}/judgement/prior`)
    .send({ candidateSet, outOf100, ...more })
    .expect(200);
  return (answer.body as { version: number }).version;
}

export async function saveRow(
  case_: JudgedCase,
  person: SeatedPerson,
  finding: number,
  outOf100: unknown[],
  more: Record<string, unknown> = {},
): Promise<number> {
  const { candidateSet } = await readDifferential(case_, person);
  const id = case_.findings[finding]?.id ?? '';
  const answer = await person.agent
    .put(`/api/cases/${case_.id}/judgement/findings/${id}`)
    .send({ candidateSet, exposure: 'often', outOf100, ...more })
    .expect(200);
  return (answer.body as { version: number }).version;
}

export async function handIn(
  round: Round,
  person: SeatedPerson,
  body: Record<string, unknown> = {},
): Promise<string> {
  const answer = await person.agent.post(`/api/rounds/${round.id}/hand-in`).send(body).expect(200);
  return (answer.body as { digest: string }).digest;
}

export async function unseal(case_: JudgedCase, round: Round, reason?: string): Promise<Round> {
  const answer = await case_.chair.agent
    .post(`/api/rounds/${round.id}/unseal`)
    .send(reason === undefined ? {} : { reason })
    .expect(200);
  return answer.body as Round;
}

export async function readDifferential(case_: JudgedCase, person: SeatedPerson): Promise<Differential> {
  const answer = await person.agent.get(`/api/cases/${case_.id}/differential`).expect(200);
  return answer.body as Differential;
}

/** Priors and rows that no two people share, so that a number tells whose it is. */
export const judgements = [
  { prior: [31.7, 23.6, 44.7], fever: [71.3, 48.9, 11.9], rash: [68.7, 9.3, 21.1] },
  { prior: [52.9, 17.4, 29.7], fever: [83.1, 37.7, 14.3], rash: [57.9, 12.7, 18.3] },
  { prior: [12.1, 61.3, 26.6], fever: [44.3, 77.9, 23.9], rash: [33.7, 27.1, 16.9] },
] as const;

/** Saves the prior and the first two rows of one of `judgements`. */
export async function judge(case_: JudgedCase, person: SeatedPerson, which: 0 | 1 | 2): Promise<void> {
  const { prior, fever, rash } = judgements[which];
  await savePrior(case_, person, [...prior]);
  await saveRow(case_, person, 0, [...fever]);
  await saveRow(case_, person, 1, [...rash]);
}

/** Everybody judges and hands in, and the chair unseals. */
export async function unsealedCase(
  running: RunningApp,
  wishes: CaseWishes = {},
): Promise<JudgedCase & { round: Round }> {
  const case_ = await acceptedCase(running, wishes);
  const round = await openRound(case_, 'sealed');
  for (const [k, person] of case_.contributors.entries()) {
    await judge(case_, person, (k % judgements.length) as 0 | 1 | 2);
    await handIn(round, person);
  }
  return { ...case_, round: await unseal(case_, round) };
}
