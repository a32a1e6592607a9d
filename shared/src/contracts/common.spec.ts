import { describe, expect, it } from 'vitest';
import { idSchema, lineSchema } from './common.js';

describe('lineSchema', () => {
  it.each([
    ['  Fever  ', 'Fever'],
    ['Fever\r\nBcc: everybody', 'Fever Bcc: everybody'],
    ['Fever\u0000\u2028at night', 'Fever at night'],
    ['not \u202etneserp\u202c', 'not tneserp'],
    ['\u2066Fever\u2069', 'Fever'],
    ['Fièvre, 発熱, حمى, 👩‍⚕️', 'Fièvre, 発熱, حمى, 👩‍⚕️'],
  ])('keeps %j as one plain line', (text, line) => {
    expect(lineSchema(300).parse(text)).toBe(line);
  });

  it.each(['', ' ', '\n', '\u202e', '\u0000', 'x'.repeat(301), 7, null, ['Fever'], { text: 'Fever' }])(
    'refuses %j, of which nothing or too much is left',
    (text) => {
      expect(lineSchema(300).safeParse(text).success).toBe(false);
    },
  );
});

describe('idSchema', () => {
  it('keeps an identifier in the spelling in which identifiers are made', () => {
    expect(idSchema.parse('2DCD670B-C58B-47E2-8E87-D69035DB30BE')).toBe(
      '2dcd670b-c58b-47e2-8e87-d69035db30be',
    );
  });

  it.each(['', 'prior', '2dcd670b', '2dcd670b-c58b-47e2-8e87-d69035db30be ', "' OR 1=1", 12, null])(
    'refuses %j',
    (text) => {
      expect(idSchema.safeParse(text).success).toBe(false);
    },
  );
});
