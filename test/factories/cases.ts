import type { Case, Part } from '@weighhouse/shared/contracts/cases';
import type { Role } from '@weighhouse/shared/contracts/people';
import type { RunningApp } from '../setup/app.js';
import { type Agent, makePerson, signedIn, type TestPerson } from './people.js';

/** Somebody with a browser in which they are signed in. */
export interface SeatedPerson extends TestPerson {
  agent: Agent;
}

/** A draft with nothing missing. */
export const wholeDraft = {
  question: 'Which illness explains the fever?',
  age: 41,
  sex: 'female',
  urgency: 'withinMonth',
  urgencyReason: '',
  consent: { given: true, how: 'signed', givenOn: '2026-01-15' },
  historyHtml: '<p>Fever every evening for four months.</p>',
} as const;

export async function seat(
  running: RunningApp,
  role: Role | Role[],
  about: { name?: string; specialty?: string } = {},
): Promise<SeatedPerson> {
  const person = await makePerson(running, role, about);
  return { ...person, agent: await signedIn(running, person) };
}

/** The people of one network, each signed in once: signing in is slow on purpose. */
export async function seatNetwork(running: RunningApp) {
  return {
    referrer: await seat(running, 'referrer'),
    otherReferrer: await seat(running, 'referrer'),
    first: await seat(running, 'specialist'),
    second: await seat(running, 'specialist'),
    outsider: await seat(running, 'specialist'),
    chair: await seat(running, 'chair'),
    otherChair: await seat(running, 'chair'),
    liaison: await seat(running, 'liaison'),
    administrator: await seat(running, 'administrator'),
  };
}
export type Network = Awaited<ReturnType<typeof seatNetwork>>;

/** The two specialists and the liaison, as PUT team and accept take them. */
export function smallestTeam({ first, second, liaison }: Pick<Network, 'first' | 'second' | 'liaison'>) {
  return [
    { personId: first.id, part: 'contributor' as Part },
    { personId: second.id, part: 'contributor' as Part },
    { personId: liaison.id, part: 'liaison' as Part },
  ];
}

export async function draftCase(
  people: Pick<Network, 'referrer'>,
  draft: Record<string, unknown> = wholeDraft,
): Promise<Case> {
  const answer = await people.referrer.agent.post('/api/cases').send(draft).expect(201);
  return answer.body as Case;
}

export async function submittedCase(people: Pick<Network, 'referrer'>): Promise<Case> {
  const { id } = await draftCase(people);
  const answer = await people.referrer.agent.post(`/api/cases/${id}/submit`).send({}).expect(200);
  return answer.body as Case;
}

/** Accepted with the smallest team. */
export async function takenCase(people: Network): Promise<Case> {
  const { id } = await submittedCase(people);
  const answer = await people.chair.agent
    .post(`/api/cases/${id}/accept`)
    .send({ team: smallestTeam(people), conferenceAt: null })
    .expect(200);
  return answer.body as Case;
}

/** Accepted, with two candidates, three findings and an open round: the first, sealed, or a live one after it. */
export async function caseInRound(people: Network, kind: 'sealed' | 'live' = 'sealed'): Promise<Case> {
  const taken = await takenCase(people);
  for (const name of ['Still’s disease', 'Lymphoma']) {
    await people.chair.agent.post(`/api/cases/${taken.id}/candidates`).send({ name }).expect(201);
  }
  for (const title of ['Fever every evening', 'Rash', 'Ferritin above five times']) {
    await people.first.agent.post(`/api/cases/${taken.id}/findings`).send({ title, observed: 1 }).expect(201);
  }
  await people.chair.agent.post(`/api/cases/${taken.id}/rounds`).send({ kind: 'sealed' }).expect(201);
  if (kind === 'live') await openLiveRound(people, taken.id);
  const answer = await people.chair.agent.get(`/api/cases/${taken.id}`).expect(200);
  return answer.body as Case;
}

/** Nobody judges: both contributors say that no more will come, the chair unseals and opens a live round. */
async function openLiveRound({ chair, first, second }: Network, caseId: string): Promise<void> {
  const settings = { quorum: 2, reason: 'two contributors' };
  await chair.agent.patch(`/api/cases/${caseId}/settings`).send(settings).expect(200);
  const { body } = await chair.agent.get(`/api/cases/${caseId}/rounds`).expect(200);
  const [{ id }] = body.items as [{ id: string }];
  for (const { agent } of [first, second]) {
    await agent.post(`/api/rounds/${id}/hand-in`).send({ noMore: true }).expect(200);
  }
  await chair.agent.post(`/api/rounds/${id}/unseal`).send({}).expect(200);
  await chair.agent.post(`/api/cases/${caseId}/rounds`).send({ kind: 'live' }).expect(201);
}
