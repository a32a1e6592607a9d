import { describe, expect, it } from 'vitest';
import { numberTold } from './number-told';

const told = (number: string) =>
  `The best explanation so far is this: X. Think of 100 people with an illness like yours. About ${number} of them would have this. About 38 would have something else.`;

describe('the number that a summary tells', () => {
  it('is the one in the text, also after it was changed', () => {
    expect(numberTold(told('62'))).toEqual({ outOf100: 62, words: 'About 62 of 100 people' });
    expect(numberTold(told('7'))?.outOf100).toBe(7);
  });

  it('is under 1 and over 99 in the words of the template', () => {
    const of = 'Of 100 people with an illness like yours,';
    expect(numberTold(`${of} fewer than 1 would have this.`)?.outOf100).toBe('under 1');
    expect(numberTold(`${of} nearly all would have this.`)?.outOf100).toBe('over 99');
  });

  it('is none where nothing is told, and never 0 or 100', () => {
    for (const text of ['', 'About 62 of them would have this.', told('0'), told('100'), told('sixty')])
      expect(numberTold(text), text).toBeNull();
  });
});
