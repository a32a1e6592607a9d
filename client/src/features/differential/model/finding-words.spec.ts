import { describe, expect, it } from 'vitest';
import { makeFinding } from '../testing/make-differential';
import { shownWords } from './cell-words';
import { askedWords, isPresence } from './finding-words';

const finding = makeFinding();
const presence = { levelLabels: ['absent', 'present'] };
const twoBands = { levelLabels: ['Above 20 %', '20 % or lower'] };
const threeBands = { levelLabels: ['none', 'few', 'many'] };

describe('what one number of a cell counts', () => {
  it('is the finding itself where it is absent or present', () => {
    expect(isPresence({ levelLabels: [] })).toBe(true);
    expect(askedWords(presence)).toBe('would show this');
    expect(shownWords({ ...finding, ...presence }, 0)).toBe('would not show this');
  });
  it('is the second of two levels by its name, so that nobody has to guess which is meant', () => {
    expect(isPresence(twoBands)).toBe(false);
    expect(askedWords(twoBands)).toBe('would have “20 % or lower”');
    expect(shownWords({ ...finding, ...twoBands }, 0)).toBe('would have “Above 20 %”');
  });
  it('is each of more levels', () => {
    expect(askedWords(threeBands)).toBe('would have each');
    expect(isPresence({ levelLabels: ['present', 'absent'] })).toBe(false);
  });
});
