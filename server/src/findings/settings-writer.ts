import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { ChangeSettings } from '@weighhouse/shared/contracts/cases';
import { type EntityManager, In } from 'typeorm';
import { invalid } from '../platform/errors/refusal.js';
import { CandidatePair } from './candidate-pair.entity.js';
import { CandidatesService } from './candidates.service.js';
import { FindingGroup } from './finding-group.entity.js';
import { FindingRow } from './finding.entity.js';
import { groupFaults, pairFaults } from './settings-plan.js';

/** Brings groups of findings and pairs of candidates to what the chair sets. */
@Injectable()
export class SettingsWriter {
  constructor(private readonly candidates: CandidatesService) {}

  /** @throws Refusal 400 with every fault of both lists; nothing is written then */
  async write(
    em: EntityManager,
    caseId: string,
    { groups, together }: Pick<ChangeSettings, 'groups' | 'together'>,
  ): Promise<void> {
    const known = await em.findBy(FindingGroup, { caseId });
    const inForce = await this.candidates.inForce(caseId, em);
    const faults = [
      ...groupFaults(groups ?? [], new Set(known.map((group) => group.id))),
      ...pairFaults(together ?? [], new Set(inForce.map((candidate) => candidate.id))),
    ];
    if (faults.length > 0) throw invalid(faults);
    if (groups) await this.writeGroups(em, caseId, known, groups);
    if (together) await this.writePairs(em, caseId, together);
  }

  private async writeGroups(
    em: EntityManager,
    caseId: string,
    known: readonly FindingGroup[],
    groups: NonNullable<ChangeSettings['groups']>,
  ): Promise<void> {
    const kept = new Set(groups.map((group) => group.id));
    const dissolved = known.filter((group) => !kept.has(group.id)).map((group) => group.id);
    if (dissolved.length > 0) {
      await em.update(FindingRow, { caseId, groupId: In(dissolved) }, { groupId: null });
      await em.delete(FindingGroup, { id: In(dissolved) });
    }
    for (const [position, { id, label, overlap, reason }] of groups.entries()) {
      const columns = {
        position,
        label,
        overlap,
        reason: reason === undefined || reason === '' ? null : reason,
      };
      if (id === undefined) await em.insert(FindingGroup, { id: randomUUID(), caseId, ...columns });
      else await em.update(FindingGroup, { id }, columns);
    }
  }

  private async writePairs(
    em: EntityManager,
    caseId: string,
    together: NonNullable<ChangeSettings['together']>,
  ): Promise<void> {
    await em.delete(CandidatePair, { caseId });
    if (together.length === 0) return;
    await em.insert(
      CandidatePair,
      together.map(({ a, b, times, reason }) => ({ caseId, aId: a, bId: b, times, reason })),
    );
  }
}
