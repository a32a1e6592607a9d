import type { Plan } from '@weighhouse/shared/contracts/plans';
import { describe, expect, it } from 'vitest';
import { draftSummary, summaryCaution } from './summary-text.js';

const action = (what: string, concernsPatient: boolean, due: string | null = '2026-11-30') => ({
  id: what,
  what,
  owner: null,
  due,
  concernsPatient,
  doneAt: null,
  doneWords: null,
});
const plan: Pick<Plan, 'workingDiagnosis' | 'certainty' | 'remainingDoubt' | 'safetyNet' | 'actions'> = {
  workingDiagnosis: 'Giant cell arteritis.',
  certainty: 'provisional',
  remainingDoubt: 'The biopsy may be negative',
  safetyNet: 'Come at once if your sight changes.',
  actions: [
    action('A biopsy of the temple', true),
    action('Review the slides', false),
    action('A talk', true, null),
  ],
};
const day = (text: string): string => `the day ${text}`;

describe('draftSummary', () => {
  it('says what was found, how sure it is, what is next, when to get help, and the caution', () => {
    const paragraphs = draftSummary(plan, 0.624, day).split('\n\n');
    expect(paragraphs[1]).toBe(
      'The best explanation so far is this: Giant cell arteritis. The doctors act on it now. They go on checking whether it is right. Think of 100 people with an illness like yours. About 62 of them would have this. About 38 would have something else.',
    );
    expect(paragraphs[2]).toBe('What is not certain yet: The biopsy may be negative.');
    expect(paragraphs[3]).toBe(
      'What happens next:\n– A biopsy of the temple, by the day 2026-11-30.\n– A talk.',
    );
    expect(paragraphs[4]).toBe('When to get help at once: Come at once if your sight changes.');
    expect(paragraphs.at(-1)).toBe(summaryCaution);
  });

  it('tells nothing of actions that do not concern the patient', () => {
    expect(draftSummary(plan, 0.5, day)).not.toContain('slides');
  });

  it('never says 0 or 100 of 100, and no number where there is none', () => {
    expect(draftSummary(plan, 0.0004, day)).toContain('fewer than 1 would have this');
    expect(draftSummary(plan, 0.9999, day)).toContain('nearly all would have this');
    expect(draftSummary(plan, null, day)).not.toMatch(/100/);
  });

  it.each(['unconfirmed', 'provisional', 'differential', 'confirmed'] as const)(
    'keeps its own sentences short when %s',
    (certainty) => {
      const own = draftSummary(
        { ...plan, certainty, remainingDoubt: '', safetyNet: '', actions: [] },
        0.4,
        day,
      );
      const sentences = own.replace(summaryCaution, '').split(/[.:]\s/);
      for (const text of sentences) expect(text.split(/\s+/).length).toBeLessThanOrEqual(15);
    },
  );

  it('leaves out what the plan does not say', () => {
    const bare = draftSummary({ ...plan, remainingDoubt: '', safetyNet: '', actions: [] }, null, day);
    expect(bare.split('\n\n')).toHaveLength(4);
  });
});
