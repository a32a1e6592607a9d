import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import type { OpenedCase } from '../../cases/case-access.js';
import type { CasePool } from '../pool/case-pool.js';
import { Evidence } from '../pool/evidence.js';
import { JudgementStore } from './judgement-store.js';
import { judgementView, type JudgementView } from './judgement-views.js';
import type { SavedVersion } from './saved-version.js';

/** One person's judgement as it stands, whatever round it was saved in. */
export interface OwnJudgement {
  /** The number of the last version; 0 before the first. */
  version: number;
  ledger: Pick<CasePool, 'candidateSet' | 'candidates' | 'findings'>;
  judgements: Map<string, SavedVersion>;
  view: JudgementView;
}

/** Reads one's own judgement, for one's own eyes. */
@Injectable()
export class OwnJudgements {
  constructor(
    private readonly evidence: Evidence,
    private readonly store: JudgementStore,
  ) {}

  async read(
    file: Pick<OpenedCase['file'], 'id' | 'candidateSet'>,
    personId: string,
    em: EntityManager,
  ): Promise<OwnJudgement> {
    const { candidates, findings } = await this.evidence.read(file.id, em);
    const ledger = { candidateSet: file.candidateSet, candidates, findings };
    const judgements = await this.store.latestOf(file.id, personId, em);
    const version = Math.max(0, ...[...judgements.values()].map((saved) => saved.version));
    return { version, ledger, judgements, view: judgementView(ledger, judgements) };
  }
}
