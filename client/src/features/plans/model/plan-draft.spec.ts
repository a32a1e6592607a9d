import { planInputSchema } from '@weighhouse/shared/contracts/plans';
import { describe, expect, it } from 'vitest';
import {
  adoptIds,
  draftOf,
  emptyAction,
  inputOf,
  isWhole,
  moved,
  type PlanDraft,
  rebaseDraft,
  sameDraft,
  sentPlace,
} from './plan-draft';

const ids = ['2b1c8d1e-5d3c-4a46-9d55-0a3d6a1f7a01', '2b1c8d1e-5d3c-4a46-9d55-0a3d6a1f7a02'] as const;
const action = (key: string, what: string, id?: string) => ({
  ...emptyAction(key),
  what,
  ...(id === undefined ? {} : { id }),
});
const plan = (...actions: PlanDraft['actions']): PlanDraft => ({ ...draftOf(null), actions });

describe('plan draft', () => {
  it('sends a draft that the contract takes, without the rows that say nothing yet', () => {
    const draft = plan(action('a', '  Biopsy '), action('b', '   '), action('c', 'Ferritin', ids[0]));
    const input = planInputSchema.parse(inputOf(draft, 2));
    expect(input.actions.map(({ what, id }) => [what, id])).toEqual([
      ['Biopsy', undefined],
      ['Ferritin', ids[0]],
    ]);
    expect([
      sentPlace(draft.actions, 'a'),
      sentPlace(draft.actions, 'b'),
      sentPlace(draft.actions, 'c'),
    ]).toEqual([0, null, 1]);
  });

  it('keeps a row in the browser that has an owner or a date and no words', () => {
    expect(isWhole(plan(emptyAction('a')))).toBe(true);
    expect(isWhole(plan({ ...emptyAction('a'), due: '2026-12-10' }))).toBe(false);
  });

  it('gives new rows their ids by what was sent, also after rows moved or came meanwhile', () => {
    const sent = plan(action('a', 'Biopsy'), emptyAction('b'), action('c', 'Ferritin'));
    const saved = plan(action(ids[0], 'Biopsy', ids[0]), action(ids[1], 'Ferritin', ids[1]));
    const local = plan(action('c', 'Ferritin twice'), action('d', 'PET-CT'), action('a', 'Biopsy'));
    expect(adoptIds(local, sent, saved).actions.map((row) => row.id)).toEqual([ids[1], undefined, ids[0]]);
    expect(adoptIds(local, sent, saved).actions[0]?.what).toBe('Ferritin twice');
  });

  it('drops the id of a row that was emptied and saved away', () => {
    const sent = plan({ ...action('a', ' '), id: ids[0] });
    const local = plan({ ...action('a', 'Written anew'), id: ids[0] });
    expect(adoptIds(local, sent, plan()).actions[0]).not.toHaveProperty('id');
  });

  it('makes rows new again that somebody else removed', () => {
    const mine = plan(action('a', 'Biopsy', ids[0]), action('b', 'Ferritin', ids[1]));
    expect(rebaseDraft(mine, plan(action('b', 'Ferritin', ids[1]))).actions.map((row) => row.id)).toEqual([
      undefined,
      ids[1],
    ]);
  });

  it('tells a changed order, a changed word and a changed date, and no difference in ids', () => {
    const one = plan(action('a', 'Biopsy'), action('b', 'Ferritin'));
    expect(sameDraft(one, plan(action('x', 'Biopsy', ids[0]), action('y', 'Ferritin ')))).toBe(true);
    expect(sameDraft(one, { ...one, actions: moved(one.actions, 0, 1) })).toBe(false);
    expect(sameDraft(one, { ...one, certainty: 'provisional' })).toBe(false);
  });

  it('moves by one place and not beyond the ends', () => {
    const rows = [action('a', 'A'), action('b', 'B'), action('c', 'C')];
    const keys = (list: typeof rows) => list.map((row) => row.key).join('');
    expect(keys(moved(rows, 0, 1))).toBe('bac');
    expect(keys(moved(rows, 2, -1))).toBe('acb');
    expect(keys(moved(rows, 0, -1))).toBe('abc');
    expect(keys(moved(rows, 2, 1))).toBe('abc');
  });
});
