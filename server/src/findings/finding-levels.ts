import type { EntityManager } from 'typeorm';
import { FindingLevel } from './finding-level.entity.js';

/** The levels of a finding for which none are named. */
export const plainLevels = ['absent', 'present'];

/** Names of a finding's levels, in order. */
export async function levelsOf(em: EntityManager, findingId: string): Promise<string[]> {
  const rows = await em.find(FindingLevel, { where: { findingId }, order: { position: 'ASC' } });
  return rows.map((row) => row.label);
}

export async function writeLevels(
  em: EntityManager,
  findingId: string,
  labels: readonly string[],
): Promise<void> {
  await em.delete(FindingLevel, { findingId });
  await em.insert(
    FindingLevel,
    labels.map((label, position) => ({ findingId, position, label })),
  );
}
