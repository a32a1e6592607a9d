import { type QueryClient, useQueryClient } from '@tanstack/react-query';
import { type Plan, type PlanInput, planSchema, planViewSchema } from '@weighhouse/shared/contracts/plans';
import { type ApiError, put } from '../../../lib/api';
import { takePlan } from './get-plan';

/** Saves the draft with the version it was written upon. @throws ApiError `stale` with the newer draft */
async function savePlan(client: QueryClient, caseId: string, input: PlanInput): Promise<Plan> {
  const view = await put(`/api/cases/${caseId}/plan`, planViewSchema, input);
  takePlan(client, caseId, view);
  if (!view.draft) throw new Error('the server answered a saved draft without one');
  return view.draft;
}

export function useSavePlan(caseId: string) {
  const client = useQueryClient();
  return (input: PlanInput) => savePlan(client, caseId, input);
}

/** The draft in a `stale` refusal. */
export function staleDraft(error: ApiError): Plan | null {
  const plan = planSchema.safeParse(error.current);
  if (plan.success) return plan.data;
  const view = planViewSchema.safeParse(error.current);
  return view.success ? view.data.draft : null;
}
