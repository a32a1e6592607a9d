import type { Round } from '@weighhouse/shared/contracts/rounds';
import { z } from 'zod';

/**
 * The digests that this browser was shown at hand-in. They are no secret and stay after signing out: only a digest
 * that was seen before the unsealing can show that nobody, the server included, changed a judgement meanwhile.
 */
const storageKey = 'weighhouse.seen-digests';

const seenSchema = z.record(z.string(), z.object({ digest: z.string(), at: z.string() }));
export type SeenDigests = z.infer<typeof seenSchema>;

const keyOf = (roundId: string, personId: string) => `${roundId} ${personId}`;

export function seenDigest(seen: SeenDigests, roundId: string, personId: string) {
  const key = keyOf(roundId, personId);
  return Object.hasOwn(seen, key) ? (seen[key] ?? null) : null;
}

/**
 * Adds the digests of a round that are shown for the first time. A digest that was seen before is never replaced,
 * and only those of a round that is still sealed say anything.
 */
export function withSeen(seen: SeenDigests, round: Round, at: string): SeenDigests {
  if (round.kind !== 'sealed' || round.state !== 'open') return seen;
  const fresh = round.members.flatMap(({ person, digest }) =>
    digest === null || seenDigest(seen, round.id, person.id)
      ? []
      : [[keyOf(round.id, person.id), { digest, at }] as const],
  );
  return fresh.length === 0 ? seen : { ...seen, ...Object.fromEntries(fresh) };
}

export function readSeen(): SeenDigests {
  try {
    const read = seenSchema.safeParse(JSON.parse(localStorage.getItem(storageKey) ?? '{}'));
    return read.success ? read.data : {};
  } catch {
    return {};
  }
}

export function writeSeen(seen: SeenDigests): void {
  try {
    localStorage.setItem(storageKey, JSON.stringify(seen));
  } catch {
    // Without storage the seals can still be recomputed, only not compared with what was shown at hand-in.
  }
}
