import { type JudgedValue, priorTarget, type SavedVersion } from '../judgements/saved-version.js';

/** Small saved versions for the specs; each test says only what it is about. */
export function makeVersion(parts: Partial<SavedVersion> = {}): SavedVersion {
  return {
    id: `${parts.personId ?? 'ann'}-${String(parts.version ?? 1)}`,
    personId: 'ann',
    roundId: 'r1',
    version: 1,
    target: priorTarget,
    candidateSet: 2,
    exposure: null,
    reason: null,
    savedAt: new Date('2026-03-02T10:00:00.000Z'),
    values: [],
    ...parts,
  };
}

/** Values of a prior, by column; the last is none of these. */
export const priorValues = (columns: (string | null)[], shares: number[]): JudgedValue[] =>
  columns.map((candidateId, k) => ({ candidateId, level: 0, thousandths: shares[k] ?? 0 }));

/** Values of a row with two levels. */
export const rowValues = (columns: (string | null)[], present: number[]): JudgedValue[] =>
  columns.map((candidateId, k) => ({ candidateId, level: 1, thousandths: present[k] ?? 0 }));
