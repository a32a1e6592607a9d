import { Injectable } from '@nestjs/common';
import type { Round } from '@weighhouse/shared/contracts/rounds';
import { CaseAccess } from '../../cases/case-access.js';
import type { Actor } from '../../platform/http/actor.js';
import { RoundReader } from './round-reader.js';
import { RoundViews } from './round-views.js';

/** Lists a case's rounds. */
@Injectable()
export class RoundsService {
  constructor(
    private readonly access: CaseAccess,
    private readonly rounds: RoundReader,
    private readonly views: RoundViews,
  ) {}

  /** First to last. */
  async list(actor: Actor, caseId: string): Promise<{ items: Round[] }> {
    await this.access.open(actor, caseId, 'round.read');
    return { items: await this.views.of(caseId, await this.rounds.ofCase(caseId)) };
  }
}
