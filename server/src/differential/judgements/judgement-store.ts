import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager, In } from 'typeorm';
import { grouped } from '../../platform/database/grouped.js';
import { JudgementValue } from './judgement-value.entity.js';
import { JudgementVersion } from './judgement-version.entity.js';
import { type JudgedValue, latestByTarget, type SavedVersion, type VersionHead } from './saved-version.js';

/** Reads and adds saved versions. Who may see them is decided by whoever asks. */
@Injectable()
export class JudgementStore {
  constructor(private readonly source: DataSource) {}

  /** Every version of a case, without the numbers. */
  async heads(caseId: string, em: EntityManager = this.source.manager): Promise<VersionHead[]> {
    return em.findBy(JudgementVersion, { caseId });
  }

  /** One person's last version of each target, saved in whatever round: for that person's eyes. */
  async latestOf(
    caseId: string,
    personId: string,
    em: EntityManager = this.source.manager,
  ): Promise<Map<string, SavedVersion>> {
    const heads = await em.findBy(JudgementVersion, { caseId, personId });
    const filled = await this.withValues([...latestByTarget(heads).values()], em);
    return new Map(filled.map((version) => [version.target, version]));
  }

  /** The versions with their numbers. */
  async withValues(
    heads: readonly VersionHead[],
    em: EntityManager = this.source.manager,
  ): Promise<SavedVersion[]> {
    if (heads.length === 0) return [];
    const rows = await em.find(JudgementValue, {
      where: { judgementVersionId: In(heads.map((head) => head.id)) },
      order: { id: 'ASC' },
    });
    const byVersion = grouped(rows, (row) => row.judgementVersionId);
    return heads.map((head) => ({ ...head, values: byVersion.get(head.id) ?? [] }));
  }

  /** The number of a person's last version on a case; 0 before the first. */
  async lastVersion(
    caseId: string,
    personId: string,
    em: EntityManager = this.source.manager,
  ): Promise<number> {
    return (await em.maximum(JudgementVersion, 'version', { caseId, personId })) ?? 0;
  }

  /** Adds a version; none is ever changed. The case's row is locked, so that the number is free. */
  async add(
    em: EntityManager,
    head: Omit<VersionHead, 'id'> & { caseId: string },
    values: readonly JudgedValue[],
  ): Promise<void> {
    const id = randomUUID();
    await em.insert(JudgementVersion, { ...head, id });
    if (values.length > 0)
      await em.insert(
        JudgementValue,
        values.map((value) => ({ ...value, judgementVersionId: id })),
      );
  }
}
