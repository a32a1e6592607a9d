import { queryOptions, useQuery } from '@tanstack/react-query';
import { panelSchema } from '@weighhouse/shared/contracts/differential';
import { get } from '../../../lib/api';

export const panelQuery = (caseId: string) =>
  queryOptions({
    queryKey: ['case', caseId, 'panel'],
    queryFn: ({ signal }) => get(`/api/cases/${caseId}/panel`, panelSchema, signal),
  });

/** The numbers behind the pool, as assess() takes them; asked for where there is a pool to read. */
export const usePanel = (caseId: string, wanted: boolean) =>
  useQuery({ ...panelQuery(caseId), enabled: wanted });
