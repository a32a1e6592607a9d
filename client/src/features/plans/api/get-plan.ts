import { queryOptions, type QueryClient, useQuery } from '@tanstack/react-query';
import { type PlanView, planViewSchema } from '@weighhouse/shared/contracts/plans';
import { get } from '../../../lib/api';

export const planQuery = (caseId: string) =>
  queryOptions({
    queryKey: ['case', caseId, 'plan'],
    queryFn: ({ signal }) => get(`/api/cases/${caseId}/plan`, planViewSchema, signal),
    select: newestFirst,
  });

const newestFirst = (view: PlanView): PlanView => ({
  ...view,
  signed: [...view.signed].sort((one, other) => other.number - one.number),
});

export const usePlan = (caseId: string) => useQuery(planQuery(caseId));

/** Puts a change's answer on the screen; what else may have changed with it is read again. */
export function takePlan(client: QueryClient, caseId: string, view: PlanView): void {
  // A reading that began before the change would bring the older plan back.
  void client.cancelQueries({ queryKey: planQuery(caseId).queryKey });
  client.setQueryData(planQuery(caseId).queryKey, view);
  void client.invalidateQueries({ queryKey: ['case', caseId, 'case'] });
  void client.invalidateQueries({ queryKey: ['case', caseId, 'trail'] });
  void client.invalidateQueries({ queryKey: ['today'] });
}
