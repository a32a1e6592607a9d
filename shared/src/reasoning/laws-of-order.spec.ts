import fc from 'fast-check';
import { describe, it } from 'vitest';
import { type Assessment, assess } from './assess.js';
import type { Panel } from './panel.js';
import { arbitraryPanel } from './testing/arbitrary-panel.js';
import { expectClose } from './testing/expect-close.js';
import { holds } from './testing/laws-hold.js';

/** A panel and a way to shuffle lists of any length. */
const shuffled = fc.record({
  panel: arbitraryPanel({ contributors: [1, 4], findings: [1, 4], candidates: [2, 4] }),
  keys: fc.array(fc.double({ noNaN: true }), { minLength: 5, maxLength: 5 }),
});

/** Positions 0 … length - 1 in an order given by the keys. */
const orderOf = (length: number, keys: readonly number[]) =>
  Array.from({ length }, (_, index) => index).sort((one, other) => keys[one]! - keys[other]! || one - other);

const sorted = <Value>(record: Record<string, Value>) => Object.fromEntries(Object.entries(record).sort());

/** What does not name positions, with the keys in a fixed order. */
function comparable({ own, pooledCells, without, rows, ...rest }: Assessment) {
  return {
    standing: rest.standing,
    pooledPrior: rest.pooledPrior,
    linearPool: rest.linearPool,
    range: rest.range,
    leftOut: rest.leftOut,
    disagreementBits: rest.disagreementBits,
    own: sorted(own),
    pooledCells: sorted(pooledCells),
    contributors: sorted(without.contributors),
    findings: sorted(without.findings),
    evidence: sorted(Object.fromEntries(Object.entries(rows).map(([id, row]) => [id, row.weightOfEvidence]))),
    swing: sorted(Object.fromEntries(Object.entries(rows).map(([id, { swing }]) => [id, swing]))),
    tests: sorted(
      Object.fromEntries(rest.nextTests.map(({ finding, bits, levels }) => [finding, { bits, levels }])),
    ),
  };
}

describe('the order', () => {
  it('of contributors does not matter', () => {
    holds(shuffled, ({ panel, keys }) => {
      const list = panel.contributors ?? [];
      const contributors = orderOf(list.length, keys).map((index) => list[index]!);
      expectClose(comparable(assess({ ...panel, contributors })), comparable(assess(panel)), 1e-11);
    });
  });

  it('of findings does not matter', () => {
    holds(shuffled, ({ panel, keys }) => {
      const list = panel.findings ?? [];
      const findings = orderOf(list.length, keys).map((index) => list[index]!);
      expectClose(comparable(assess({ ...panel, findings })), comparable(assess(panel)), 1e-11);
    });
  });

  it('of candidates does not matter', () => {
    holds(shuffled, ({ panel, keys }) => {
      const k = panel.candidates.length;
      const order = [...orderOf(k, keys), k];
      const place = (list: readonly number[]) => order.map((column) => list[column]!);
      const { standing, own, range, linearPool, rows } = assess(panel);
      const moved = assess(reordered(panel, order));
      expectClose(moved.standing, place(standing), 1e-11);
      expectClose(moved.linearPool, place(linearPool), 1e-11);
      expectClose(
        moved.range.map(({ high }) => high),
        place(range.map(({ high }) => high)),
        1e-11,
      );
      for (const [id, standingAlone] of Object.entries(own))
        expectClose(moved.own[id], place(standingAlone), 1e-11);
      for (const [id, { weightOfEvidence }] of Object.entries(rows)) {
        if (weightOfEvidence.length > 0) {
          expectClose(moved.rows[id]!.weightOfEvidence, place(weightOfEvidence), 1e-10);
        }
      }
    });
  });
});

/** The same panel with its columns in another order. */
function reordered(panel: Panel, order: readonly number[]): Panel {
  return {
    ...panel,
    candidates: order.slice(0, -1).map((column) => panel.candidates[column]!),
    together: (panel.together ?? []).map(({ a, b, times }) => ({
      a: order.indexOf(a),
      b: order.indexOf(b),
      times,
    })),
    contributors: (panel.contributors ?? []).map((one) => ({
      ...one,
      prior: one.prior ? order.map((column) => one.prior![column]!) : null,
      likelihoods: Object.fromEntries(
        Object.entries(one.likelihoods ?? {}).map(([id, { given, ...rest }]) => [
          id,
          { ...rest, given: order.map((column) => given[column] ?? null) },
        ]),
      ),
    })),
  };
}
