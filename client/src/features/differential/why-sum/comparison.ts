/** What a candidate's standing is held against: another column, or everything else. */
export type Against = number | 'rest';

/** Decibans of odds: 10 are odds of ten to one, 3 about two to one, 0 even (Good 1950). */
export const decibansOf = (odds: number): number => 10 * Math.log10(odds);

/** How many times as likely a push of so many decibans makes it. */
export const factorOf = (decibans: number): number => 10 ** (decibans / 10);

/**
 * The odds of a column in a standing. Against the rest they are its share to what is left of one; the other columns'
 * sum is taken for it under one cause, where 1 less the share would lose its digits near one.
 * @param shares K+1 of them; under one cause they sum to one
 */
export function oddsOf(
  shares: readonly number[],
  column: number,
  against: Against,
  oneCause: boolean,
): number {
  const share = shares[column] ?? 0;
  if (against !== 'rest') return share / (shares[against] ?? 0);
  if (!oneCause) return share / (1 - share);
  return share / shares.reduce((sum, other, index) => (index === column ? sum : sum + other), 0);
}

/** The column with the largest share beside this one: what a reader weighs it against. */
export function runnerUp(shares: readonly number[], column: number): number {
  let best = column === 0 ? 1 : 0;
  shares.forEach((share, index) => {
    if (index !== column && share > (shares[best] ?? 0)) best = index;
  });
  return best;
}
