import { describe, expect, it } from 'vitest';
import { byteRange } from './byte-range.js';

describe('byteRange of a file of 100 bytes', () => {
  it.each([
    ['bytes=0-9', { first: 0, last: 9 }],
    ['bytes=90-', { first: 90, last: 99 }],
    ['bytes=90-1000', { first: 90, last: 99 }],
    ['bytes=-10', { first: 90, last: 99 }],
    ['bytes=-1000', { first: 0, last: 99 }],
    ['bytes=99-99', { first: 99, last: 99 }],
  ])('%s', (header, range) => {
    expect(byteRange(header, 100)).toEqual(range);
  });

  it.each(['bytes=100-', 'bytes=100-200', 'bytes=-0', 'bytes=99999999999999999999-'])(
    '%s asks for no byte of it',
    (header) => {
      expect(byteRange(header, 100)).toBe('unsatisfiable');
    },
  );

  it.each([
    undefined,
    '',
    'bytes=',
    'bytes=-',
    'bytes=9-0',
    'bytes=0-1,5-6',
    'lines=0-1',
    'bytes=a-b',
    'bytes=1.5-',
  ])('%j is answered in full', (header) => {
    expect(byteRange(header, 100)).toBeNull();
  });
});
