import { describe, expect, it } from 'vitest';
import { makeFinding } from '../testing/make-differential';
import { cellSentence, decibanWords } from './cell-words';
import type { CellView } from './cells';

const cell: CellView = {
  figure: { share: 0.88, level: 1 },
  ownFigure: false,
  decibans: 4.2,
  ticks: [],
  own: -0.2,
  sealed: false,
  unjudged: 'no',
};

describe('a cell in words', () => {
  it('says the figure, which way it counts, and oneself', () => {
    expect(cellSentence(cell, makeFinding())).toBe(
      '88 of 100 would show this. It counts for, 4 decibans. Yours counts neither way.',
    );
  });

  it('says how many would not show what is absent', () => {
    const absent = { ...cell, figure: { share: 0.97, level: 0 }, decibans: -1, own: null };
    expect(cellSentence(absent, makeFinding({ observed: 0 }))).toBe(
      '97 of 100 would not show this. It counts against, 1 deciban.',
    );
  });

  it('says what is not known yet, and the level where there are several', () => {
    const pending = { ...cell, figure: { share: 0.004, level: 2 }, decibans: null, own: null };
    const finding = makeFinding({ levelLabels: ['none', 'few', 'many'], observed: null });
    expect(cellSentence(pending, finding)).toBe('under 1 of 100 would have “many”. Not known yet.');
  });

  it('gives nothing away behind a seal', () => {
    expect(cellSentence({ ...cell, sealed: true, ownFigure: true }, makeFinding())).toBe(
      'You: 88 of 100 would show this. The others are sealed.',
    );
    expect(cellSentence({ ...cell, sealed: true, figure: null }, makeFinding())).toBe(
      'No number of yours. The others are sealed.',
    );
  });

  it('says where nothing was judged', () => {
    expect(cellSentence({ ...cell, figure: null }, makeFinding())).toBe('Not judged yet.');
  });
});

it('rounds decibans to whole ones', () => {
  expect([0.4, 0.6, -1.4, -22].map(decibanWords)).toEqual([
    'counts neither way',
    'counts for, 1 deciban',
    'counts against, 1 deciban',
    'counts against, 22 decibans',
  ]);
});
