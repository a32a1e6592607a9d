import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import { makeCandidate } from '../testing/make-differential';
import { leftOutAttribute, leftOutOf, standingWithout } from './left-out';
import { withoutSentence } from './without-words';

const columns = columnsOf([
  makeCandidate('still', { name: 'Still’s disease' }),
  makeCandidate('lymphoma', { name: 'Lymphoma (any)' }),
]);

describe('the standing without something, in words', () => {
  it('says what the leader would be instead', () => {
    expect(withoutSentence('the ferritin', [0.61, 0.17, 0.22], [0.48, 0.24, 0.28], columns)).toBe(
      'Without the ferritin: Still’s disease 48 instead of 61 of 100.',
    );
  });

  it('says of the leader that it stays, and which column moves', () => {
    expect(withoutSentence('you', [0.6, 0.2, 0.2], [0.601, 0.3, 0.099], columns)).toBe(
      'Without you: Still’s disease stays at 60 of 100, None of these 10 instead of 20 of 100.',
    );
  });

  it('names another leader', () => {
    expect(withoutSentence('Dr A', [0.5, 0.4, 0.1], [0.4, 0.5, 0.1], columns)).toContain(
      'Lymphoma would be first.',
    );
  });

  it('does not make a change of what no whole number shows', () => {
    expect(withoutSentence('the rash', [0.5, 0.3, 0.2], [0.501, 0.299, 0.2], columns)).toBe(
      'Without the rash: nothing moves by as much as 1 of 100.',
    );
  });

  it('never says 0 or 100', () => {
    const words = withoutSentence('the biopsy', [0.999, 0.0005, 0.0005], [0.3, 0.699, 0.001], columns);
    expect(words).toContain('Still’s disease 30 instead of over 99 of 100');
    expect(words).not.toMatch(/\b(0|100) (instead|of)/);
  });

  it('says that nobody is left', () => {
    expect(withoutSentence('Dr A', [0.5, 0.3, 0.2], null, columns)).toBe(
      'Without Dr A nobody is left whose numbers count.',
    );
  });
});

describe('what is left out', () => {
  it('is read back from the page as it was written there, and nothing else is', () => {
    const left = { kind: 'finding', id: '6b1e' } as const;
    expect(leftOutOf(leftOutAttribute(left))).toEqual(left);
    for (const other of [undefined, '', 'finding', 'finding ', 'candidate 3'])
      expect(leftOutOf(other)).toBeNull();
  });

  it('is no question for what the assessment does not answer, a key of every object included', () => {
    const without = { findings: { f1: [0.4, 0.6] }, contributors: { c1: null } };
    expect(standingWithout({ without }, { kind: 'finding', id: 'f1' })).toEqual([0.4, 0.6]);
    expect(standingWithout({ without }, { kind: 'contributor', id: 'c1' })).toBeNull();
    expect(standingWithout({ without }, { kind: 'finding', id: 'constructor' })).toBeUndefined();
  });
});
