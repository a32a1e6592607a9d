import type { QueryClient } from '@tanstack/react-query';

/** Reads again what a change of findings or candidates shows on; resolves when the ledger is right again. */
export function refreshEvidence(client: QueryClient, caseId: string): Promise<void> {
  for (const what of ['case', 'findings', 'candidates', 'panel', 'trail'])
    void client.invalidateQueries({ queryKey: ['case', caseId, what] });
  return client.invalidateQueries({ queryKey: ['case', caseId, 'differential'] });
}
