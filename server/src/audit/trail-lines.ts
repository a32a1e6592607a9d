import type { EntityManager, SelectQueryBuilder } from 'typeorm';
import { AuditEntry } from '../platform/audit-log/audit-entry.entity.js';

export interface TrailQuestion {
  caseId: string;
  /** Who asks. */
  actorId: string;
  ownOnly: boolean;
  /** Rounds of which nobody may see what others did. */
  sealedRoundIds: readonly string[];
  /** Whoever sees the panel's numbers without names. */
  unnamed: boolean;
}

/**
 * Lines that say whose numbers were moved. Beside numbers that just moved, or as many lines as somebody has rows, they
 * would put a name to each of them.
 */
const naming = ['judgement.saved', 'team.weighed'];

/** The lines of a case's trail that one person may see, the latest first. */
export function trailLines(em: EntityManager, question: TrailQuestion): SelectQueryBuilder<AuditEntry> {
  const lines = em
    .createQueryBuilder(AuditEntry, 'line')
    .where('line.caseId = :caseId', { caseId: question.caseId })
    .orderBy('line.id', 'DESC');
  if (question.ownOnly) return lines.andWhere('line.actorId = :me', { me: question.actorId });
  if (question.unnamed)
    lines.andWhere('(line.action NOT IN (:...naming) OR line.actorId = :me)', {
      naming,
      me: question.actorId,
    });
  if (question.sealedRoundIds.length === 0) return lines;
  return lines.andWhere(
    '(line.sealedRoundId IS NULL OR line.sealedRoundId NOT IN (:...sealed) OR line.actorId = :me)',
    { sealed: question.sealedRoundIds, me: question.actorId },
  );
}
