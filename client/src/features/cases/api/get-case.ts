import { queryOptions, useQuery } from '@tanstack/react-query';
import { caseSchema } from '@weighhouse/shared/contracts/cases';
import { useParams } from 'react-router-dom';
import { get } from '../../../lib/api';

export const caseQuery = (caseId: string) =>
  queryOptions({
    queryKey: ['case', caseId, 'case'],
    queryFn: ({ signal }) => get(`/api/cases/${caseId}`, caseSchema, signal),
  });

export const useCase = (caseId: string) => useQuery(caseQuery(caseId));

/** The case of this page's address. */
export function useCaseId(): string {
  const { caseId } = useParams();
  if (caseId === undefined) throw new Error('used outside a case');
  return caseId;
}
