import { describe, expect, it } from 'vitest';
import { isNoneOfThese, sameName } from './candidate-names.js';

describe('names of candidates', () => {
  it.each([
    ['Lymphoma', 'lymphoma'],
    ['Adult-onset Still’s disease', "adult-onset  still's disease"],
    ['Sjo\u0308gren disease', 'Sjögren disease'],
    [' Sarcoidosis ', 'Sarcoidosis'],
    ['Sarcoid\u200Bosis', 'Sarcoidosis'],
    ['ﬁbrosis', 'fibrosis'],
  ])('takes %j and %j for the same', (one, other) => {
    expect(sameName(one, other)).toBe(true);
  });

  it.each([
    ['Lymphoma', 'Lymphomas'],
    ['Type 1', 'Type 2'],
    ['Sjögren disease', 'Sjogren disease'],
  ])('keeps %j and %j apart', (one, other) => {
    expect(sameName(one, other)).toBe(false);
  });

  it('knows the last column by its name', () => {
    expect(isNoneOfThese('None  of THESE')).toBe(true);
    expect(isNoneOfThese('None of these yet')).toBe(false);
  });
});
