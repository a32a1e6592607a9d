import { describe, expect, it } from 'vitest';
import { makeDifferential, makeOther, makeRow } from '../testing/make-differential';
import { othersMarks } from './others-marks';

const others = [
  makeOther('a', { findings: [makeRow('f1', [65, null])] }),
  makeOther('b', { findings: [makeRow('f1', [[60, 40], 12])] }),
  makeOther('c', { findings: [makeRow('f2', [1, 1])] }),
  makeOther('d', { findings: [makeRow('f1', [[10, 20, 70], 5])] }),
];

describe('the others on the track', () => {
  it('are those who judged the cell, with how many would show the finding', () => {
    expect(othersMarks(makeDifferential({ others }), 'f1', 0)).toEqual([65, 40]);
    expect(othersMarks(makeDifferential({ others }), 'f1', 1)).toEqual([12, 5]);
  });

  it('are nobody while a round is sealed, also where an earlier round is shown', () => {
    expect(othersMarks(makeDifferential({ others, sealed: true }), 'f1', 0)).toEqual([]);
  });
});
