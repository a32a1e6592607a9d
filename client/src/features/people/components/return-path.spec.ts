import { describe, expect, it } from 'vitest';
import { returnPath } from './return-path';

describe('returnPath', () => {
  it('keeps a path with its question mark and hash', () => {
    expect(returnPath('/cases/1/reports?report=2&page=3#x')).toBe('/cases/1/reports?report=2&page=3#x');
  });

  it.each([
    null,
    '',
    'cases',
    'https://elsewhere.example/',
    '//elsewhere.example',
    '/\\elsewhere.example',
    'javascript:alert(1)',
    '/sign-in?to=/sign-in',
  ])('leads to today instead of %s', (asked) => {
    expect(returnPath(asked)).toBe('/');
  });
});
