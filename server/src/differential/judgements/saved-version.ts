import type { Exposure } from '@weighhouse/shared/contracts/judgements';

/** The target of a judgement that is no row. */
export const priorTarget = 'prior';

/** One number of a saved version: `candidateId` null is none of these. */
export interface JudgedValue {
  candidateId: string | null;
  level: number;
  thousandths: number;
}

/** A saved version without its numbers. */
export interface VersionHead {
  id: string;
  personId: string;
  roundId: string;
  version: number;
  /** The word prior, or the id of a finding. */
  target: string;
  candidateSet: number;
  exposure: Exposure | null;
  reason: string | null;
  savedAt: Date;
}

/** A saved version with its numbers; none of them: the judgement was taken back. */
export interface SavedVersion extends VersionHead {
  values: readonly JudgedValue[];
}

/** The last version of each target, by target. */
export function latestByTarget<V extends VersionHead>(versions: Iterable<V>): Map<string, V> {
  const latest = new Map<string, V>();
  for (const version of versions) {
    const known = latest.get(version.target);
    if (!known || known.version < version.version) latest.set(version.target, version);
  }
  return latest;
}
