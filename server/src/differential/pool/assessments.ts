import { Injectable, Logger } from '@nestjs/common';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { assess, type Assessment, PanelRefused } from '@weighhouse/shared/reasoning/assess';
import { type CasePool, panelOf, type PoolView } from './case-pool.js';
import { canBePooled } from './panel-builder.js';

const most = 200;

/**
 * Assessments by case revision. The pool is always computed anew from the judgements, never patched; a revision's
 * result is kept, because what may be seen changes only with the revision.
 */
@Injectable()
export class Assessments {
  private readonly logger = new Logger(Assessments.name);
  private readonly kept = new Map<string, Assessment | null>();

  /** The assessment of what may be seen; null where there is nothing to pool. */
  of(pool: CasePool, view: PoolView): Assessment | null {
    const key = `${pool.caseId} ${String(pool.revision)} ${view}`;
    const known = this.kept.get(key);
    const assessment = known === undefined ? this.compute(panelOf(pool, view)) : known;
    // The one used last goes to the end; the one unused for longest is forgotten first.
    this.kept.delete(key);
    this.kept.set(key, assessment);
    const oldest = this.kept.keys().next();
    if (this.kept.size > most && oldest.done !== true) this.kept.delete(oldest.value);
    return assessment;
  }

  /** Computes without keeping, for what is not committed yet. */
  compute(panel: PanelView): Assessment | null {
    return canBePooled(panel) ? this.unlessRefused(() => assess(panel)) : null;
  }

  /** Where one person stands alone; null before they said anything. */
  standingAlone(panel: PanelView): number[] | null {
    if (!canBePooled(panel)) return null;
    return this.unlessRefused(() => assess(panel, { only: 'standing' }).standing);
  }

  private unlessRefused<T>(compute: () => T): T | null {
    try {
      return compute();
    } catch (error) {
      if (!(error instanceof PanelRefused)) throw error;
      // Paths say where the fault is and carry nobody's numbers.
      this.logger.warn(`a panel was refused: ${error.errors.map(({ path }) => path).join(', ')}`);
      return null;
    }
  }
}
