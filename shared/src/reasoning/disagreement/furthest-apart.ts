import type { FurthestApart } from '../assessment.js';
import type { CheckedPanel } from '../validation/checked-panel.js';

/** Gaps closer than this are the same. */
const equalGap = 1e-12;

/**
 * The column on which two contributors of positive weight are furthest apart in
 * P(present), the first of equal ones; of a finding of more levels, in the
 * probability of the observed level or, while it is pending, of the level where
 * the gap is widest. Null where no column was judged by two.
 */
export function furthestApart(
  { columns, findings, contributors }: CheckedPanel,
  finding: number,
): FurthestApart | null {
  const { start, levels, observed } = findings[finding]!;
  const only = levels === 2 ? 1 : observed;
  let found = { gap: -1, column: 0, low: 0, high: 0, place: 0 };
  for (let column = 0; column < columns; column += 1) {
    const from = start + column * levels;
    for (let level = only ?? 0; level < (only === null ? levels : only + 1); level += 1) {
      const place = from + level;
      let low = -1;
      let high = -1;
      for (let j = 0; j < contributors.length; j += 1) {
        const { weight, cells } = contributors[j]!;
        if (weight === 0 || cells[from] === 0) continue;
        if (low < 0) low = j;
        else if (cells[place]! < contributors[low]!.cells[place]!) {
          // Whoever was lowest may be the highest, and of equal ones the first counts.
          if (high < 0 || contributors[low]!.cells[place]! >= contributors[high]!.cells[place]!) high = low;
          low = j;
        } else if (high < 0 || cells[place]! > contributors[high]!.cells[place]!) high = j;
      }
      if (high < 0) continue;
      const gap = contributors[high]!.cells[place]! - contributors[low]!.cells[place]!;
      if (gap > found.gap + equalGap) found = { gap, column, low, high, place };
    }
  }
  if (found.gap < 0) return null;
  const named = (j: number) => ({
    contributor: contributors[j]!.id,
    p: contributors[j]!.cells[found.place]!,
  });
  return { column: found.column, low: named(found.low), high: named(found.high) };
}
