import { describe, expect, it } from 'vitest';
import { burdenWords } from '../model/finding-words';
import { makeAssessment, makeFinding } from '../testing/make-differential';
import {
  bitsWords,
  costWords,
  daysWords,
  headline,
  idleWords,
  leaderWords,
  rankWords,
  settlesWords,
  settlingMost,
} from './test-words';
import type { TestView } from './tests-view';

const result = (p: number, standing: number[], name = 'Negative') => ({
  level: 0,
  name,
  p,
  standing,
  leader: 0,
  takesFirst: false,
});
const test = (bits: number, rank = 1, title = 'PET-CT'): TestView => ({
  finding: makeFinding({ title, observed: null }),
  rank,
  bits,
  leaderChanges: 0,
  frontier: true,
  results: [],
});

describe('what a test settles, in words', () => {
  it('keeps to the steps that the page names', () => {
    expect([0.5, 0.4999, 0.1, 0.0999, 0.01, 0.0099, 0].map(settlesWords)).toEqual([
      'settles much',
      'settles something',
      'settles something',
      'settles little',
      'settles little',
      'settles hardly anything',
      'settles hardly anything',
    ]);
  });

  it('says most of the first among others only, and not without saying that it is little', () => {
    expect(rankWords(test(0.41), 3)).toBe('settles most');
    expect(rankWords(test(0.41), 1)).toBe('settles something');
    expect(rankWords(test(0.05), 3)).toBe('settles most of these, yet little');
    expect(rankWords(test(0.001), 2)).toBe('settles most of these, yet hardly anything');
    expect(rankWords(test(0.2, 2), 3)).toBe('settles something');
  });

  it('marks one row of the ledger, and none where the first settles little or stands alone', () => {
    const next = (finding: string, bits: number) => ({
      finding,
      bits,
      leaderChanges: 0,
      frontier: true,
      levels: [],
    });
    const of = (...nextTests: ReturnType<typeof next>[]) =>
      settlingMost({ assessment: makeAssessment({ nextTests }) });
    expect(of(next('pet', 0.41), next('echo', 0.2))).toBe('pet');
    expect(of(next('pet', 0.41))).toBeNull();
    expect(of(next('pet', 0.09), next('echo', 0.02))).toBeNull();
    expect(settlingMost({ assessment: null })).toBeNull();
  });

  it('never rounds bits to nothing', () => {
    expect(bitsWords(0)).toBe('under 0.01 bits');
    expect(bitsWords(0.0049)).toBe('under 0.01 bits');
    expect(bitsWords(0.0051)).toBe('0.01 bits');
    expect(bitsWords(0.414)).toBe('0.41 bits');
  });

  it('says in the title what the list comes to', () => {
    expect(headline([])).toBe('No test can be ranked yet');
    expect(headline([test(0.41), test(0.2, 2)])).toBe('PET-CT would settle most');
    expect(headline([test(0.6)])).toBe('PET-CT would settle much');
    expect(headline([test(0.09), test(0.08, 2)])).toBe('No test here would settle much');
    expect(headline([test(0.004)])).toBe('No test here would settle anything to speak of');
  });
});

describe('the chance that the first place changes', () => {
  it('is a natural frequency, and no number where no result changes it', () => {
    expect(leaderWords(0.22)).toBe('In 22 of 100 the first place would go to another.');
    expect(leaderWords(0.001)).toBe('In under 1 of 100 the first place would go to another.');
    expect(leaderWords(1)).toBe('In over 99 of 100 the first place would go to another.');
    expect(leaderWords(0)).toBe('No result would change who is first.');
  });
});

describe('a test that is ordered by habit', () => {
  const now = [0.6, 0.3, 0.1];
  it('is named where nothing it can show moves the standing', () => {
    const results = [result(0.5, [0.61, 0.29, 0.1]), result(0.5, [0.59, 0.31, 0.1])];
    expect(idleWords({ results }, now)).toBe('Whatever it shows, the standing hardly moves.');
  });
  it('is named where its nearly sure result does not, however much the rare one would', () => {
    const results = [result(0.98, [0.61, 0.29, 0.1]), result(0.02, [0.1, 0.8, 0.1], 'Vegetation')];
    expect(idleWords({ results }, now)).toBe(
      'In 98 of 100 it shows “Negative”, and then the standing hardly moves.',
    );
  });
  it('is not named where a result that is not rare moves it', () => {
    const results = [result(0.89, [0.61, 0.29, 0.1]), result(0.11, [0.4, 0.5, 0.1])];
    expect(idleWords({ results }, now)).toBeNull();
    expect(idleWords({ results: [result(0.95, [0.64, 0.26, 0.1]), result(0.05, now)] }, now)).toBeNull();
  });
});

describe('what a test takes', () => {
  it('tells nothing said from nothing needed', () => {
    expect([costWords(null), costWords(0), costWords(1400)]).toEqual(['not said', '0', '1,400']);
    expect([daysWords(null), daysWords(0), daysWords(1), daysWords(12)]).toEqual([
      'not said',
      'none',
      '1 day',
      '12 days',
    ]);
  });
  it('has words for burdens between the steps', () => {
    expect([null, 0, 1, 1.5, 2, 2.5, 3].map(burdenWords)).toEqual([
      'not said',
      'none',
      'little',
      'little to some',
      'some',
      'some to much',
      'much',
    ]);
  });
});
