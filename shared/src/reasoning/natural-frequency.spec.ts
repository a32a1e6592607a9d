import { describe, expect, it } from 'vitest';
import { naturalFrequency } from './natural-frequency.js';

describe('a share in words', () => {
  it.each([
    [0.1749, 17, '17 of 100', '17%'],
    [0.5, 50, '50 of 100', '50%'],
    [0.005, 1, '1 of 100', '1%'],
    [0.0049, 'under 1', 'under 1 of 100', 'under 1%'],
    [0, 'under 1', 'under 1 of 100', 'under 1%'],
    [-1e-17, 'under 1', 'under 1 of 100', 'under 1%'],
    [0.9949, 99, '99 of 100', '99%'],
    [0.996, 'over 99', 'over 99 of 100', 'over 99%'],
    [1, 'over 99', 'over 99 of 100', 'over 99%'],
    [1 + 1e-15, 'over 99', 'over 99 of 100', 'over 99%'],
  ])('%d', (share, outOf100, words, percent) => {
    expect(naturalFrequency(share)).toEqual({ outOf100, words, percent });
  });

  it.each([NaN, -0.1, 1.1, Infinity])('refuses %d', (share) => {
    expect(() => naturalFrequency(share)).toThrow(RangeError);
  });
});
