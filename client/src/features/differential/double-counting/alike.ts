/**
 * When two findings push nearly the same way. The weights of evidence of a row stand against its mean, so the cosine
 * of two rows is Pearson's correlation over the columns. No published threshold exists; these are ours:
 * nearly the same beams from 0.95 on, the same way from 0.5 on, and neither is asked of a row that moves less than one
 * deciban between the column it helps most and the one it helps least, nor of fewer than four columns, over which two
 * unrelated rows are often alike by chance.
 */
export const nearlySame = 0.95;
export const sameWay = 0.5;
const notable = 1;
const leastColumns = 4;

/** Whether a row's beams are long enough and many enough to be compared. */
export const isNotable = (decibans: readonly number[]): boolean =>
  decibans.length >= leastColumns && Math.max(...decibans) - Math.min(...decibans) >= notable;

/** -1 (opposite) to 1 (the same beams but for their length); 0 where one of them has none. */
export function alikeness(one: readonly number[], other: readonly number[]): number {
  const product = (left: readonly number[], right: readonly number[]) =>
    left.reduce((sum, value, index) => sum + value * (right[index] ?? 0), 0);
  const lengths = Math.sqrt(product(one, one) * product(other, other));
  return lengths > 0 ? product(one, other) / lengths : 0;
}

/** Puts together what is linked, directly or through others; what is linked to nothing is left out. Order is kept. */
export function clusters<Item>(
  items: readonly Item[],
  linked: (one: Item, other: Item) => boolean,
): Item[][] {
  const left = new Set(items);
  const found: Item[][] = [];
  for (const first of items) {
    if (!left.delete(first)) continue;
    const cluster = [first];
    for (const member of cluster) {
      for (const other of [...left]) {
        if (!linked(member, other)) continue;
        left.delete(other);
        cluster.push(other);
      }
    }
    if (cluster.length > 1) found.push(items.filter((item) => cluster.includes(item)));
  }
  return found;
}
