import type { Candidate, Finding } from '@weighhouse/shared/contracts/findings';
import type { Agent } from './people.js';

export async function addFinding(
  agent: Agent,
  caseId: string,
  finding: Record<string, unknown> = {},
): Promise<Finding> {
  const answer = await agent
    .post(`/api/cases/${caseId}/findings`)
    .send({ title: 'Fever every evening', observed: 1, ...finding })
    .expect(201);
  return answer.body as Finding;
}

export async function addCandidate(
  agent: Agent,
  caseId: string,
  name: string,
  more: Record<string, unknown> = {},
): Promise<Candidate> {
  const answer = await agent
    .post(`/api/cases/${caseId}/candidates`)
    .send({ name, ...more })
    .expect(201);
  return answer.body as Candidate;
}
