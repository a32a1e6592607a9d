import type { VersionHead } from '../judgements/saved-version.js';

/** What it takes of a round to know whether its numbers may be seen. */
export interface RoundFacts {
  id: string;
  kind: 'sealed' | 'live';
  unsealedAt: Date | null;
}

export interface HandInFacts {
  roundId: string;
  personId: string;
  version: number;
}

/** Whether a round's numbers are everybody's: a live one's always are, a sealed one's once it is unsealed. */
export const isShown = (round: Pick<RoundFacts, 'kind' | 'unsealedAt'>): boolean =>
  round.kind === 'live' || round.unsealedAt !== null;

/**
 * The saved versions that may be pooled and shown to others: those saved in a live round, and those that their giver
 * confirmed by handing in, in a round that is live or unsealed. Everything else is nobody's but the giver's: what was
 * saved in a sealed round and not handed in, or in a round that is not known here.
 */
export function visibleVersions<V extends VersionHead>(
  rounds: readonly RoundFacts[],
  handIns: readonly HandInFacts[],
  versions: readonly V[],
): V[] {
  const shown = new Set(rounds.filter(isShown).map((round) => round.id));
  const live = new Set(rounds.filter((round) => round.kind === 'live').map((round) => round.id));
  const confirmed = new Map<string, number>();
  for (const { roundId, personId, version } of handIns) {
    if (shown.has(roundId)) confirmed.set(personId, Math.max(confirmed.get(personId) ?? 0, version));
  }
  return versions.filter(
    ({ roundId, personId, version }) => live.has(roundId) || version <= (confirmed.get(personId) ?? 0),
  );
}
