import { describe, expect, it } from 'vitest';
import { expectClose } from './expect-close.js';

describe('comparing numbers', () => {
  it('lets those pass that are close, at any depth', () => {
    expectClose({ a: [1, { b: 0.5 }], c: null, d: 'x' }, { a: [1 + 1e-13, { b: 0.5 }], c: null, d: 'x' });
  });

  it.each<[string, unknown, unknown]>([
    ['a number too far off', [1, 2], [1, 2 + 1e-9]],
    ['NaN', [NaN], [1]],
    ['a missing entry', [1], [1, 2]],
    ['one entry too many', [1, 2], [1]],
    ['another key', { a: 1 }, { b: 1 }],
    ['another order of keys', { a: 1, b: 1 }, { b: 1, a: 1 }],
    ['nothing for a number', [undefined], [0]],
    ['text for a number', ['0'], [0]],
    ['null for an object', null, {}],
    ['another text', { a: 'x' }, { a: 'y' }],
    ['a number for null', [0], [null]],
  ])('stops at %s', (_, actual, expected) => {
    expect(() => {
      expectClose(actual, expected);
    }).toThrow();
  });
});
