import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { centreListSchema, centreSchema } from '@weighhouse/shared/contracts/people';
import { get, post } from '../../../lib/api';

export const useCentres = () =>
  useQuery({
    queryKey: ['centres'],
    queryFn: ({ signal }) => get('/api/centres', centreListSchema, signal),
  });

export function useAddCentre() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (centre: { code: string; name: string }) => post('/api/centres', centreSchema, centre),
    onSuccess: () => client.invalidateQueries({ queryKey: ['centres'] }),
  });
}
