import type { QueryClient } from '@tanstack/react-query';
import type { Differential } from '@weighhouse/shared/contracts/differential';
import { differentialKey } from './get-differential';

const touched = [
  'case',
  'candidates',
  'findings',
  'rounds',
  'seals',
  'settings',
  'differential',
  'panel',
  'trail',
  'plan',
];

/** Reads again what a move on the ledger changes; resolves when the ledger itself is right again. */
export function refreshDifferential(client: QueryClient, caseId: string): Promise<void> {
  void client.invalidateQueries({ queryKey: ['today'] });
  void client.invalidateQueries({ queryKey: ['cases'] });
  for (const what of touched.filter((part) => part !== 'differential'))
    void client.invalidateQueries({ queryKey: ['case', caseId, what] });
  return client.invalidateQueries({ queryKey: differentialKey(caseId) });
}

/** Takes over the version of one's own judgement that a save answered with, before the rest is read again. */
export function takeOwnVersion(client: QueryClient, caseId: string, version: number): void {
  client.setQueryData<Differential>(differentialKey(caseId), (known) =>
    known?.mine ? { ...known, mine: { ...known.mine, version } } : known,
  );
}
