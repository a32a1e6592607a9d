import { Injectable, Logger } from '@nestjs/common';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { type Assessment, PanelRefused, type StandingOnly } from '@weighhouse/shared/reasoning/assess';
import { Assessor } from '../assessing/assessor.js';
import type { Answers, Asked, Leading } from '../assessing/computations.js';
import { isHeavy } from '../assessing/cost.js';
import { type CasePool, keysOf, panelOf, type PoolView } from './case-pool.js';
import { KeptPromises } from './kept-promises.js';
import { canBePooled } from './panel-builder.js';
import { withKeys } from './with-keys.js';

const most = 200;

/**
 * Assessments by case revision. The pool is always computed anew from the judgements, never patched; a revision's
 * result is kept, because what may be seen changes only with the revision. Each is computed once, under the
 * contributors' own ids; where those may not be seen they are replaced afterwards.
 */
@Injectable()
export class Assessments {
  private readonly logger = new Logger(Assessments.name);
  private readonly wholes = new KeptPromises<Assessment | null>(most);
  private readonly standings = new KeptPromises<StandingOnly | null>(most);

  constructor(private readonly assessor: Assessor) {}

  /** The assessment of what may be seen; null where there is nothing to pool. */
  async of(pool: CasePool, view: PoolView): Promise<Assessment | null> {
    const assessment = await this.wholes.of(keyOf(pool), () =>
      this.unlessRefused('whole', panelOf(pool, 'named')),
    );
    return assessment && view === 'anonymous' ? withKeys(assessment, keysOf(pool, view)) : assessment;
  }

  /** The standing of what may be seen, which takes far less; null where there is nothing to pool. */
  standingOf(pool: CasePool): Promise<StandingOnly | null> {
    return this.standings.of(keyOf(pool), () => this.unlessRefused('standing', panelOf(pool, 'named')));
  }

  /** Whether the whole takes so long that it follows the standing by itself. */
  follows(pool: CasePool): boolean {
    return isHeavy(panelOf(pool, 'named'), 'whole');
  }

  /** What lists show, of what is not committed yet and therefore not kept. */
  leading(panel: PanelView): Promise<Leading | null> {
    return this.unlessRefused('leading', panel);
  }

  /** Where one person stands alone, or a pool that is not committed yet; null before anything was said. */
  standing(panel: PanelView): Promise<StandingOnly | null> {
    return this.unlessRefused('standing', panel);
  }

  private async unlessRefused<K extends Asked>(asked: K, panel: PanelView): Promise<Answers[K] | null> {
    if (!canBePooled(panel)) return null;
    try {
      return await this.assessor.ask(asked, panel);
    } catch (error) {
      if (!(error instanceof PanelRefused)) throw error;
      // Paths say where the fault is and carry nobody's numbers.
      this.logger.warn(`a panel was refused: ${error.errors.map(({ path }) => path).join(', ')}`);
      return null;
    }
  }
}

const keyOf = (pool: CasePool): string => `${pool.caseId} ${String(pool.revision)}`;
