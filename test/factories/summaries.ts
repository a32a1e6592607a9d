import { type Summary, summarySchema } from '@weighhouse/shared/contracts/summaries';
import type { RunningApp } from '../setup/app.js';
import type { JudgedCase, SeatedPerson } from './judgements.js';

export const summaryPath = (of: JudgedCase): string => `/api/cases/${of.id}/summary`;

/** A summary as one person sees it. */
export async function readSummary(case_: JudgedCase, person: SeatedPerson): Promise<Summary> {
  const { body } = await person.agent.get(summaryPath(case_)).expect(200);
  return summarySchema.parse(body);
}

/** The liaison saves a summary, with `ready` also hands it to the chair. */
export async function saveSummary(
  case_: JudgedCase,
  input: { version: number; body: string; ready?: boolean },
): Promise<Summary> {
  const { body } = await case_.liaison.agent.put(summaryPath(case_)).send(input).expect(200);
  return summarySchema.parse(body);
}

/** The chair approves a version. */
export async function approveSummary(case_: JudgedCase, version: number): Promise<Summary> {
  const { body } = await case_.chair.agent
    .post(`${summaryPath(case_)}/approve`)
    .send({ version })
    .expect(200);
  return summarySchema.parse(body);
}

/** A contact with the patient as the liaison logs it. */
export const contactInput = (running: RunningApp, change: object = {}) => ({
  at: running.clock.now().toISOString(),
  how: 'telephone',
  reached: true,
  understood: 'partly',
  questions: 'Can I travel?',
  notes: 'Her daughter listened too.',
  ...change,
});
