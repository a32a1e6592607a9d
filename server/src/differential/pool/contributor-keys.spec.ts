import { describe, expect, it } from 'vitest';
import { anonymousKeys, hiddenOrder } from './contributor-keys.js';

const people = ['p1', 'p2', 'p3', 'p4', 'p5', 'p6'];

describe('the hidden order of contributors', () => {
  it('is the same however the team list is ordered', () => {
    const order = hiddenOrder('secret', 'case', people);
    expect(hiddenOrder('secret', 'case', [...people].reverse())).toEqual(order);
    expect([...order].sort()).toEqual(people);
  });

  it('is another on another case and with another secret, so that nothing can be learnt from it', () => {
    const orders = Array.from({ length: 20 }, (_, k) =>
      hiddenOrder('secret', `case ${String(k)}`, people).join(),
    );
    expect(new Set(orders).size).toBeGreaterThan(10);
    const others = Array.from({ length: 20 }, (_, k) =>
      hiddenOrder(`secret ${String(k)}`, 'case', people).join(),
    );
    expect(new Set(others).size).toBeGreaterThan(10);
  });

  it('gives keys that name nobody', () => {
    expect([...anonymousKeys(['p9', 'p2'])]).toEqual([
      ['p9', 'c1'],
      ['p2', 'c2'],
    ]);
  });
});
