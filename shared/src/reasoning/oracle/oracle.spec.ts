import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Assessment, type Panel, assess } from '../assess.js';
import { arbitraryPanel } from '../testing/arbitrary-panel.js';
import { expectClose } from '../testing/expect-close.js';
import { holds } from '../testing/laws-hold.js';
import { randomPanel } from '../testing/random-panel.js';
import { readPanel } from '../validation/read-panel.js';
import { assessPlainly, judgePlainly } from './assess-plainly.js';

/** Everything but decibans within 1e-12; those are up to 300 times as large and get 1e-10. */
function expectSame(fast: Assessment, plain: Assessment): void {
  const { rows: fastRows, ...fastRest } = fast;
  const { rows: plainRows, ...plainRest } = plain;
  expectClose(fastRest, plainRest, 1e-12);
  expectClose(fastRows, plainRows, 1e-10);
}

const both = (panel: Panel) => expectSame(assess(panel), assessPlainly(readPanel(panel)));

describe('the engine and the plain one say the same', () => {
  it('on small panels of every kind', () => holds(arbitraryPanel(), both));

  it('under one cause', () => {
    holds(
      arbitraryPanel({ coexistence: 'none', contributors: [1, 6], findings: [1, 8], candidates: [1, 6] }),
      both,
    );
  });

  it('with sets of up to six candidates', () => {
    holds(
      arbitraryPanel({ coexistence: 'some', contributors: [1, 3], findings: [1, 3], candidates: [5, 6] }),
      both,
    );
  });

  it('with up to six levels', () => {
    holds(arbitraryPanel({ levels: 6, contributors: [1, 3], candidates: [2, 3] }), both);
  });

  it('on panels as long conferences leave them', () => {
    const shapes = fc.record({
      candidates: fc.integer({ min: 1, max: 8 }),
      findings: fc.integer({ min: 5, max: 12 }),
      pending: fc.integer({ min: 0, max: 4 }),
      contributors: fc.integer({ min: 1, max: 4 }),
      coexistence: fc.constantFrom(0, 0.05, 0.3),
    });
    fc.assert(
      fc.property(shapes, fc.nat(), (shape, seed) => both(randomPanel(shape, seed))),
      { numRuns: 60, seed: 1 },
    );
  });

  it('where only sets of up to a size are counted', () => {
    for (const [candidates, times] of [
      [24, 1],
      [30, 5],
    ] as const) {
      const shape = { candidates, findings: 2, pending: 0, contributors: 2, coexistence: 0.2 };
      const panel = { ...randomPanel(shape, candidates), together: [{ a: 0, b: candidates - 1, times }] };
      const { exact, leftOut, standing } = assess(panel);
      const plain = judgePlainly(readPanel(panel));
      expectClose(
        { exact, leftOut, standing },
        { exact: false, leftOut: plain.now.leftOut, standing: plain.standing },
      );
      expect(leftOut === null).toBe(times !== 1);
    }
  });
});
