import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { ChangeFinding, NewFinding } from '@weighhouse/shared/contracts/findings';
import { type EntityManager, IsNull } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { invalid, notFound, Refusal, stale } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { ReportDirectory } from '../reports/report-directory.js';
import { FindingGroup } from './finding-group.entity.js';
import { findingColumns } from './finding-columns.js';
import { findingFaults } from './finding-faults.js';
import { levelsOf, plainLevels, writeLevels } from './finding-levels.js';
import { FindingRow } from './finding.entity.js';
import { type FindingEntry, FindingsService } from './findings.service.js';

const most = 300;

/** Adds, changes and takes back findings. */
@Injectable()
export class FindingChanges {
  constructor(
    private readonly access: CaseAccess,
    private readonly changes: CaseChanges,
    private readonly findings: FindingsService,
    private readonly reports: ReportDirectory,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  async add(actor: Actor, caseId: string, { levelLabels, ...asked }: NewFinding): Promise<FindingEntry> {
    const id = randomUUID();
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'finding.add', work.em);
      const labels = levelLabels ?? plainLevels;
      await this.refuseFaults(work.em, caseId, { levelLabels, ...asked }, labels, asked.observed);
      await refuseTooMany(work.em, caseId);
      await work.em.insert(FindingRow, {
        id,
        caseId,
        position: ((await work.em.maximum(FindingRow, 'position', { caseId })) ?? -1) + 1,
        version: 1,
        detail: '',
        kind: 'symptom',
        ...findingColumns(asked),
        addedById: actor.id,
        addedAt: this.clock.now(),
      });
      await writeLevels(work.em, id, labels);
      const line = { actorId: actor.id, action: 'finding.added', sentence: 'added a finding' };
      await this.changes.commit(work, file, 'findings', line);
    });
    return this.entry(id);
  }

  /**
   * @throws Refusal 409 `stale` with the finding as it stands, when somebody saved in between; 409 `wrong-state` for
   *   one entered in error, and for another number of levels once judging has begun
   */
  async change(
    actor: Actor,
    findingId: string,
    { version, levelLabels, ...asked }: ChangeFinding,
  ): Promise<FindingEntry> {
    const { caseId } = await this.entry(findingId);
    const saved = await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'finding.change', work.em);
      const row = await work.em.findOneByOrFail(FindingRow, { id: findingId });
      if (row.version !== version) return false;
      if (row.errorAt !== null) throw enteredInError();
      const before = await levelsOf(work.em, findingId);
      const labels = levelLabels ?? before;
      if (labels.length !== before.length && file.roundNumber !== null) throw levelsFixed();
      const observed = asked.observed === undefined ? row.observed : asked.observed;
      await this.refuseFaults(work.em, caseId, { levelLabels, ...asked }, labels, observed);
      const columns = { ...findingColumns(asked), version: version + 1 };
      const { affected } = await work.em.update(FindingRow, { id: findingId, version }, columns);
      if (affected !== 1) return false;
      if (levelLabels) await writeLevels(work.em, findingId, levelLabels);
      const resulted = row.observed === null && observed !== null;
      const line = resulted
        ? { action: 'finding.resulted', sentence: 'entered the result of a pending finding' }
        : { action: 'finding.changed', sentence: 'changed a finding' };
      await this.changes.commit(work, file, 'findings', { actorId: actor.id, ...line });
      return true;
    });
    if (!saved) throw stale(publicPart(await this.entry(findingId)));
    return this.entry(findingId);
  }

  /** From here on it counts nowhere; it stays in its place, with the words. */
  async enteredInError(actor: Actor, findingId: string, words: string): Promise<FindingEntry> {
    const { caseId } = await this.entry(findingId);
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'finding.change', work.em);
      const row = await work.em.findOneByOrFail(FindingRow, { id: findingId });
      const columns = {
        version: row.version + 1,
        errorWords: words,
        errorById: actor.id,
        errorAt: this.clock.now(),
      };
      const { affected } = await work.em.update(FindingRow, { id: findingId, errorAt: IsNull() }, columns);
      if (affected !== 1) throw enteredInError();
      const line = { action: 'finding.enteredInError', sentence: 'marked a finding as entered in error' };
      await this.changes.commit(work, file, 'findings', { actorId: actor.id, ...line });
    });
    return this.entry(findingId);
  }

  private async entry(findingId: string): Promise<FindingEntry> {
    const entry = await this.findings.byId(findingId);
    if (!entry) throw notFound();
    return entry;
  }

  private async refuseFaults(
    em: EntityManager,
    caseId: string,
    asked: Parameters<typeof findingFaults>[0],
    labels: readonly string[],
    observed: number | null,
  ): Promise<void> {
    const groups = await em.findBy(FindingGroup, { caseId });
    const reportId = asked.source?.reportId ?? null;
    const faults = findingFaults(asked, labels, observed, {
      groupIds: new Set(groups.map((group) => group.id)),
      reportIsThere: reportId !== null && (await this.reports.isOf(caseId, reportId, em)),
    });
    if (faults.length > 0) throw invalid(faults);
  }
}

async function refuseTooMany(em: EntityManager, caseId: string): Promise<void> {
  if ((await em.countBy(FindingRow, { caseId, errorAt: IsNull() })) < most) return;
  throw new Refusal('wrong-state', `The case holds ${String(most)} findings, the most that can be weighed.`);
}

const enteredInError = (): Refusal =>
  new Refusal('wrong-state', 'This finding has been entered in error and stays as it is. Add a new one.');

const levelsFixed = (): Refusal =>
  new Refusal(
    'wrong-state',
    'Judging has begun, so the number of levels stays. Mark this finding as entered in error and add a new one.',
  );

/** An error's `current` does not pass through a response schema. */
const publicPart = ({ caseId: _, ...finding }: FindingEntry): Omit<FindingEntry, 'caseId'> => finding;
