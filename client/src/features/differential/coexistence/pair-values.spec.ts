import { describe, expect, it } from 'vitest';
import { pairSentence, readCoexistence, valuesOfPair, withoutPair, withPair } from './pair-values';

const pair = { a: 'lymphoma', b: 'tb', times: 3, reason: 'Immune suppression' };
const values = { a: 'still', b: 'tb', times: '0,5', reason: ' Seldom seen together ' };
const paths = (faults: { path: string }[]) => faults.map(({ path }) => path);

describe('pairs that go together', () => {
  it('adds one to the list, with its reason trimmed and a comma read as a point', () => {
    expect(withPair([pair], values, null)).toEqual({
      faults: [],
      together: [pair, { a: 'still', b: 'tb', times: 0.5, reason: 'Seldom seen together' }],
    });
  });

  it('changes one in place of the old', () => {
    const changed = { ...valuesOfPair(pair), times: '4' };
    expect(withPair([pair], changed, pair)).toEqual({ faults: [], together: [{ ...pair, times: 4 }] });
  });

  it('refuses the same pair again, the other way round too, and a candidate with itself', () => {
    const again = { ...values, a: 'tb', b: 'lymphoma' };
    expect(paths(withPair([pair], again, null).faults)).toEqual(['pair.b']);
    expect(paths(withPair([], { ...values, b: 'still' }, null).faults)).toEqual(['pair.b']);
  });

  it('names every fault', () => {
    const faults = withPair([], { a: '', b: '', times: '101', reason: ' ' }, null).faults;
    expect(paths(faults)).toEqual(['pair.a', 'pair.b', 'pair.times', 'pair.reason']);
    for (const times of ['', '-1', 'three', 'NaN', 'Infinity', '1e9'])
      expect(paths(withPair([], { ...values, times }, null).faults)).toEqual(['pair.times']);
  });

  it('takes one out', () => {
    expect(withoutPair([pair], { ...pair, a: 'tb', b: 'lymphoma' })).toEqual([]);
  });

  it.each([
    [3, 'A makes B three times as likely'],
    [2, 'A makes B twice as likely'],
    [0.5, 'A makes B half as likely'],
    [0.2, 'A makes B only 0.2 times as likely'],
    [1, 'A makes B neither more nor less likely'],
    [0, 'A and B are never there together'],
  ])('says %s in words', (times, words) => {
    expect(pairSentence('A', 'B', times)).toBe(words);
  });
});

describe('the share with two or more', () => {
  it('is read out of 100', () => {
    expect(readCoexistence('5')).toEqual({ share: 0.05 });
    expect(readCoexistence(' 2,5 ')).toEqual({ share: 0.025 });
    expect(readCoexistence('0')).toEqual({ share: 0 });
  });

  it.each(['', '51', '-1', 'few', '1e3'])('refuses "%s"', (text) => {
    expect(readCoexistence(text)).toHaveProperty('fault');
  });
});
