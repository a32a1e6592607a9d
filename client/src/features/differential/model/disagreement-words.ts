/**
 * How far the contributors are apart, in words. The measure is the weighted Jensen-Shannon divergence of where each
 * stands alone, in bits (Lin 1991): 0 where all stand alike, at most log2 of the number of people. The steps in words
 * are ours; no published thresholds exist.
 */
export function disagreementWords(bits: number, people: number): string {
  if (people < 2) return 'One contributor: there is nobody to disagree with.';
  const most = Math.log2(people);
  const share = bits / most;
  const words =
    share < 0.03 ? 'hardly apart' : share < 0.1 ? 'a little apart' : share < 0.25 ? 'apart' : 'far apart';
  return `The contributors are ${words}: ${bits.toFixed(2)} of at most ${most.toFixed(1)} bits of disagreement.`;
}
