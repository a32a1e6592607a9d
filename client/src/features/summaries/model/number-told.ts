import type { NaturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';

/** A number of 100 people that a paragraph tells the patient. */
export interface NumberTold {
  outOf100: NaturalFrequency['outOf100'];
  words: string;
}

/**
 * The number that a paragraph tells, read from its own words, so that the picture beside it shows what is said also
 * after the liaison has changed the text; null where it tells none, or where the words are others than the template's.
 */
export function numberTold(paragraph: string): NumberTold | null {
  if (!/\b100 people with an illness like yours\b/.test(paragraph)) return null;
  if (/fewer than 1 would have this/i.test(paragraph))
    return { outOf100: 'under 1', words: 'Fewer than 1 of 100 people' };
  if (/nearly all would have this/i.test(paragraph))
    return { outOf100: 'over 99', words: 'Nearly all of 100 people' };
  const told = Number(/\babout (\d{1,2}) of them would have this/i.exec(paragraph)?.[1] ?? 0);
  return told >= 1 ? { outOf100: told, words: `About ${String(told)} of 100 people` } : null;
}
