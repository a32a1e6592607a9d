import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';

type Parts = Pick<AssessmentView, 'standing' | 'without'>;

const number = (share: number) => String(naturalFrequency(share).outOf100);

/** Lowest and highest share of a column as is, without each opinion, and without each finding. */
export function leftOutRange({ standing, without }: Parts, column: number): { low: number; high: number } {
  const shares = [
    standing,
    ...Object.values(without.contributors),
    ...Object.values(without.findings),
  ].flatMap((one) => one?.[column] ?? []);
  return { low: Math.min(...shares), high: Math.max(...shares) };
}

/**
 * How firm a column's standing is: "61, between 48 and 70 when one opinion or one finding is left out, and up to 93 if
 * every finding counted in full". "0 of 100" is never said; where both ends read alike, so does the sentence.
 * @param inFull the column's standing without tempering; null where it is not known or nothing is tempered
 */
export function rangeSentence(parts: Parts, column: number, inFull: number | null): string {
  const share = parts.standing[column] ?? 0;
  const { low, high } = leftOutRange(parts, column);
  const between =
    number(low) === number(high)
      ? `${number(share)}, whichever opinion or finding is left out`
      : `${number(share)}, between ${number(low)} and ${number(high)} when one opinion or one finding is left out`;
  if (inFull === null) return between;
  const way =
    number(inFull) === number(share)
      ? 'just so'
      : inFull > share
        ? `up to ${number(inFull)}`
        : `down to ${number(inFull)}`;
  return `${between}, and ${way} if every finding counted in full`;
}
