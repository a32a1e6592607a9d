import { describe, expect, it } from 'vitest';
import { checkPrior, checkRow } from './check-judgement.js';

const columns = ['a', 'b', null];

describe('a prior', () => {
  it('becomes whole thousandths by column, none of these last', () => {
    expect(checkPrior([33.3, 33.3, 33.4], columns)).toEqual({
      faults: [],
      values: [
        { candidateId: 'a', level: 0, thousandths: 333 },
        { candidateId: 'b', level: 0, thousandths: 333 },
        { candidateId: null, level: 0, thousandths: 334 },
      ],
    });
  });

  it('is refused with another number of columns, or another sum in the last digit', () => {
    expect(checkPrior([50, 50], columns).faults).toMatchObject([{ path: 'outOf100' }]);
    expect(checkPrior([33.3, 33.3, 33.3], columns).faults).toEqual([
      { path: 'outOf100', message: 'must sum to 100' },
    ]);
  });
});

describe('a row', () => {
  it('keeps what would show the finding, and blanks are no values', () => {
    expect(checkRow([65, null, 0.1], columns, 2)).toEqual({
      faults: [],
      values: [
        { candidateId: 'a', level: 1, thousandths: 650 },
        { candidateId: null, level: 1, thousandths: 1 },
      ],
    });
  });

  it('takes both shares of two levels and keeps the second', () => {
    expect(checkRow([[35, 65], null, null], columns, 2).values).toEqual([
      { candidateId: 'a', level: 1, thousandths: 650 },
    ]);
  });

  it('names every fault by its cell', () => {
    const { faults } = checkRow([50, [10, 20, 30], [50, 50]], columns, 3);
    expect(faults).toEqual([
      { path: 'outOf100[0]', message: 'must give a share for each of 3 levels' },
      { path: 'outOf100[1]', message: 'must sum to 100' },
      { path: 'outOf100[2]', message: 'must give a share for each of 3 levels' },
    ]);
  });

  it('keeps every level where there are more than two', () => {
    expect(checkRow([[10, 20, 70], null, null], columns, 3).values).toEqual([
      { candidateId: 'a', level: 0, thousandths: 100 },
      { candidateId: 'a', level: 1, thousandths: 200 },
      { candidateId: 'a', level: 2, thousandths: 700 },
    ]);
  });
});
