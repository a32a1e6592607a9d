import { Injectable } from '@nestjs/common';
import { candidateSetSchema } from '@weighhouse/shared/contracts/findings';
import type { JudgeFinding, JudgePrior, SavedJudgement } from '@weighhouse/shared/contracts/judgements';
import { CaseAccess, type OpenedCase } from '../../cases/case-access.js';
import { UnitOfWork, type Work } from '../../platform/database/unit-of-work.js';
import { invalid, notFound, Refusal, stale } from '../../platform/errors/refusal.js';
import type { Actor } from '../../platform/http/actor.js';
import { columnsOf } from '../pool/panel-builder.js';
import { type Checked, checkPrior, checkRow } from './check-judgement.js';
import type { Ledger } from './judgement-views.js';
import { JudgementWriter } from './judgement-writer.js';
import { type OwnJudgement, OwnJudgements } from './own-judgements.js';
import { priorTarget } from './saved-version.js';

/** Saves a contributor's prior and likelihoods, each save a version. */
@Injectable()
export class JudgementsService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly own: OwnJudgements,
    private readonly writer: JudgementWriter,
  ) {}

  /**
   * @throws Refusal 409 `stale` with the candidate set in force, or with one's own judgement as it stands now
   * @throws Refusal 409 `already-handed-in` in a sealed round, 400 naming every fault
   */
  async savePrior(actor: Actor, caseId: string, input: JudgePrior): Promise<SavedJudgement> {
    return this.work.run(async (work) => {
      const opened = await this.access.open(actor, caseId, 'judgement.give', work.em);
      const ledger = await this.ledgerOf(work, opened, actor, input);
      const { values } = sound(checkPrior(input.outOf100, columnsOf(idsOf(ledger))));
      const judgement = { target: priorTarget, exposure: null, reason: input.reason, values };
      return this.writer.write(work, opened.file, actor, judgement);
    });
  }

  /**
   * Saves one row; every cell blank takes the row's judgement back.
   * @throws Refusal as savePrior, and 404 for a finding of another case
   */
  async saveRow(
    actor: Actor,
    caseId: string,
    findingId: string,
    input: JudgeFinding,
  ): Promise<SavedJudgement> {
    return this.work.run(async (work) => {
      const opened = await this.access.open(actor, caseId, 'judgement.give', work.em);
      const ledger = await this.ledgerOf(work, opened, actor, input);
      const finding = ledger.findings.find((one) => one.id === findingId);
      if (!finding) throw notFound();
      if (finding.enteredInError)
        throw new Refusal('wrong-state', 'This finding was entered in error and counts nowhere.');
      const { values } = sound(
        checkRow(input.outOf100, columnsOf(idsOf(ledger)), finding.levelLabels.length),
      );
      const exposure = values.length > 0 ? (input.exposure ?? null) : null;
      const judgement = { target: findingId, exposure, reason: input.reason, values };
      return this.writer.write(work, opened.file, actor, judgement);
    });
  }

  /** The columns and rows to judge over, once the writer is seen to know the present ones. */
  private async ledgerOf(
    { em }: Work,
    { file }: OpenedCase,
    actor: Actor,
    input: { candidateSet: number; version?: number | undefined },
  ): Promise<OwnJudgement['ledger']> {
    await this.writer.refuseAfterHandIn(file.id, actor.id, em);
    const { version, ledger, view } = await this.own.read(file, actor.id, em);
    const { candidateSet, candidates } = ledger;
    if (input.candidateSet !== candidateSet)
      throw stale(candidateSetSchema.parse({ candidateSet, items: candidates }));
    if (input.version !== undefined && input.version !== version) throw stale({ version, ...view });
    return ledger;
  }
}

const idsOf = (ledger: Ledger): string[] => ledger.candidates.map((candidate) => candidate.id);

function sound(checked: Checked): Checked {
  if (checked.faults.length > 0) throw invalid(checked.faults);
  return checked;
}
