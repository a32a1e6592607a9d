import type { Seal } from '@weighhouse/shared/contracts/rounds';
import { sealHolds } from '@weighhouse/shared/seals/seal';
import { seenDigest, type SeenDigests } from './seen-digests';

export type SealVerdict = 'holds' | 'broken' | 'closed';
export interface CheckedSeal {
  seal: Seal;
  /** closed: the random bytes are not published yet, so there is nothing to check. */
  verdict: SealVerdict;
  /** Against the digest that this browser saw while the round was sealed. */
  seen: 'same' | 'other' | 'never';
}

/** Recomputes every seal in this browser. A seal that cannot be read does not hold. */
export function checkSeals(seals: readonly Seal[], seen: SeenDigests): Promise<CheckedSeal[]> {
  return Promise.all(
    seals.map(async (seal) => {
      const before = seenDigest(seen, seal.roundId, seal.person.id);
      const same = before?.digest.toLowerCase() === seal.digest.toLowerCase();
      return {
        seal,
        verdict: await verdictOf(seal),
        seen: before === null ? 'never' : same ? 'same' : 'other',
      };
    }),
  );
}

async function verdictOf({ digest, random, document, roundId, person }: Seal): Promise<SealVerdict> {
  if (random === null || document === null) return 'closed';
  // A document of somebody else, or of another round, would hold under its own digest.
  if (document.roundId !== roundId || document.personId !== person.id) return 'broken';
  try {
    return (await sealHolds({ digest, random, document })) ? 'holds' : 'broken';
  } catch {
    return 'broken';
  }
}
