import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import { makeCandidate } from '../testing/make-differential';
import { arrange } from './arrange';
import {
  columnChoiceSchema,
  fold,
  foldAll,
  pin,
  plainChoice,
  smallColumns,
  unfold,
  unpin,
} from './column-choice';

const columns = (count: number) =>
  columnsOf(Array.from({ length: count }, (_, index) => makeCandidate(`c${String(index)}`)));
const ids = ({ shown }: ReturnType<typeof arrange>) => shown.map(({ column }) => column.id);

describe('the order of the columns', () => {
  it('is that of the ledger as long as nobody chose', () => {
    expect(ids(arrange(columns(3), plainChoice, 1000))).toEqual(['c0', 'c1', 'c2', 'none']);
  });
  it('has the pinned first, the folded last, and none of these at the end whatever is chosen', () => {
    const choice = { pinned: ['c3', 'none'], folded: ['c0', 'none', 'gone'] };
    const arranged = arrange(columns(4), choice, 1000);
    expect(ids(arranged)).toEqual(['c3', 'c1', 'c2', 'c0', 'none']);
    expect(arranged.shown.map(({ folded }) => folded)).toEqual([false, false, false, true, false]);
    expect(arranged.shown.at(-1)?.pinned).toBe(false);
  });
});

describe('what stays while scrolling', () => {
  it('is nothing where everything fits, and before the width is known', () => {
    for (const width of [0, 2000]) {
      const { shown, scrolls } = arrange(columns(12), { pinned: ['c1'], folded: [] }, width);
      expect(scrolls).toBe(false);
      expect(shown.every(({ stuck }) => stuck === null)).toBe(true);
    }
  });
  it('is none of these at the right and the pinned side by side at the left', () => {
    const { shown, title, least, stuckLeft } = arrange(
      columns(30),
      { pinned: ['c2', 'c5'], folded: [] },
      1084,
    );
    expect(least).toBe(title + 31 * 84);
    expect(shown.filter(({ stuck }) => stuck === 'left').map(({ offset }) => offset)).toEqual([
      title,
      title + 84,
    ]);
    expect(shown.at(-1)?.stuck).toBe('right');
    expect(stuckLeft).toBe(title + 2 * 84);
  });
  it.each([400, 768, 924, 1084])('leaves room to scroll two columns in %d pixels', (width) => {
    const all = columns(30);
    const choice = { pinned: all.map(({ id }) => id), folded: [] };
    const { stuckLeft, stuckRight, title, shown } = arrange(all, choice, width);
    expect(shown).toHaveLength(31);
    expect(stuckLeft === title || stuckLeft + stuckRight + 2 * 84 <= width).toBe(true);
  });
  it('needs no scrolling once enough is folded', () => {
    const all = columns(30);
    expect(arrange(all, plainChoice, 1084).scrolls).toBe(true);
    const folded = all.slice(4, 18).map(({ id }) => id);
    expect(arrange(columns(18), { pinned: [], folded }, 1084).scrolls).toBe(false);
  });
});

describe('the choice of a person', () => {
  it('pins or folds a column, never both', () => {
    const pinned = pin(fold(plainChoice, 'a'), 'a');
    expect(pinned).toEqual({ pinned: ['a'], folded: [] });
    expect(fold(pinned, 'a')).toEqual({ pinned: [], folded: ['a'] });
    expect(unfold(fold(plainChoice, 'a'), 'a')).toEqual(plainChoice);
    expect(unpin(pin(pin(plainChoice, 'a'), 'a'), 'a')).toEqual(plainChoice);
  });
  it('folds all that are small but what is pinned and none of these', () => {
    const standing = [0.5, 0.0199, 0.02, 0.001, 0.001];
    const small = smallColumns(columns(4), standing, pin(plainChoice, 'c3'));
    expect(small.map(({ id }) => id)).toEqual(['c1']);
    expect(foldAll(plainChoice, small).folded).toEqual(['c1']);
    expect(smallColumns(columns(4), null, plainChoice)).toEqual([]);
  });
  it('is forgotten where the browser kept something else', () => {
    expect(columnChoiceSchema.safeParse({ pinned: 'all', folded: [] }).success).toBe(false);
    expect(columnChoiceSchema.safeParse(null).success).toBe(false);
  });
});
