import { randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { SealedDocument } from '@weighhouse/shared/contracts/rounds';
import { canonicalText, randomLength, sealDigest, toHex } from '@weighhouse/shared/seals/seal';
import type { EntityManager } from 'typeorm';
import { CaseAccess, type OpenedCase } from '../../cases/case-access.js';
import { CaseChanges } from '../../cases/case-changes.js';
import { Clock } from '../../platform/clock/clock.js';
import { UnitOfWork } from '../../platform/database/unit-of-work.js';
import { notFound, notReady, Refusal, stale } from '../../platform/errors/refusal.js';
import type { Actor } from '../../platform/http/actor.js';
import { OwnJudgements } from '../judgements/own-judgements.js';
import { sealedDocument } from '../seals/sealed-document.js';
import { HandInRow } from './hand-in.entity.js';
import { missingToHandIn } from './readiness.js';
import { RoundReader } from './round-reader.js';

/** Takes a contributor's word that their judgement is theirs for the open round, and seals it. */
@Injectable()
export class HandInsService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly changes: CaseChanges,
    private readonly clock: Clock,
    private readonly rounds: RoundReader,
    private readonly own: OwnJudgements,
  ) {}

  /**
   * @throws Refusal 409: `not-ready` naming what is missing, `stale` with one's own judgement, `already-handed-in`,
   * `round-not-open` when the chair was faster
   */
  async handIn(
    actor: Actor,
    roundId: string,
    input: { noMore?: boolean | undefined; version?: number | undefined },
  ): Promise<{ digest: string; handedInAt: string; version: number }> {
    return this.work.run(async (work) => {
      const known = await this.rounds.byId(roundId, work.em);
      if (!known) throw notFound();
      const { file } = await this.access.open(actor, known.caseId, 'judgement.handIn', work.em);
      await this.refuseUnlessOpen(known.id, actor.id, work.em);
      const { version, document } = await this.toHandIn(file, known.id, actor.id, input.version, work.em);
      const missing = missingToHandIn(document, input.noMore === true);
      if (missing.length > 0) throw notReady(missing);
      const random = randomBytes(randomLength);
      const digest = await sealDigest(random, document);
      const handedInAt = this.clock.now();
      await work.em.insert(HandInRow, {
        roundId: known.id,
        personId: actor.id,
        handedInAt,
        version,
        digest,
        random: toHex(random),
        text: canonicalText(document),
      });
      const sentence = `handed in for round ${String(known.number)}`;
      await this.changes.commit(work, file, 'round', {
        actorId: actor.id,
        action: 'round.handedIn',
        sentence,
      });
      return { digest, handedInAt: handedInAt.toISOString(), version };
    });
  }

  /** The case is locked by now, so neither can change any more. */
  private async refuseUnlessOpen(roundId: string, personId: string, em: EntityManager): Promise<void> {
    const round = await this.rounds.byId(roundId, em);
    if (round?.state !== 'open') throw new Refusal('round-not-open', 'This round is over.');
    if (await em.existsBy(HandInRow, { roundId, personId }))
      throw new Refusal('already-handed-in', 'You have handed in for this round.');
  }

  private async toHandIn(
    file: OpenedCase['file'],
    roundId: string,
    personId: string,
    seen: number | undefined,
    em: EntityManager,
  ): Promise<{ version: number; document: SealedDocument }> {
    const { version, ledger, judgements, view } = await this.own.read(file, personId, em);
    if (seen !== undefined && seen !== version) throw stale({ version, ...view });
    const document = sealedDocument({
      caseId: file.id,
      roundId,
      personId,
      candidateSet: file.candidateSet,
      candidateIds: ledger.candidates.map((candidate) => candidate.id),
      findings: ledger.findings.filter((finding) => finding.enteredInError === null),
      judgements,
    });
    return { version, document };
  }
}
