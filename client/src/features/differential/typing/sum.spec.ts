import { describe, expect, it } from 'vitest';
import { readShares, restWords } from './sum';

describe('shares of 100', () => {
  it('are complete when every one is given and they sum to 100, decimals included', () => {
    expect(readShares(['33.3', '33.3', '33,4'])).toMatchObject({ rest: 0, complete: true, faults: [] });
    expect(readShares(['30', '20', '50']).complete).toBe(true);
  });

  it('are not complete with a blank, a fault or a rest', () => {
    expect(readShares(['50', '', '50'])).toMatchObject({ blanks: 1, rest: 0, complete: false });
    expect(readShares(['50', 'x', '50'])).toMatchObject({
      blanks: 0,
      complete: false,
      faults: [{ index: 1 }],
    });
    expect(readShares(['50', '20', '20'])).toMatchObject({ rest: 10, complete: false });
    expect(readShares(['50', '40', '20'])).toMatchObject({ rest: -10, complete: false });
  });

  it('begin with 100 left', () => {
    expect(readShares(['', '']).rest).toBe(100);
  });
});

it('says the rest in words', () => {
  expect(restWords(readShares(['', '', '']))).toBe('100 of 100 left, 3 shares still blank');
  expect(restWords(readShares(['30', '20', '']))).toBe('50 of 100 left, 1 share still blank');
  expect(restWords(readShares(['30', '20', '49.5']))).toBe('0.5 of 100 left');
  expect(restWords(readShares(['30', '20', '50']))).toBe('All 100 are given');
  expect(restWords(readShares(['60', '40', '']))).toBe('Nothing left of 100, 1 share still blank');
  expect(restWords(readShares(['60', '40', '3']))).toBe('3 too many: the shares must sum to 100');
});
