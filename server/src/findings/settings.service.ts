import { Injectable } from '@nestjs/common';
import type { Settings } from '@weighhouse/shared/contracts/cases';
import { DataSource, type EntityManager } from 'typeorm';
import { CaseDirectory } from '../cases/case-directory.js';
import { PeopleDirectory } from '../people/people-directory.js';
import { notFound } from '../platform/errors/refusal.js';
import { CandidatePair } from './candidate-pair.entity.js';
import { CandidatesService } from './candidates.service.js';
import { FindingGroup } from './finding-group.entity.js';
import { SettingsChange } from './settings-change.entity.js';

/** How a case's numbers are read: tempering, coexistence, groups of findings and pairs of candidates. */
@Injectable()
export class SettingsService {
  constructor(
    private readonly source: DataSource,
    private readonly cases: CaseDirectory,
    private readonly candidates: CandidatesService,
    private readonly people: PeopleDirectory,
  ) {}

  /** Without a check of who asks. Pairs of which one candidate has been retired are left out. */
  async read(caseId: string, em: EntityManager = this.source.manager): Promise<Settings> {
    const file = await this.cases.byId(caseId, em);
    if (!file) throw notFound();
    const inForce = new Set((await this.candidates.inForce(caseId, em)).map((entry) => entry.id));
    const groups = await em.find(FindingGroup, { where: { caseId }, order: { position: 'ASC' } });
    const pairs = await em.findBy(CandidatePair, { caseId });
    return {
      coexistence: file.coexistence,
      tempering: file.tempering,
      quorum: file.quorum,
      conferenceAt: file.conferenceAt?.toISOString() ?? null,
      groups: groups.map(({ id, label, overlap, reason }) => ({ id, label, overlap, reason })),
      together: pairs
        .filter((pair) => inForce.has(pair.aId) && inForce.has(pair.bId))
        .map(({ aId, bId, times, reason }) => ({ a: aId, b: bId, times, reason })),
      lastChange: await this.lastChange(caseId, em),
    };
  }

  private async lastChange(caseId: string, em: EntityManager): Promise<Settings['lastChange']> {
    const change = await em.findOne(SettingsChange, { where: { caseId }, order: { id: 'DESC' } });
    if (!change) return null;
    const by = (await this.people.byIds([change.changedById], em)).get(change.changedById)?.name ?? '';
    return { by, at: change.changedAt.toISOString(), reason: change.reason };
  }
}
