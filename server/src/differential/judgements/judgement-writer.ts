import { Injectable } from '@nestjs/common';
import type { Exposure, SavedJudgement } from '@weighhouse/shared/contracts/judgements';
import type { EntityManager } from 'typeorm';
import type { OpenedCase } from '../../cases/case-access.js';
import { CaseChanges } from '../../cases/case-changes.js';
import { AuditLog } from '../../platform/audit-log/audit-log.js';
import { Clock } from '../../platform/clock/clock.js';
import type { Work } from '../../platform/database/unit-of-work.js';
import { Refusal } from '../../platform/errors/refusal.js';
import type { Actor } from '../../platform/http/actor.js';
import { HandInRow } from '../rounds/hand-in.entity.js';
import { RoundReader } from '../rounds/round-reader.js';
import type { RoundRow } from '../rounds/round.entity.js';
import { JudgementDraftRow } from './judgement-draft.entity.js';
import { JudgementStore } from './judgement-store.js';
import type { JudgedValue } from './saved-version.js';

/** A judgement that has been checked. */
export interface CheckedJudgement {
  target: string;
  exposure: Exposure | null;
  reason: string | undefined;
  values: readonly JudgedValue[];
}

/** Writes a version and lets be known what may be known of it: in a live round everything, in a sealed one nothing. */
@Injectable()
export class JudgementWriter {
  constructor(
    private readonly rounds: RoundReader,
    private readonly store: JudgementStore,
    private readonly changes: CaseChanges,
    private readonly audit: AuditLog,
    private readonly clock: Clock,
  ) {}

  /** What was handed in for a sealed round stands as it is; in a live round one goes on. */
  async refuseAfterHandIn(caseId: string, personId: string, em: EntityManager): Promise<void> {
    const round = await this.openRound(caseId, em);
    if (round.kind === 'sealed' && (await em.existsBy(HandInRow, { roundId: round.id, personId }))) {
      throw new Refusal(
        'already-handed-in',
        'You have handed in for this round; your judgement stands until it is unsealed.',
      );
    }
  }

  /** @param file the case's row, locked, so that the next version is free and the round stays what it is */
  async write(
    work: Work,
    file: OpenedCase['file'],
    actor: Actor,
    judgement: CheckedJudgement,
  ): Promise<SavedJudgement> {
    const { em } = work;
    const round = await this.openRound(file.id, em);
    const version = (await this.store.lastVersion(file.id, actor.id, em)) + 1;
    const savedAt = this.clock.now();
    const head = {
      caseId: file.id,
      personId: actor.id,
      roundId: round.id,
      version,
      target: judgement.target,
      candidateSet: file.candidateSet,
      exposure: judgement.exposure,
      reason: judgement.reason ? judgement.reason : null,
      savedAt,
    };
    await this.store.add(em, head, judgement.values);
    await em.delete(JudgementDraftRow, { caseId: file.id, personId: actor.id, target: judgement.target });
    const line = { actorId: actor.id, action: 'judgement.saved', sentence: 'saved a judgement' };
    // In a sealed round not even that somebody saved is told: no revision, no event, a line for the writer alone.
    if (round.kind === 'sealed')
      await this.audit.record(em, { ...line, caseId: file.id, sealedRoundId: round.id });
    else await this.changes.commit(work, file, 'judgements', line);
    return { version, savedAt: savedAt.toISOString(), revision: file.revision };
  }

  private async openRound(caseId: string, em: EntityManager): Promise<RoundRow> {
    const round = await this.rounds.openOf(caseId, em);
    if (!round) throw new Refusal('round-not-open', 'No round is open. The chair opens one.');
    return round;
  }
}
