import { Injectable } from '@nestjs/common';
import type { Identity, IdentityInput } from '@weighhouse/shared/contracts/summaries';
import { type EntityManager, MoreThan } from 'typeorm';
import { CaseAccess, type OpenedCase } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { AuditEntry } from '../platform/audit-log/audit-entry.entity.js';
import { AuditLog } from '../platform/audit-log/audit-log.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { invalid, Refusal, stale } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { IdentityBoxes } from './identity-boxes.js';

const hourMs = 3_600_000;

/** Who the patient is, for the case's referrer and liaison alone. Every opening is in the trail. */
@Injectable()
export class IdentityCardsService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly boxes: IdentityBoxes,
    private readonly audit: AuditLog,
    private readonly changes: CaseChanges,
    private readonly clock: Clock,
  ) {}

  /** Somebody of the case whom it is closed to is refused, and that they asked is in the trail. */
  async read(actor: Actor, caseId: string): Promise<Identity> {
    try {
      return await this.work.run(async ({ em }) => {
        const opened = await this.access.open(actor, caseId, 'identity.read', em);
        return this.openCard(em, actor, opened);
      });
    } catch (error) {
      if (error instanceof Refusal && error.id === 'forbidden') await this.recordRefusal(actor, caseId);
      throw error;
    }
  }

  /** @throws Refusal stale with the card as it stands, which is an opening too; invalid */
  async write(actor: Actor, caseId: string, input: IdentityInput): Promise<Identity> {
    const { version, ...card } = input;
    const result = await this.work.run(async (work) => {
      const opened = await this.access.open(actor, caseId, 'identity.write', work.em);
      this.checkBirthDate(card.birthDate);
      if (!(await this.boxes.close(work.em, opened.file.id, actor.id, version, card))) {
        // Not thrown in here: the line of the opening must be committed.
        return { written: false, identity: await this.openCard(work.em, actor, opened) };
      }
      const line = { actorId: actor.id, action: 'identity.written', sentence: 'wrote the identity card' };
      await this.changes.commit(work, opened.file, 'case', line);
      return { written: true, identity: { version: version + 1, card, abilities: abilitiesOf(opened) } };
    });
    if (!result.written) throw stale(result.identity);
    return result.identity;
  }

  private async openCard(em: EntityManager, actor: Actor, opened: OpenedCase): Promise<Identity> {
    const caseId = opened.file.id;
    const known = await this.boxes.open(em, caseId);
    if (known) {
      await this.audit.record(em, {
        caseId,
        actorId: actor.id,
        action: 'identity.opened',
        sentence: 'opened the identity card',
      });
    }
    return { version: known?.version ?? 0, card: known?.card ?? null, abilities: abilitiesOf(opened) };
  }

  /** Once an hour, so that nobody fills the trail by asking on. */
  private async recordRefusal(actor: Actor, caseId: string): Promise<void> {
    const line = { caseId, actorId: actor.id, action: 'identity.refused' };
    const since = new Date(this.clock.now().getTime() - hourMs);
    await this.work.run(async ({ em }) => {
      if (await em.existsBy(AuditEntry, { ...line, at: MoreThan(since) })) return;
      await this.audit.record(em, { ...line, sentence: 'asked for the identity card and was refused' });
    });
  }

  private checkBirthDate(birthDate: string): void {
    if (birthDate > this.clock.now().toISOString().slice(0, 10))
      throw invalid([{ path: 'birthDate', message: 'must not be in the future' }]);
  }
}

const abilitiesOf = ({ abilities }: OpenedCase): string[] =>
  abilities.filter((action) => action.startsWith('identity.'));
