import { assess } from '@weighhouse/shared/reasoning/assess';
import { randomPanel } from '@weighhouse/shared/reasoning/testing/random-panel';
import { describe, expect, it } from 'vitest';
import { leftOutRange, rangeSentence } from './range-words';

const parts = {
  standing: [0.61, 0.39],
  without: { contributors: { one: [0.48, 0.52], alone: null }, findings: { f1: [0.7, 0.3] } },
};

describe('the range in words', () => {
  it('says between what it moves when one is left out, and what counting in full would make it', () => {
    expect(rangeSentence(parts, 0, 0.93)).toBe(
      '61, between 48 and 70 when one opinion or one finding is left out, and up to 93 if every finding counted in full',
    );
    expect(rangeSentence(parts, 1, 0.07)).toMatch(/^39, between 30 and 52 when .* and down to 7 if every/);
    expect(rangeSentence(parts, 0, null)).toMatch(/left out$/);
    expect(rangeSentence(parts, 0, 0.612)).toMatch(/and just so if every finding counted in full$/);
  });

  it('never says 0 or 100', () => {
    const sure = { standing: [1, 0], without: { contributors: {}, findings: { f1: [0.5, 0.5] } } };
    expect(rangeSentence(sure, 0, 1)).toMatch(/^over 99, between 50 and over 99 /);
    expect(rangeSentence(sure, 1, 0)).toMatch(/^under 1, between under 1 and 50 /);
  });

  it('says so where nothing that is left out would show', () => {
    const still = { standing: [0.5, 0.5], without: { contributors: {}, findings: {} } };
    expect(rangeSentence(still, 0, null)).toBe('50, whichever opinion or finding is left out');
  });

  it('lies inside the range that the method gives, which also runs over tempering', () => {
    for (let seed = 1; seed <= 60; seed += 1) {
      const assessment = assess(
        randomPanel({ candidates: 4, findings: 8, pending: 2, contributors: 4, coexistence: 0 }, seed),
      );
      assessment.range.forEach(({ low, high }, column) => {
        const own = leftOutRange(assessment, column);
        expect(own.low).toBeGreaterThanOrEqual(low);
        expect(own.high).toBeLessThanOrEqual(high);
        expect(own.low).toBeLessThanOrEqual(assessment.standing[column] ?? 0);
        expect(own.high).toBeGreaterThanOrEqual(assessment.standing[column] ?? 1);
      });
    }
  });
});
