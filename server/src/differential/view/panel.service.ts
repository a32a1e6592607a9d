import { Injectable } from '@nestjs/common';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { PanelRefused } from '@weighhouse/shared/reasoning/assess';
import { CaseAccess } from '../../cases/case-access.js';
import { Refusal, sealedRefusal } from '../../platform/errors/refusal.js';
import type { Actor } from '../../platform/http/actor.js';
import { Assessor } from '../assessing/assessor.js';
import { type CasePool, panelOf, shownRound } from '../pool/case-pool.js';
import { PoolReader } from '../pool/pool-reader.js';
import { Snapshots } from '../pool/snapshots.js';
import { viewOf } from './view-of.js';

/** The panel as a file that anybody can check with the same method outside the application. */
@Injectable()
export class PanelService {
  constructor(
    private readonly access: CaseAccess,
    private readonly snapshots: Snapshots,
    private readonly pools: PoolReader,
    private readonly assessor: Assessor,
  ) {}

  /**
   * The panel of the last round that is shown, exactly as assess() takes it.
   * @throws Refusal 403 `sealed` where there are only sealed numbers, 409 before the first round, 422 `panel-refused`
   */
  async read(actor: Actor, caseId: string): Promise<PanelView> {
    const { parts } = await this.access.open(actor, caseId, 'panel.read');
    const pool = await this.snapshots.run((em) => this.pools.read(caseId, em));
    refuseSealed(pool);
    const panel = panelOf(pool, viewOf(parts));
    await this.refuseUnlessTaken(panel);
    return panel;
  }

  private async refuseUnlessTaken(panel: PanelView): Promise<void> {
    try {
      await this.assessor.ask('standing', panel);
    } catch (error) {
      if (!(error instanceof PanelRefused)) throw error;
      throw new Refusal('panel-refused', 'The method does not take these numbers as they are.', {
        fields: error.errors.map(({ path, message }) => ({ path, message })),
      });
    }
  }
}

function refuseSealed(pool: CasePool): void {
  if (shownRound(pool)) return;
  if (pool.rounds.length > 0) throw sealedRefusal();
  throw new Refusal('wrong-state', 'No round has been opened yet, so there are no numbers to show.');
}
