import type { MoreLevelTable } from './more-level-table.js';
import type { RowTable } from './row-table.js';
import type { SetList } from './set-table.js';
import type { TwoLevelTable } from './two-level-table.js';

/*
 * The inner loops: one value per set, nothing allocated, no call inside. Two
 * rows of two levels go through memory together, and three and four levels, the
 * common cases of more than two, have loops without an inner one.
 */

/** Multiplies each set's entry by P'(level | set). */
export function multiplyByRow(entries: Float64Array, list: SetList, row: RowTable): void {
  if (row.kind === 'two') multiplyByTwoLevels(entries, list, row);
  else if (row.others === 2) multiplyByThreeLevels(entries, list, row);
  else if (row.others === 3) multiplyByFourLevels(entries, list, row);
  else multiplyByManyLevels(entries, list, row);
}

/** Writes P'(level | set) for each set of the list. */
export function writeRow(entries: Float64Array, list: SetList, row: RowTable): void {
  entries.fill(1, 0, list.size);
  multiplyByRow(entries, list, row);
}

function multiplyByTwoLevels(entries: Float64Array, { starts, lows }: SetList, table: TwoLevelTable): void {
  const { base, first, second, one, other } = table;
  for (let h = 0; h < base.length; h += 1) {
    const end = starts[h + 1]!;
    const b = base[h]!;
    const f = first[h]!;
    const s = second[h]!;
    for (let p = starts[h]!; p < end; p += 1) {
      const l = lows[p]!;
      entries[p]! *= b + f * one[l]! + s * other[l]!;
    }
  }
}

/** Multiplies each set's entry by P' of two rows of two levels at once. */
export function multiplyByTwoRows(
  entries: Float64Array,
  { starts, lows }: SetList,
  x: TwoLevelTable,
  y: TwoLevelTable,
): void {
  const { one: oneX, other: otherX } = x;
  const { one: oneY, other: otherY } = y;
  for (let h = 0; h < x.base.length; h += 1) {
    const end = starts[h + 1]!;
    const bx = x.base[h]!;
    const fx = x.first[h]!;
    const sx = x.second[h]!;
    const by = y.base[h]!;
    const fy = y.first[h]!;
    const sy = y.second[h]!;
    for (let p = starts[h]!; p < end; p += 1) {
      const l = lows[p]!;
      entries[p]! *= (bx + fx * oneX[l]! + sx * otherX[l]!) * (by + fy * oneY[l]! + sy * otherY[l]!);
    }
  }
}

function multiplyByThreeLevels(
  entries: Float64Array,
  { starts, lows }: SetList,
  table: MoreLevelTable,
): void {
  const { reliability, mixed, low, high } = table;
  for (let h = 0; h + 1 < starts.length; h += 1) {
    const end = starts[h + 1]!;
    const f = high[2 * h]!;
    const s = high[2 * h + 1]!;
    for (let p = starts[h]!; p < end; p += 1) {
      const place = 2 * lows[p]!;
      entries[p]! *= mixed + reliability / (1 + f * low[place]! + s * low[place + 1]!);
    }
  }
}

function multiplyByFourLevels(entries: Float64Array, { starts, lows }: SetList, table: MoreLevelTable): void {
  const { reliability, mixed, low, high } = table;
  for (let h = 0; h + 1 < starts.length; h += 1) {
    const end = starts[h + 1]!;
    const f = high[3 * h]!;
    const s = high[3 * h + 1]!;
    const t = high[3 * h + 2]!;
    for (let p = starts[h]!; p < end; p += 1) {
      const place = 3 * lows[p]!;
      const sum = 1 + f * low[place]! + s * low[place + 1]! + t * low[place + 2]!;
      entries[p]! *= mixed + reliability / sum;
    }
  }
}

function multiplyByManyLevels(entries: Float64Array, { starts, lows }: SetList, table: MoreLevelTable): void {
  const { others, reliability, mixed, low, high } = table;
  for (let h = 0; h + 1 < starts.length; h += 1) {
    const end = starts[h + 1]!;
    const from = h * others;
    for (let p = starts[h]!; p < end; p += 1) {
      const place = lows[p]! * others;
      let sum = 1;
      for (let other = 0; other < others; other += 1) sum += low[place + other]! * high[from + other]!;
      entries[p]! *= mixed + reliability / sum;
    }
  }
}
