import { describe, expect, it } from 'vitest';
import { missingParts } from './missing-parts.js';

const whole = {
  question: 'What is it?',
  age: 44,
  sex: 'female' as const,
  urgency: 'withinWeek' as const,
  consentGiven: true,
  historyHtml: '<p>Well until spring.</p>',
};
const paths = (draft: Partial<Parameters<typeof missingParts>[0]>) =>
  missingParts({ ...whole, ...draft }).map((part) => part.path);

describe('missingParts', () => {
  it('finds nothing missing in a whole draft, of a newborn too', () => {
    expect(paths({})).toEqual([]);
    expect(paths({ age: 0 })).toEqual([]);
  });

  it('names everything that an empty draft lacks, in the order of the form', () => {
    const empty = {
      question: ' ',
      age: null,
      sex: null,
      urgency: null,
      consentGiven: null,
      historyHtml: '<p></p>',
    };
    expect(paths(empty)).toEqual(['question', 'age', 'sex', 'consent', 'urgency', 'historyHtml']);
  });

  it('does not take a refused consent for one that was given', () => {
    expect(paths({ consentGiven: false })).toEqual(['consent']);
  });
});
