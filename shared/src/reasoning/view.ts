import { columnEvidence } from './evidence/column-evidence.js';
import type { Pooled } from './pool/pooled-rows.js';
import type { CheckedPanel } from './validation/checked-panel.js';

/** One way to see a panel: the pooled one, one contributor's own, or the pooled one with somebody left out. */
export interface View {
  /** K+1 shares. */
  prior: Float64Array;
  /** All cells, where the findings say. */
  cells: Float64Array;
  /** For each finding, whether its row counts once it is observed. */
  judged: readonly boolean[];
  /** See `columnEvidence`. */
  evidence: Float64Array;
}

export function viewOf(panel: CheckedPanel, prior: Float64Array, { cells, judged }: Pooled): View {
  return { prior, cells, judged, evidence: columnEvidence(panel, cells, judged) };
}

/**
 * The panel as one contributor sees it: their prior and cells, the pooled ones
 * where they gave none; rows that nobody of positive weight judged stay out.
 */
export function ownView(panel: CheckedPanel, contributor: number, pooled: View): View {
  const { prior, cells, exposures } = panel.contributors[contributor]!;
  const own = pooled.cells.slice();
  panel.findings.forEach(({ start, levels }, r) => {
    if (exposures[r] === 0 || !pooled.judged[r]) return;
    const end = start + panel.columns * levels;
    for (let from = start; from < end; from += levels) {
      if (cells[from] === 0) continue;
      for (let place = from; place < from + levels; place += 1) own[place] = cells[place]!;
    }
  });
  return viewOf(panel, prior ? Float64Array.from(prior) : pooled.prior, {
    cells: own,
    judged: pooled.judged,
  });
}
