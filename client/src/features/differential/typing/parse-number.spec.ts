import { describe, expect, it } from 'vitest';
import { numberText, parseOutOf100 } from './parse-number';

describe('a typed number out of 100', () => {
  it.each([
    ['12', 12],
    [' 12 ', 12],
    ['12.5', 12.5],
    ['12,5', 12.5],
    ['12.', 12],
    ['.5', 0.5],
    ['0.1', 0.1],
    ['99.9', 99.9],
    ['7 %', 7],
    ['007', 7],
  ])('%j is %d', (text, value) => {
    expect(parseOutOf100(text)).toEqual({ kind: 'number', value });
  });

  it('is blank where nothing stands', () => {
    expect([parseOutOf100(''), parseOutOf100('  ')]).toEqual([{ kind: 'blank' }, { kind: 'blank' }]);
  });

  it.each([
    ['0', /0\.1 or more/],
    ['0.05', /0\.1 or more/],
    ['100', /99\.9 or less/],
    ['99.95', /99\.9 or less/],
    ['12.34', /one decimal/],
    ['-5', /a number out of 100/],
    ['1e1', /a number out of 100/],
    ['0x10', /a number out of 100/],
    ['Infinity', /a number out of 100/],
    ['1.2.3', /a number out of 100/],
    ['12 13', /a number out of 100/],
    ['١٢', /a number out of 100/],
    ['.', /a number out of 100/],
    ['about 12', /a number out of 100/],
  ])('%j is refused', (text, message) => {
    expect(parseOutOf100(text)).toEqual({ kind: 'fault', message: expect.stringMatching(message) as string });
  });
});

it('shows a saved number as it was typed', () => {
  expect([65, 12.5, 0.1, 0.30000000000000004].map(numberText)).toEqual(['65', '12.5', '0.1', '0.3']);
});
