import { assess } from '@weighhouse/shared/reasoning/assess';
import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import { makeCandidate } from '../testing/make-differential';
import { explainSentences, leftOutSentence, restSentence, setSentences } from './set-words';

const columns = columnsOf([
  makeCandidate('still', { name: 'Adult-onset Still’s disease' }),
  makeCandidate('lymphoma', { name: 'Lymphoma' }),
  makeCandidate('tb', { name: 'Tuberculosis (miliary)' }),
]);

describe('combinations in words', () => {
  it('names one alone, several together, and none', () => {
    const sets = [
      { members: [0], p: 0.61 },
      { members: [1, 2], p: 0.03 },
      { members: [0, 1, 2], p: 0.004 },
      { members: [], p: 0.2 },
    ];
    expect(setSentences({ sets }, columns).map(({ who, howMany }) => `${who}: ${howMany}`)).toEqual([
      'Adult-onset Still’s disease alone: 61 of 100 like this',
      'Lymphoma and Tuberculosis (miliary) together: 3 of 100 like this',
      'Adult-onset Still’s disease, Lymphoma and Tuberculosis (miliary) together: under 1 of 100 like this',
      'None of these: 20 of 100 like this',
    ]);
    expect(restSentence({ sets })).toBe('Every other combination: 16 of 100 like this.');
  });

  it('has no rest where every combination is listed', () => {
    expect(
      restSentence({
        sets: [
          { members: [0], p: 0.4 },
          { members: [], p: 0.6 },
        ],
      }),
    ).toBeNull();
  });

  it('says what is needed less, and keeps silent where no whole number shows it', () => {
    const explains = [
      { if: 0, then: 1, from: 0.24, to: 0.11 },
      { if: 1, then: 0, from: 0.501, to: 0.499 },
    ];
    expect(explainSentences({ explains }, columns)).toEqual([
      'If Adult-onset Still’s disease is there, Lymphoma is needed less: 24 falls to 11 of 100.',
    ]);
  });

  it('says what was not counted', () => {
    expect(leftOutSentence({ exact: true, leftOut: 0 })).toBeNull();
    expect(leftOutSentence({ exact: false, leftOut: 0.002 })).toContain('under 1 of 100');
    expect(leftOutSentence({ exact: false, leftOut: null })).toContain('cannot be said');
  });

  it('tells of two causes of one finding that each makes the other less needed', () => {
    const assessment = assess({
      candidates: ['still', 'lymphoma', 'tb'],
      coexistence: 0.1,
      findings: [{ id: 'f', levels: 2, observed: 1 }],
      contributors: [
        {
          id: 'c',
          prior: [0.2, 0.2, 0.1, 0.5],
          likelihoods: { f: { exposure: 'often', given: [0.9, 0.9, 0.05, 0.05] } },
        },
      ],
    });
    const sentences = explainSentences(assessment, columns);
    expect(sentences[0]).toMatch(
      /^If (Adult-onset Still’s disease|Lymphoma) is there, .* is needed less: \d+ falls/,
    );
    for (const { from, to } of assessment.explains) expect(to).toBeLessThan(from);
  });
});
