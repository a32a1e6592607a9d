import { expect } from 'vitest';

/**
 * Every number of `actual` within `tolerance` of `expected`, everything else
 * equal. Thousands of numbers are compared for each assertion: only what
 * differs is put into words.
 */
export function expectClose(actual: unknown, expected: unknown, tolerance = 1e-12): void {
  expect(differences(actual, expected, tolerance, 'value')).toEqual([]);
}

function differences(actual: unknown, expected: unknown, tolerance: number, path: string): string[] {
  if (typeof expected === 'number') {
    const close = typeof actual === 'number' && Math.abs(actual - expected) <= tolerance;
    return close ? [] : [`${path} is ${String(actual)} instead of ${String(expected)}`];
  }
  if (typeof expected !== 'object' || expected === null || typeof actual !== 'object' || actual === null) {
    return Object.is(actual, expected) ? [] : [`${path} is ${String(actual)} instead of ${String(expected)}`];
  }
  const [found, wanted] = [actual as Record<string, unknown>, expected as Record<string, unknown>];
  const keys = Object.keys(wanted);
  const others = Object.keys(found);
  if (others.length !== keys.length || keys.some((key, index) => key !== others[index])) {
    return [`${path} has ${others.join(', ')} instead of ${keys.join(', ')}`];
  }
  return keys.flatMap((key) => differences(found[key], wanted[key], tolerance, `${path}.${key}`));
}
