import { Injectable } from '@nestjs/common';
import type { AgendaItem, PutOnAgenda } from '@weighhouse/shared/contracts/differential';
import type { EntityManager } from 'typeorm';
import { CaseAccess } from '../../cases/case-access.js';
import { CaseChanges } from '../../cases/case-changes.js';
import { FindingsService } from '../../findings/findings.service.js';
import { Clock } from '../../platform/clock/clock.js';
import { UnitOfWork } from '../../platform/database/unit-of-work.js';
import { notFound, Refusal, stale } from '../../platform/errors/refusal.js';
import type { Actor } from '../../platform/http/actor.js';
import { AgendaItemRow } from './agenda-item.entity.js';
import { AgendaReader } from './agenda-reader.js';

/** The chair's agenda: which rows are discussed first, and why. */
@Injectable()
export class AgendaService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly changes: CaseChanges,
    private readonly clock: Clock,
    private readonly findings: FindingsService,
    private readonly agenda: AgendaReader,
  ) {}

  /**
   * Puts a finding on the agenda, or changes its note.
   * @throws Refusal 404 for a finding that is not of this case, 409 `wrong-state` for one entered in error, 409
   *   `stale` with the item as it stands (null where it is not on the agenda) when somebody was faster
   */
  async put(
    actor: Actor,
    caseId: string,
    findingId: string,
    { note, version }: PutOnAgenda,
  ): Promise<AgendaItem> {
    return this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'agenda.change', work.em);
      await this.refuseFinding(caseId, findingId, work.em);
      const known = await this.known(findingId, version, work.em);
      const next = { note, version: file.revision + 1 };
      if (known) await work.em.update(AgendaItemRow, { findingId }, next);
      else {
        const added = { addedById: actor.id, addedAt: this.clock.now() };
        await work.em.insert(AgendaItemRow, { findingId, caseId, ...next, ...added });
      }
      const line = known
        ? { action: 'agenda.noteChanged', sentence: 'changed a note on the agenda' }
        : { action: 'agenda.added', sentence: 'put a finding on the agenda' };
      await this.changes.commit(work, file, 'agenda', { actorId: actor.id, ...line });
      const item = await this.agenda.one(findingId, work.em);
      if (!item) throw new TypeError('what was written is there');
      return item;
    });
  }

  /** @throws Refusal 404 where it is not on the agenda of this case, 409 `stale` when its note was changed meanwhile */
  async takeOff(actor: Actor, caseId: string, findingId: string, version: number | undefined): Promise<void> {
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'agenda.change', work.em);
      if (!(await work.em.existsBy(AgendaItemRow, { findingId, caseId }))) throw notFound();
      await this.known(findingId, version, work.em);
      await work.em.delete(AgendaItemRow, { findingId });
      const line = { action: 'agenda.takenOff', sentence: 'took a finding off the agenda' };
      await this.changes.commit(work, file, 'agenda', { actorId: actor.id, ...line });
    });
  }

  /** The item as the writer saw it: the case's row is locked, so that it stays so. Without a version, as it is. */
  private async known(
    findingId: string,
    version: number | undefined,
    em: EntityManager,
  ): Promise<AgendaItem | null> {
    const item = await this.agenda.one(findingId, em);
    if (version !== undefined && version !== (item?.version ?? 0)) throw stale(item);
    return item;
  }

  private async refuseFinding(caseId: string, findingId: string, em: EntityManager): Promise<void> {
    const finding = await this.findings.byId(findingId, em);
    if (finding?.caseId !== caseId) throw notFound();
    if (finding.enteredInError !== null)
      throw new Refusal('wrong-state', 'This finding has been entered in error and is not discussed.');
  }
}
