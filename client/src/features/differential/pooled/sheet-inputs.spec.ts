import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { describe, expect, it } from 'vitest';
import { makeAssessment } from '../testing/make-differential';
import { cellInputs, exposures, givenWords, pooledWords, priorInputs } from './sheet-inputs';

const contributors: PanelView['contributors'] = [
  {
    id: 'one',
    weight: 1,
    prior: [0.373, 0.627],
    likelihoods: { f1: { exposure: 'often', given: [0.65, null] } },
  },
  {
    id: 'two',
    weight: 2,
    prior: null,
    likelihoods: { f1: { exposure: 'seldom', given: [[0.1, 0.2, 0.7]] } },
  },
  { id: 'none', weight: 1, prior: null, likelihoods: {} },
];

describe('all inputs on paper', () => {
  it('gives everybody’s number with its digits, blanks as dashes, levels parted by strokes', () => {
    expect(cellInputs(contributors, 'f1', 0)).toBe('65 10/20/70 –');
    expect(cellInputs(contributors, 'f1', 1)).toBe('– – –');
    expect(priorInputs(contributors, 0)).toBe('37.3 – –');
    expect([0.001, 0.999, 0.29, null, undefined].map(givenWords)).toEqual(['0.1', '99.9', '29', '–', '–']);
  });

  it('gives exposures in the same order', () => {
    expect(exposures(contributors, 'f1')).toBe('o r –');
    expect(exposures(contributors, 'f2')).toBe('– – –');
  });

  it('gives the pooled number, never 0 and never 100', () => {
    const assessment = makeAssessment({
      pooledCells: {
        f1: [
          [0.38, 0.62],
          [0.999, 0.001],
        ],
        f2: [[0.1, 0.899, 0.001]],
      },
    });
    expect(pooledWords(assessment, 'f1', 0)).toBe('62');
    expect(pooledWords(assessment, 'f1', 1)).toBe('<1');
    expect(pooledWords(assessment, 'f2', 0)).toBe('10/90/<1');
    expect(pooledWords(assessment, 'gone', 0)).toBe('–');
  });
});
