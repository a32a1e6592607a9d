import { Inject, Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { CaseDirectory } from '../../cases/case-directory.js';
import { TeamReader } from '../../cases/team-reader.js';
import { type Configuration, CONFIGURATION } from '../../platform/config/configuration.js';
import { grouped } from '../../platform/database/grouped.js';
import { notFound } from '../../platform/errors/refusal.js';
import { JudgementStore } from '../judgements/judgement-store.js';
import { latestByTarget, type SavedVersion } from '../judgements/saved-version.js';
import { type HandInFact, RoundReader } from '../rounds/round-reader.js';
import type { RoundRow } from '../rounds/round.entity.js';
import type { CasePool, VisibleContributor } from './case-pool.js';
import { hiddenOrder } from './contributor-keys.js';
import { Evidence } from './evidence.js';
import { visibleVersions } from './visible-judgements.js';

/** Reads what a case's pool is made from. Numbers that may not be seen do not leave the database. */
@Injectable()
export class PoolReader {
  constructor(
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
    private readonly cases: CaseDirectory,
    private readonly team: TeamReader,
    private readonly evidence: Evidence,
    private readonly rounds: RoundReader,
    private readonly judgements: JudgementStore,
  ) {}

  /**
   * @param em a transaction that holds the case's row, or one that reads at one moment (see Snapshots)
   * @throws Refusal 404 for an unknown case
   */
  async read(caseId: string, em: EntityManager): Promise<CasePool> {
    const file = await this.cases.byId(caseId, em);
    if (!file) throw notFound();
    const evidence = await this.evidence.read(caseId, em);
    const rounds = await this.rounds.ofCase(caseId, em);
    const handIns = await this.rounds.handIns(rounds, em);
    const contributors = await this.contributors(caseId, rounds, handIns, em);
    const { id, revision, candidateSet } = file;
    return { caseId: id, revision, candidateSet, ...evidence, rounds, handIns, contributors };
  }

  private async contributors(
    caseId: string,
    rounds: readonly RoundRow[],
    handIns: readonly HandInFact[],
    em: EntityManager,
  ): Promise<VisibleContributor[]> {
    const team = await this.team.contributors(caseId, em);
    const weights = new Map(team.map((entry) => [entry.personId, entry.weight]));
    const visible = visibleVersions(rounds, handIns, await this.judgements.heads(caseId, em));
    const byPerson = grouped(visible, (version) => version.personId);
    const latest = [...weights.keys()].flatMap((id) => [...latestByTarget(byPerson.get(id) ?? []).values()]);
    const filled = grouped(await this.judgements.withValues(latest, em), (version) => version.personId);
    return hiddenOrder(this.configuration.SESSION_SECRET, caseId, [...weights.keys()]).map((personId) => ({
      personId,
      weight: weights.get(personId) ?? 0,
      judgements: new Map(
        (filled.get(personId) ?? []).map((version): [string, SavedVersion] => [version.target, version]),
      ),
    }));
  }
}
