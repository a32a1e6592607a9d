import type { NaturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';

/** What is drawn of a hundred: whole marks, a part of one where the words say "under 1" or "over 99", empty places. */
export interface Hundred {
  whole: number;
  part: 0 | 1;
  empty: number;
}

/** The picture of the words' own number, so that the two can never say different things; always 100 places. */
export function hundredOf(outOf100: NaturalFrequency['outOf100']): Hundred {
  if (outOf100 === 'under 1') return { whole: 0, part: 1, empty: 99 };
  if (outOf100 === 'over 99') return { whole: 99, part: 1, empty: 0 };
  return { whole: outOf100, part: 0, empty: 100 - outOf100 };
}

/** Where the mark of this number stands, 0 to 99: ten to a row, the first row on top. */
export function placeOf(mark: number): { row: number; column: number } {
  return { row: Math.floor(mark / 10), column: mark % 10 };
}
