import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import { makeCandidate, makeFinding } from '../testing/make-differential';
import { becomesWords, countsWords, oddsWords, oftenWords, seenIn, signed, timesWords } from './sum-words';

const [still, lymphoma, none] = columnsOf([makeCandidate('Still'), makeCandidate('Lymphoma')]);

describe('the words of the sum', () => {
  it('says odds with small whole numbers, either way round', () => {
    expect([1, 1.5, 3.02, 0.25, 12.4, 0.667].map(oddsWords)).toEqual([
      'about even',
      'about 3 to 2',
      'about 3 to 1',
      'about 1 to 4',
      'about 12 to 1',
      'about 2 to 3',
    ]);
  });

  it('says nothing certain: beyond 99 to 1 it says no number', () => {
    expect([1e9, 1e-9, 0, Number.POSITIVE_INFINITY, Number.NaN].map(oddsWords)).toEqual([
      'more than 99 to 1',
      'less than 1 to 99',
      'beyond 99 to 1',
      'beyond 99 to 1',
      'beyond 99 to 1',
    ]);
  });

  it('is never further from the odds than six in a hundred, ten where they are long', () => {
    for (let tenths = -190; tenths <= 190; tenths += 1) {
      const odds = 10 ** (tenths / 100);
      const said = oddsWords(odds);
      const [, one, other] = /(\d+) to (\d+)/.exec(said) ?? ['', '1', '1'];
      expect(Math.abs(Math.log(Number(one) / Number(other) / odds)), said).toBeLessThanOrEqual(
        Math.log(Math.abs(tenths) < 48 ? 1.0601 : 1.1001),
      );
    }
  });

  it('says how often what was observed is seen, the larger column first', () => {
    if (!still || !lymphoma || !none) throw new Error('columns');
    const seen = makeFinding();
    expect(oftenWords(seen, [0.62, 0.15], [still, lymphoma])).toBe(
      'Seen about 4 times as often in A as in B: 62 and 15 of 100.',
    );
    expect(oftenWords(seen, [0.1, 0.15], [still, none])).toBe(
      'Seen about 1.5 times as often in none of these as in A: 15 and 10 of 100.',
    );
    expect(oftenWords({ ...seen, observed: 0 }, [0.97, 0.96], [still, lymphoma])).toBe(
      'Missing about as often in A as in B: 97 and 96 of 100.',
    );
    const bands = makeFinding({ levelLabels: ['normal', 'raised', 'above five times'], observed: 2 });
    expect(oftenWords(bands, [0.001, 0.2], [still, lymphoma])).toBe(
      '“above five times” is seen more than 100 times as often in B as in A: 20 and under 1 of 100.',
    );
  });

  it('says how often it is seen in one column alone', () => {
    if (!still || !none) throw new Error('columns');
    expect(seenIn(makeFinding(), 0.62, still)).toBe('Seen in 62 of 100 with A.');
    expect(seenIn(makeFinding({ observed: 0 }), 0.001, none)).toBe(
      'Missing in under 1 of 100 with none of these.',
    );
  });

  it('gives a push its sign and its times', () => {
    expect([2.13, -0.4, 0.04, -0.01].map(signed)).toEqual(['+2.1', '−0.4', '0.0', '0.0']);
    expect([3.01, -6.02, 0, 0.1].map(countsWords)).toEqual([
      'Counts for, as 2 times',
      'Counts against, as 4 times',
      'Counts neither way',
      'Counts a little for',
    ]);
    expect([1.44, 2.97, 250].map(timesWords)).toEqual(['1.4', '3', 'more than 100']);
  });

  it('says what a step does to the share', () => {
    expect(becomesWords(0.29, 0.41)).toBe('29 becomes 41 of 100.');
    expect(becomesWords(0.292, 0.294)).toBe('Stays at 29 of 100.');
    expect(becomesWords(0.001, 0.03)).toBe('Under 1 becomes 3 of 100.');
  });
});
