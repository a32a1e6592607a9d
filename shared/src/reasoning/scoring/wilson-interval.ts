/** The standard normal deviate that leaves 2.5% on either side. */
const deviate = 1.959963984540054;

/**
 * 95% interval for a share seen as `successes` of `trials`.
 *
 * Source: Wilson 1927, J. Am. Statist. Assoc. 22:209-212.
 *
 * @throws RangeError unless 0 ≤ successes ≤ trials and trials > 0
 * @example wilsonInterval(0, 10) // { low: 0, high: 0.2775… }
 */
export function wilsonInterval(successes: number, trials: number): { low: number; high: number } {
  if (!(trials > 0 && successes >= 0 && successes <= trials)) {
    throw new RangeError(`${successes} of ${trials} is not a count`);
  }
  const share = successes / trials;
  const squared = deviate ** 2;
  const middle = (share + squared / (2 * trials)) / (1 + squared / trials);
  const half =
    (deviate / (1 + squared / trials)) *
    Math.sqrt((share * (1 - share)) / trials + squared / (4 * trials ** 2));
  // At 0 and at all of them the bound is exactly 0 and 1; rounding would miss it.
  return { low: successes === 0 ? 0 : middle - half, high: successes === trials ? 1 : middle + half };
}
