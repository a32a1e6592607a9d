import { Inject, Injectable } from '@nestjs/common';
import type { Case, ChangeDraft, NewCase } from '@weighhouse/shared/contracts/cases';
import { MoreThan } from 'typeorm';
import { Clock } from '../platform/clock/clock.js';
import { localDay } from '../platform/clock/local-day.js';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import { AuditEntry } from '../platform/audit-log/audit-entry.entity.js';
import { UnitOfWork, type Work } from '../platform/database/unit-of-work.js';
import { invalid, Refusal, stale } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { CaseAccess, describe, type OpenedCase } from './case-access.js';
import { CaseChanges } from './case-changes.js';
import { CaseFile } from './case-file.entity.js';
import { nextCaseNumber } from './case-number.js';
import { CaseViews } from './case-views.js';
import { draftColumns, freshColumns } from './draft-columns.js';
import { TeamMember } from './team-member.entity.js';

const quarterHourMs = 15 * 60_000;

/** Opens drafts and saves them, again and again while the referrer types. */
@Injectable()
export class DraftsService {
  constructor(
    private readonly access: CaseAccess,
    private readonly changes: CaseChanges,
    private readonly views: CaseViews,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
  ) {}

  /** Opens a case; every part may still be missing. */
  async open(actor: Actor, input: NewCase): Promise<Case> {
    if (!actor.roles.includes('referrer')) throw new Refusal('forbidden', 'Your roles do not open this.');
    const today = this.today();
    refuseFuture(input, today);
    const file = await this.work.run(async (work) => {
      const number = await nextCaseNumber(work.em, Number(today.slice(0, 4)));
      const fresh: CaseFile = {
        ...freshColumns(actor.id, this.clock.now()),
        ...draftColumns(input),
        number,
      };
      // A copy: what the database fills in would come back in its own types.
      await work.em.insert(CaseFile, work.em.create(CaseFile, fresh));
      await work.em.insert(TeamMember, {
        caseId: fresh.id,
        personId: actor.id,
        part: 'referrer',
        addedAt: this.clock.now(),
      });
      const line = { actorId: actor.id, action: 'case.opened', sentence: 'opened the case' };
      await this.changes.commit(work, fresh, 'case', line);
      return fresh;
    });
    return this.views.view(actor, describe(actor, file, ['referrer']));
  }

  /** @throws Refusal 409 `stale` with the draft as it stands, when somebody saved in between */
  async change(actor: Actor, caseId: string, { version, ...input }: ChangeDraft): Promise<Case> {
    const { opened, saved } = await this.work.run(async (work) => {
      const found = await this.access.open(actor, caseId, 'case.edit', work.em);
      refuseFuture(input, this.today());
      return { opened: found, saved: await this.save(work, actor, found, version, input) };
    });
    const view = await this.views.view(actor, opened);
    if (!saved) throw stale(view);
    return view;
  }

  private async save(
    work: Work,
    actor: Actor,
    { file }: OpenedCase,
    version: number,
    input: NewCase,
  ): Promise<boolean> {
    const next = { ...draftColumns(input), version: version + 1 };
    const { affected } = await work.em.update(CaseFile, { id: file.id, version }, next);
    if (affected !== 1) return false;
    Object.assign(file, next);
    await this.changes.commit(work, file, 'case', await this.line(work, actor, file.id));
    return true;
  }

  /** A draft is saved every few seconds: the trail tells once in a quarter of an hour that somebody wrote. */
  private async line(work: Work, actor: Actor, caseId: string) {
    const action = 'case.changed';
    const since = new Date(this.clock.now().getTime() - quarterHourMs);
    const told = await work.em.existsBy(AuditEntry, {
      caseId,
      actorId: actor.id,
      action,
      at: MoreThan(since),
    });
    return told ? [] : [{ actorId: actor.id, action, sentence: 'wrote on the draft' }];
  }

  private today(): string {
    return localDay(this.clock.now(), this.configuration.TIME_ZONE);
  }
}

function refuseFuture(input: NewCase, today: string): void {
  if (input.consent && input.consent.givenOn > today) {
    throw invalid([{ path: 'consent.givenOn', message: 'must not lie in the future' }]);
  }
}
