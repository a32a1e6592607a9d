import { describe, expect, it } from 'vitest';
import { nextSort, queryOf, searchOf, sortDirection } from './case-query';

describe('the address of a list of cases', () => {
  it('leaves out what is standard and comes back as it was', () => {
    const query = queryOf(new URLSearchParams('state=judging&q=fever&sort=-number&page=3'));
    expect(query).toEqual({ state: 'judging', q: 'fever', sort: '-number', page: 3, size: 25 });
    expect(searchOf(query).toString()).toBe('state=judging&q=fever&sort=-number&page=3');
    expect(searchOf(queryOf(new URLSearchParams())).toString()).toBe('');
  });

  it.each(['state=nonsense', 'sort=leader', 'sort=password', 'page=-1', 'page=x', 'size=100000', 'q='])(
    'takes %s for not asked',
    (address) => {
      expect(searchOf(queryOf(new URLSearchParams(address))).toString()).toBe('');
    },
  );

  it('turns the order round at the second click', () => {
    expect(nextSort('-updatedAt', 'number')).toBe('number');
    expect(nextSort('number', 'number')).toBe('-number');
    expect(nextSort('-number', 'number')).toBe('number');
    expect(sortDirection('-number', 'number')).toBe('descending');
    expect(sortDirection('number', 'question')).toBeUndefined();
  });
});
