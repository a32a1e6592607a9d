/** A share as it is said on a screen: in whole patients of 100, never 0 and never 100. */
export interface NaturalFrequency {
  outOf100: number | 'under 1' | 'over 99';
  /** Such as `17 of 100` or `under 1 of 100`. */
  words: string;
  /** Such as `17%` or `over 99%`. */
  percent: string;
}

/**
 * A share (0 to 1) in natural frequencies, rounded to whole numbers. What would
 * round to 0 or 100 is said as `under 1` or `over 99`: nothing is certain.
 *
 * Source: Gigerenzer & Hoffrage 1995, Psych. Review 102:684-704 (people reason
 * better with counts than with probabilities).
 *
 * @throws RangeError for anything but a number from 0 to 1
 * @example naturalFrequency(0.1749).words // '17 of 100'
 */
export function naturalFrequency(share: number): NaturalFrequency {
  // Shares are sums of many products and may miss their bounds by rounding.
  if (!(share >= -1e-9 && share <= 1 + 1e-9)) throw new RangeError(`not a share: ${share}`);
  const rounded = Math.round(share * 100);
  const outOf100 = rounded < 1 ? 'under 1' : rounded > 99 ? 'over 99' : rounded;
  return { outOf100, words: `${outOf100} of 100`, percent: `${outOf100}%` };
}
