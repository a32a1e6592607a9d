import fc from 'fast-check';
import { vi } from 'vitest';

// A thousand whole assessments take longer than the five seconds a test usually has.
vi.setConfig({ testTimeout: 120_000 });

/** Runs of every law; a fixed seed keeps the tests the same from one run to the next. */
const runs = { numRuns: 1000, seed: 20_26 };

/** Checks a law on a thousand random values; `law` throws where it does not hold. */
export function holds<Value>(values: fc.Arbitrary<Value>, law: (value: Value) => void): void {
  fc.assert(fc.property(values, law), runs);
}
