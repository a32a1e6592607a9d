import { describe, expect, it } from 'vitest';
import { descending } from './descending.js';

describe('descending', () => {
  const order = (values: number[]) => descending([...values.keys()], (position) => values[position]!);

  it('puts larger values first', () => expect(order([1, 3, 2])).toEqual([1, 2, 0]));
  it('keeps the order of equal values', () => expect(order([1, 2, 1, 2])).toEqual([1, 3, 0, 2]));
  it('takes values within 1e-12 for equal', () =>
    expect(order([1, 1 + 5e-13, 1 + 3e-12])).toEqual([2, 0, 1]));
  it('takes nothing from nothing', () => expect(order([])).toEqual([]));
});
