import { type Plan, type PlanInput, type PlanView, planViewSchema } from '@weighhouse/shared/contracts/plans';
import type { RunningApp } from '../setup/app.js';
import { type CaseWishes, type JudgedCase, unsealedCase } from './judgements.js';
import { testPassword } from './people.js';

/** Words that stand nowhere else, so that a test finds them where they must not be. */
export const planWords = {
  workingDiagnosis: 'Adult-onset Still’s disease',
  remainingDoubt: 'A lymphoma hidden behind the spleen',
  safetyNet: 'Come at once with breathlessness or a fever above 39 degrees.',
  forPatient: 'A blood test every two weeks',
  forDoctors: 'Review the bone marrow slides again',
} as const;

/** A plan with nothing missing: one action of the first contributor, one of the referrer that concerns the patient. */
export function wholePlan(case_: JudgedCase, change: Partial<PlanInput> = {}): PlanInput {
  return {
    version: 0,
    workingDiagnosis: planWords.workingDiagnosis,
    candidateId: case_.candidateIds[0] ?? null,
    certainty: 'provisional',
    remainingDoubt: planWords.remainingDoubt,
    safetyNet: planWords.safetyNet,
    actions: [
      {
        what: planWords.forPatient,
        ownerId: case_.referrer.id,
        due: '2027-03-12',
        concernsPatient: true,
      },
      {
        what: planWords.forDoctors,
        ownerId: case_.contributors[0]?.id ?? null,
        due: '2027-03-05',
        concernsPatient: false,
      },
    ],
    ...change,
  };
}

/** The chair saves a draft. */
export async function savePlan(case_: JudgedCase, change: Partial<PlanInput> = {}): Promise<Plan> {
  const { body } = await case_.chair.agent
    .put(`/api/cases/${case_.id}/plan`)
    .send(wholePlan(case_, change))
    .expect(200);
  const { draft } = planViewSchema.parse(body);
  if (!draft) throw new Error('a saved draft is not there');
  return draft;
}

/** A case with a whole draft about which everybody is asked. */
export async function askedCase(running: RunningApp, wishes: CaseWishes = {}): Promise<JudgedCase> {
  const case_ = await unsealedCase(running, wishes);
  await savePlan(case_);
  await case_.chair.agent.post(`/api/cases/${case_.id}/plan/ask`).expect(200);
  return case_;
}

/** The chair signs. */
export async function conclude(case_: JudgedCase): Promise<PlanView> {
  const { body } = await case_.chair.agent
    .post(`/api/cases/${case_.id}/conclude`)
    .send({ password: testPassword })
    .expect(200);
  return planViewSchema.parse(body);
}

/** A case that is closed with plan 1. */
export async function concludedCase(running: RunningApp, wishes: CaseWishes = {}): Promise<JudgedCase> {
  const case_ = await askedCase(running, wishes);
  await conclude(case_);
  return case_;
}

/** A plan and its drafts as one person sees them. */
export async function readPlan(case_: JudgedCase, person: JudgedCase['chair']): Promise<PlanView> {
  const { body } = await person.agent.get(`/api/cases/${case_.id}/plan`).expect(200);
  return planViewSchema.parse(body);
}
