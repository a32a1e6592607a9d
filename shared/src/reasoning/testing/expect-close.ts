import { expect } from 'vitest';

/** Every number of `actual` within `tolerance` of `expected`; the shapes must be the same. */
export function expectClose(actual: unknown, expected: unknown, tolerance = 1e-12, path = ''): void {
  if (typeof expected === 'number') {
    expect(typeof actual, path).toBe('number');
    expect(
      Math.abs((actual as number) - expected),
      `${path}: ${String(actual)} is not ${expected}`,
    ).toBeLessThanOrEqual(tolerance);
  } else if (typeof expected === 'object' && expected !== null) {
    expect(typeof actual, path).toBe('object');
    expect(actual, path).not.toBeNull();
    const [found, wanted] = [actual as Record<string, unknown>, expected as Record<string, unknown>];
    expect(Object.keys(found), path).toEqual(Object.keys(wanted));
    for (const key of Object.keys(wanted)) expectClose(found[key], wanted[key], tolerance, `${path}.${key}`);
  } else {
    expect(actual, path).toBe(expected);
  }
}
