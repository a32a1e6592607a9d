import { describe, expect, it } from 'vitest';
import { findingFaults } from './finding-faults.js';

const two = ['absent', 'present'];
const around = { groupIds: new Set(['g']), reportIsThere: true };
const paths = (...question: Parameters<typeof findingFaults>): string[] =>
  findingFaults(...question).map((fault) => fault.path);

describe('findingFaults', () => {
  it('finds none in what fits the case', () => {
    expect(paths({ groupId: 'g', source: { reportId: 'r', page: 2 } }, two, 1, around)).toEqual([]);
    expect(paths({ groupId: null, source: { text: 'by telephone', page: 1 } }, two, null, around)).toEqual(
      [],
    );
  });

  it('names every fault at once', () => {
    const asked = { levelLabels: ['low', 'high', 'LOW'], groupId: 'other', source: { reportId: 'r' } };
    expect(paths(asked, asked.levelLabels, 3, { ...around, reportIsThere: false })).toEqual([
      'observed',
      'levelLabels[2]',
      'groupId',
      'source.reportId',
    ]);
  });

  it('takes the last level and refuses the one after it', () => {
    expect(paths({}, two, 1, around)).toEqual([]);
    expect(paths({}, two, 2, around)).toEqual(['observed']);
  });

  it('refuses a page of nothing', () => {
    expect(paths({ source: { page: 2, text: '' } }, two, null, around)).toEqual(['source.page']);
  });
});
