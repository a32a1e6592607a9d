import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import { makeCandidate } from '../testing/make-differential';
import { methodSentences, pairWords } from './method-words';

describe('the method in words', () => {
  it('says what was set for this panel', () => {
    const words = methodSentences({ tempering: 0.6, coexistence: 0.05 }, []).join(' ');
    expect(words).toContain('Every finding counts 60 of 100 of its full strength');
    expect(words).toContain('of 100 patients like this, 5 have two or more');
    expect(methodSentences({ tempering: 1, coexistence: 0 }, []).join(' ')).toMatch(
      /in full \(no tempering\)\. One cause is assumed/,
    );
  });

  it('names the pairs in force, with their reason', () => {
    const columns = columnsOf([
      makeCandidate('Still'),
      makeCandidate('MAS'),
      makeCandidate('old', { retired: true }),
    ]);
    const together = [
      { a: 'Still', b: 'MAS', times: 3, reason: 'one brings the other' },
      { a: 'Still', b: 'old', times: 2, reason: 'retired' },
      { a: 'MAS', b: 'Still', times: 0, reason: 'exclude each other' },
    ];
    expect(pairWords(together, columns)).toEqual([
      'A Still and B MAS together 3 times as likely (one brings the other)',
      'B MAS and A Still never together (exclude each other)',
    ]);
  });
});
