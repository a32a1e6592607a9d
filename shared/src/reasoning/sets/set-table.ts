/** No more sets than this are counted; up to 16 candidates that is all of them. */
export const mostSets = 2 ** 16;

/**
 * A list of sets, each a pair of a high and a low half: the sets of the high
 * half h are those from `starts[h]` to `starts[h + 1]`, and `lows` says the low
 * half of each. What is known of the halves combines to what is asked of the
 * sets, so the work per set is a few multiplications on small tables.
 */
export interface SetList {
  starts: Int32Array;
  lows: Uint16Array;
  size: number;
}

/** The subsets of one half of the candidates, by size. */
export interface Half {
  /** First of its candidates, and how many. */
  from: number;
  count: number;
  /** For each subset its members as bits, candidate `from` being bit 0. */
  members: Int32Array;
  /** For each subset but the empty one (which is first) the subset without its highest member, and that member. */
  parents: Int32Array;
  added: Int32Array;
}

/** All sets that are counted; the empty set is the first of them. */
export interface SetTable extends SetList {
  candidates: number;
  /** Number of members of the largest sets. */
  largest: number;
  low: Half;
  high: Half;
}

/** The largest size that keeps the number of sets within `mostSets`. */
export function largestCounted(candidates: number): number {
  let size = 0;
  let count = 1;
  let ofSize = 1;
  while (size < candidates) {
    ofSize = (ofSize * (candidates - size)) / (size + 1);
    if (count + ofSize > mostSets) break;
    count += ofSize;
    size += 1;
  }
  return size;
}

const tables = new Map<number, SetTable>();

/** The counted sets of 1 to 30 candidates; made once for each number of them. */
export function setTable(candidates: number): SetTable {
  const known = tables.get(candidates);
  if (known) return known;
  const largest = largestCounted(candidates);
  const lowCount = candidates >> 1;
  const low = half(0, lowCount, largest);
  const high = half(lowCount, candidates - lowCount, largest);
  // The low halves are sorted by size, so those that fit a high half are a first part of them.
  const fitting = [...high.members].map((members) => {
    const room = largest - sizeOf(members);
    const tooLarge = low.members.findIndex((subset) => sizeOf(subset) > room);
    return tooLarge < 0 ? low.members.length : tooLarge;
  });
  const starts = new Int32Array(fitting.length + 1);
  fitting.forEach((count, h) => (starts[h + 1] = starts[h]! + count));
  const size = starts[fitting.length]!;
  const lows = new Uint16Array(size);
  fitting.forEach((count, h) => {
    for (let l = 0; l < count; l += 1) lows[starts[h]! + l] = l;
  });
  const table = { candidates, largest, low, high, starts, lows, size };
  tables.set(candidates, table);
  return table;
}

/** Number of members of a subset given as bits. */
export function sizeOf(members: number): number {
  let size = 0;
  for (let rest = members; rest !== 0; rest &= rest - 1) size += 1;
  return size;
}

function half(from: number, count: number, largest: number): Half {
  const subsets = Array.from({ length: 2 ** count }, (_, members) => members)
    .filter((members) => sizeOf(members) <= largest)
    .sort((one, other) => sizeOf(one) - sizeOf(other) || one - other);
  const positions = new Map(subsets.map((members, index) => [members, index]));
  const highest = subsets.map((members) => 31 - Math.clz32(members));
  return {
    from,
    count,
    members: Int32Array.from(subsets),
    parents: Int32Array.from(
      subsets,
      (members, index) => positions.get(members ^ (1 << highest[index]!)) ?? 0,
    ),
    added: Int32Array.from(highest, (bit) => from + bit),
  };
}
