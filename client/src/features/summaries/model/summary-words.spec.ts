import type { Summary, TellList } from '@weighhouse/shared/contracts/summaries';
import { describe, expect, it } from 'vitest';
import { groupOf, lengthWords, paragraphsOf, summaryTitle, tellTitle } from './summary-words';

type Item = TellList['items'][number];
const item = (state: Item['state'], hasPlan = true): Item => ({
  caseId: 'c',
  number: '26-0417',
  state,
  hasPlan,
  since: '2026-12-01T10:00:00Z',
  attempts: 0,
});

describe('summary words', () => {
  it('puts every case where it waits', () => {
    expect(groupOf(item('approved'))).toBe('ready');
    expect(groupOf(item('none'))).toBe('write');
    expect(groupOf(item('draft'))).toBe('write');
    expect(groupOf(item('none', false))).toBe('later');
    expect(groupOf(item('waiting'))).toBe('chair');
    expect(groupOf(item('told'))).toBe('told');
  });

  it('says first who can be told, then what is to write, and otherwise that nobody waits', () => {
    expect(tellTitle([item('approved'), item('draft')])).toBe('One patient can be told');
    expect(tellTitle([item('draft'), item('none')])).toBe('Two summaries to write');
    expect(tellTitle([item('waiting'), item('told'), item('none', false)])).toBe('Nobody waits to be told');
    expect(tellTitle([])).toBe('Nobody waits to be told');
  });

  it('tells a returned draft from a first one', () => {
    const summary = (change: Partial<Summary>) =>
      summaryTitle({ state: 'draft', planNumber: 1, returnedWords: null, ...change } as Summary);
    expect(summary({})).toBe('The summary is being written');
    expect(summary({ returnedWords: 'Too long' })).toBe('The chair asks for changes to the summary');
    expect(summary({ planNumber: null })).toBe('Nothing to tell yet');
  });

  it('parts paragraphs at empty lines, also with spaces in them, and drops empty ones', () => {
    expect(paragraphsOf('One.\nStill one.\n \n\nTwo.\n\n')).toEqual(['One.\nStill one.', 'Two.']);
    expect(paragraphsOf(' \n\n ')).toEqual([]);
  });

  it('counts words and sentences, numbers with a point within one', () => {
    expect(lengthWords('You have Still’s disease. It is not cancer. Is 38.5 °C a fever?')).toBe(
      '13 words in 3 sentences',
    );
    expect(lengthWords('One')).toBe('1 word in 1 sentence');
    expect(lengthWords('')).toBe('0 words in 0 sentences');
  });
});
