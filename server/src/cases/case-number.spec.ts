import { describe, expect, it } from 'vitest';
import { caseNumber } from './case-number.js';

describe('caseNumber', () => {
  it.each([
    [2026, 417, '26-0417'],
    [2100, 1, '00-0001'],
    [2026, 12345, '26-12345'],
  ])('of case %2$d in %1$d', (year, running, number) => {
    expect(caseNumber(year, running)).toBe(number);
  });
});
