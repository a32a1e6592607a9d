import type { Leading } from '../assessing/computations.js';
import type { CasePool } from './case-pool.js';

/** The name of the last column. */
export const noneOfThese = 'none of these';
const tie = 1e-12;

/** The names of the columns, none of these last. */
export const columnNames = (pool: Pick<CasePool, 'candidates'>): string[] => [
  ...pool.candidates.map((candidate) => candidate.name),
  noneOfThese,
];

/** The index of the largest share, the first of those within 1e-12. */
export function leaderOf(standing: readonly number[]): number {
  const largest = Math.max(...standing);
  return standing.findIndex((share) => share >= largest - tie);
}

/** What lists show of a case: the leader and how far its contributors are apart. */
export function leaderColumns(
  pool: Pick<CasePool, 'candidates'>,
  assessment: Leading | null,
): { leaderName: string | null; leaderShare: number | null; disagreementBits: number | null } {
  if (!assessment) return { leaderName: null, leaderShare: null, disagreementBits: null };
  const leader = leaderOf(assessment.standing);
  return {
    leaderName: columnNames(pool)[leader] ?? null,
    leaderShare: assessment.standing[leader] ?? null,
    disagreementBits: assessment.disagreementBits,
  };
}
