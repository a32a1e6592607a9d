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
  const exponent = exponents.rows[finding]!;
  const power = asked.power(exponent);
  /** For the supports it is already divided out of, the most that dividing can have added to a set. */
  const gains = new Map<Support, number>();

  function divideOut(support: Support): number {
    const { shares, work, divided } = support;
    const row = asked.row(view, finding);
    writeRow(work, support, row);
    power.raise(work);
    for (let p = 0; p < work.length; p += 1) divided[p] = shares[p]! / work[p]!;
    const gain = row.least ** -exponent;
    gains.set(support, gain);
    return gain;
  }

  return (support: Support, other: View): Bounded<number> => {
    const gain = gains.get(support) ?? divideOut(support);
    const { work, divided } = support;
    writeRow(work, support, asked.row(other, finding));
    power.raise(work);
    const { total, held } = sums(divided, work, membership(table, support, column));
    // P' is at most 1, so multiplying the other row in adds nothing to what is aside.
    return { value: held / total, missed: (support.aside * gain) / total };
  };
}

/** Σ shares × factors, over all sets and over those that hold. */
function sums(
  shares: Float64Array,
  factors: Float64Array,
  holds: Float64Array,
): { total: number; held: number } {
  let total = 0;
  let held = 0;
  for (let p = 0; p < shares.length; p += 1) {
    const share = shares[p]! * factors[p]!;
    total += share;
    held += share * holds[p]!;
  }
  return { total, held };
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
