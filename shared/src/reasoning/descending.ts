/**
 * The entries by falling value. Values within `tolerance` of the first of their
 * run count as equal and keep the order they came in, so that rounding does not
 * decide which comes first.
 *
 * @example descending(['a', 'b', 'c'], (name) => (name === 'c' ? 2 : 1)) // ['c', 'a', 'b']
 */
export function descending<Entry>(
  entries: readonly Entry[],
  valueOf: (entry: Entry) => number,
  tolerance = 1e-12,
): Entry[] {
  const waiting = entries
    .map((entry, position) => ({ entry, position, value: valueOf(entry) }))
    .sort((one, other) => other.value - one.value);
  const ordered: Entry[] = [];
  for (let start = 0; start < waiting.length;) {
    const least = waiting[start]!.value - tolerance;
    let end = start + 1;
    while (end < waiting.length && waiting[end]!.value >= least) end += 1;
    const run = waiting.slice(start, end).sort((one, other) => one.position - other.position);
    for (const { entry } of run) ordered.push(entry);
    start = end;
  }
  return ordered;
}
