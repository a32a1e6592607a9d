import type { PanelView } from '@weighhouse/shared/contracts/differential';
import type { Asked } from './computations.js';

/** Sets of candidates that are counted at most; see the method. */
const mostSets = 2 ** 16;

/**
 * Milliseconds for each set (or column), row and contributor, rounded up from the medians that
 * `npm run bench:reasoning` gave on one idle core: may coexist, K 12, 40 rows, 12 contributors 20 ms for all and
 * K 16, 60 rows, 12 contributors 400 ms, so 8 to 10 millionths; its standing alone 15 ms, 4 millionths for each set
 * and row; one cause, K 12, 40 rows, 12 contributors 1.2 ms, 0.2 thousandths.
 */
const msFor = { setsWhole: 1e-5, setsStanding: 4e-6, columnsWhole: 2e-4, columnsStanding: 2e-5 };

/** About how long a panel keeps one idle core busy, in milliseconds. */
export function costMs(panel: PanelView, asked: Asked): number {
  const rows = panel.findings.length;
  const people = Math.max(1, panel.contributors.length);
  const columns = panel.candidates.length + 1;
  const oneCause = columns * rows * people;
  if (asked === 'standing' && panel.coexistence === 0) return oneCause * msFor.columnsStanding;
  if (panel.coexistence === 0) return oneCause * msFor.columnsWhole;
  const sets = Math.min(mostSets, 2 ** panel.candidates.length) * rows;
  if (asked === 'whole') return sets * people * msFor.setsWhole;
  const standing = sets * msFor.setsStanding + oneCause * msFor.columnsStanding;
  return asked === 'standing' ? standing : standing + oneCause * msFor.columnsWhole;
}

/**
 * From here on a panel is computed beside the event loop: what takes longer would hold up everybody's answers by a
 * noticeable part of a drawn frame or more, while the way to a thread and back costs well under a millisecond.
 */
export const heavyMs = 10;

export const isHeavy = (panel: PanelView, asked: Asked): boolean => costMs(panel, asked) > heavyMs;
