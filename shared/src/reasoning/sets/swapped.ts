import type { View } from '../view.js';
import type { Asked, Bounded } from './asked.js';
import { writeRow } from './row-kernels.js';
import type { SetTable } from './set-table.js';
import type { Support } from './significant.js';

/**
 * What one column's standing would be if a row took other cells than the
 * pooled ones. The pooled row is divided out of the posterior once and the
 * others are multiplied in.
 */
export function swapping(asked: Asked, finding: number, column: number) {
  const { table, view, exponents } = asked.posterior;
  const power = asked.power(exponents.rows[finding]!);
  /** The supports the row is already divided out of, with the least that P' of the pooled row is. */
  const divided = new Map<Support, number>();

  function divideOut(support: Support): number {
    const { shares, work, divided: target } = support;
    const row = asked.row(view, finding);
    writeRow(work, support, row);
    for (let p = 0; p < work.length; p += 1) target[p] = shares[p]! / power.of(work[p]!);
    divided.set(support, row.least);
    return row.least;
  }

  return (support: Support, other: View): Bounded<number> => {
    const least = divided.get(support) ?? divideOut(support);
    const holds = membership(table, support, column);
    const { work, divided: shares } = support;
    writeRow(work, support, asked.row(other, finding));
    let total = 0;
    let held = 0;
    for (let p = 0; p < work.length; p += 1) {
      const share = shares[p]! * power.of(work[p]!);
      total += share;
      held += share * holds[p]!;
    }
    // P' is at most 1, so no set left aside can have gained more than the pooled row took.
    return { value: held / total, missed: support.aside / power.of(least) / total };
  };
}

/** For each set 1 where the column is the case in it, otherwise 0; worked out once for each support and column. */
function membership(table: SetTable, support: Support, column: number): Float64Array {
  const known = support.holds.get(column);
  if (known) return known;
  const holds = new Float64Array(support.size);
  if (column === table.candidates) holds[0] = 1;
  else {
    const inLow = column < table.high.from;
    const bit = 1 << (inLow ? column : column - table.high.from);
    for (let h = 0; h < table.high.members.length; h += 1) {
      for (let p = support.starts[h]!; p < support.starts[h + 1]!; p += 1) {
        const members = inLow ? table.low.members[support.lows[p]!]! : table.high.members[h]!;
        holds[p] = (members & bit) === 0 ? 0 : 1;
      }
    }
  }
  support.holds.set(column, holds);
  return holds;
}
