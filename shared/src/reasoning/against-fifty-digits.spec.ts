import fc from 'fast-check';
import { describe, it } from 'vitest';
import { assess } from './assess.js';
import type { Panel } from './panel.js';
import { arbitraryPanel } from './testing/arbitrary-panel.js';
import { decimalStanding } from './testing/decimal-standing.js';
import { expectClose } from './testing/expect-close.js';
import { randomPanel } from './testing/random-panel.js';

// Powers of 60 digits are slow, so fewer panels than for the laws, and longer than a test usually takes.
const patient = { timeout: 120_000 };
const compare = (panel: Panel) =>
  expectClose(assess(panel, { only: 'standing' }).standing, decimalStanding(panel), 1e-12);

describe('against arithmetic of 60 digits', () => {
  it('small panels of every kind', patient, () => {
    const panels = arbitraryPanel({ candidates: [1, 3], contributors: [0, 3], findings: [0, 3] });
    fc.assert(fc.property(panels, compare), { numRuns: 150, seed: 3 });
  });

  it('six candidates that may coexist', patient, () => {
    const shape = { candidates: 6, findings: 8, pending: 1, contributors: 3 };
    for (const coexistence of [0, 0.05, 0.5]) compare(randomPanel({ ...shape, coexistence }, 11));
  });

  it('300 findings, near the bounds, that nearly cancel', patient, () => {
    const contributors = [
      {
        id: 'c',
        prior: [0.3, 0.3, 0.4],
        likelihoods: Object.fromEntries(
          Array.from({ length: 300 }, (_, index) => {
            const [strong, weak] = [0.999 - index / 1e5, 0.001 + index / 1e5];
            return [`f${index}`, { given: index % 2 ? [strong, weak, 0.5] : [weak, strong - 1e-6, 0.5] }];
          }),
        ),
      },
    ];
    const findings = Array.from({ length: 300 }, (_, index) => ({ id: `f${index}`, observed: 1 }));
    for (const coexistence of [0, 0.1])
      compare({ candidates: ['a', 'b'], coexistence, findings, contributors });
  });

  it('pairs that go together or avoid each other', patient, () => {
    const panel = randomPanel(
      { candidates: 4, findings: 4, pending: 0, contributors: 2, coexistence: 0.2 },
      5,
    );
    const together = [
      { a: 0, b: 1, times: 100 },
      { a: 1, b: 2, times: 0 },
      { a: 3, b: 0, times: 0.01 },
    ];
    compare({ ...panel, together });
  });
});
