import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expectClose } from '../testing/expect-close.js';
import { distribution } from '../testing/arbitrary-panel.js';
import { holds } from '../testing/laws-hold.js';
import { murphyDecomposition } from './murphy.js';
import { type Forecast, equalCountBins, reliabilityBin, reliabilityBins } from './reliability-bins.js';
import { brierScore, logScoreBits } from './scores.js';
import { suggestedWeight } from './suggested-weight.js';
import { wilsonInterval } from './wilson-interval.js';

const mean = (numbers: readonly number[]) =>
  numbers.reduce((sum, number) => sum + number, 0) / numbers.length;
const forecasts = fc.array(
  fc.record({
    share: fc.oneof(fc.double({ min: 0, max: 1, noNaN: true }), fc.constantFrom(0, 0.1, 0.5, 1)),
    happened: fc.boolean(),
  }),
  { minLength: 1, maxLength: 40 },
);

describe('the Brier score', () => {
  it('is twice the binary one of scikit-learn’s example, 0.0375 (Brier 1950; quoted from memory)', () => {
    const [happened, share] = [
      [0, 1, 1, 0],
      [0.1, 0.9, 0.8, 0.3],
    ];
    const scores = share.map((p, index) => brierScore([1 - p, p], happened[index]!));
    expectClose(mean(scores) / 2, 0.0375);
  });

  it('is 2 for certainty of the wrong one and 0 for the right one', () => {
    expect([brierScore([1, 0, 0], 1), brierScore([1, 0, 0], 0)]).toEqual([2, 0]);
  });

  it('rewards saying what one thinks (it is proper)', () => {
    holds(fc.tuple(distribution(4), distribution(4)), ([belief, said]) => {
      const expected = (standing: number[]) =>
        belief.reduce((sum, p, column) => sum + p * brierScore(standing, column), 0);
      expect(expected(belief)).toBeLessThanOrEqual(expected(said) + 1e-12);
    });
  });

  it.each([-1, 3, 0.5, NaN])('refuses column %d of three', (column) => {
    expect(() => brierScore([0.2, 0.3, 0.5], column)).toThrow(RangeError);
    expect(() => logScoreBits([0.2, 0.3, 0.5], column)).toThrow(RangeError);
  });
});

describe('the log score', () => {
  it('is that of scikit-learn’s example, 0.21616 nats (Good 1952; quoted from memory)', () => {
    // Columns: ham, spam.
    const cases: [number[], number][] = [
      [[0.1, 0.9], 1],
      [[0.9, 0.1], 0],
      [[0.8, 0.2], 0],
      [[0.35, 0.65], 1],
    ];
    expectClose(
      mean(cases.map(([standing, column]) => logScoreBits(standing, column))) * Math.LN2,
      0.21616187468057912,
    );
  });

  it('is 0, not -0, for certainty', () => expect(Object.is(logScoreBits([1, 0], 0), 0)).toBe(true));
});

describe('reliability bins', () => {
  const shares = [0.1, 0.2, 0.3, 0.4, 0.65, 0.7, 0.8, 0.9, 1];
  const example = shares.map((share, index): Forecast => ({ share, happened: index >= 4 }));

  it('are those of scikit-learn’s calibration_curve, cut by width as it does (quoted from memory)', () => {
    const widths = [example.slice(0, 3), example.slice(3, 5), example.slice(5)].map(reliabilityBin);
    expectClose(
      widths.map(({ happened }) => happened),
      [0, 0.5, 1],
    );
    expectClose(
      widths.map(({ meanShare }) => meanShare),
      [0.2, 0.525, 0.85],
    );
    expect(widths.map(({ count }) => count)).toEqual([3, 2, 4]);
  });

  it('have about equal counts', () => {
    expect(reliabilityBins(example, 3).map(({ count }) => count)).toEqual([3, 3, 3]);
    expect(reliabilityBins(example, 2).map(({ count }) => count)).toEqual([5, 4]);
    expect(reliabilityBins(example, 20).map(({ count }) => count)).toEqual(shares.map(() => 1));
  });

  it('keep equal shares together and lose nobody', () => {
    holds(fc.tuple(forecasts, fc.integer({ min: 1, max: 12 })), ([list, bins]) => {
      const groups = equalCountBins(list, bins);
      expect(groups.flat()).toHaveLength(list.length);
      expect(groups.length).toBeLessThanOrEqual(bins);
      groups.slice(1).forEach((group, index) => {
        expect(group[0]!.share).toBeGreaterThan(groups[index]!.at(-1)!.share);
      });
    });
  });

  it('of nothing are none', () => expect(reliabilityBins([], 5)).toEqual([]));
  it('refuse what is no share', () => {
    expect(() => reliabilityBins([{ share: 1.2, happened: true }], 1)).toThrow(RangeError);
    expect(() => reliabilityBins([{ share: NaN, happened: true }], 1)).toThrow(RangeError);
    expect(() => reliabilityBins(example, 0)).toThrow(RangeError);
  });
});

describe('the Wilson interval', () => {
  it('is that of Newcombe 1998 (Stat. Med. 17:857-872, table I; quoted from memory, and recomputed)', () => {
    const rounded = (successes: number, trials: number) => {
      const { low, high } = wilsonInterval(successes, trials);
      return [low.toFixed(4), high.toFixed(4)];
    };
    expect(rounded(81, 263)).toEqual(['0.2553', '0.3662']);
    expect(rounded(15, 148)).toEqual(['0.0624', '0.1605']);
    expect(rounded(0, 20)).toEqual(['0.0000', '0.1611']);
    expect(rounded(1, 29)).toEqual(['0.0061', '0.1718']);
  });

  it('holds the share it is for', () => {
    holds(
      fc.tuple(fc.integer({ min: 1, max: 500 }), fc.double({ min: 0, max: 1, noNaN: true })),
      ([trials, share]) => {
        const successes = Math.round(share * trials);
        const { low, high } = wilsonInterval(successes, trials);
        expect(low).toBeLessThanOrEqual(successes / trials);
        expect(high).toBeGreaterThanOrEqual(successes / trials);
        expect(low).toBeGreaterThanOrEqual(0);
        expect(high).toBeLessThanOrEqual(1);
      },
    );
  });

  it('refuses what is no count', () => {
    for (const [successes, trials] of [
      [1, 0],
      [3, 2],
      [-1, 2],
      [NaN, 2],
    ] as const) {
      expect(() => wilsonInterval(successes, trials)).toThrow(RangeError);
    }
  });
});

describe('Murphy’s decomposition', () => {
  const added = (groups: Forecast[][]) => {
    const { reliability, resolution, uncertainty, withinVariance, withinCovariance } =
      murphyDecomposition(groups);
    return reliability - resolution + uncertainty + withinVariance - withinCovariance;
  };

  it('of three groups of equal shares (own computation from Murphy 1973)', () => {
    const group = (share: number, count: number, events: number) =>
      Array.from({ length: count }, (_, index): Forecast => ({ share, happened: index < events }));
    const parts = murphyDecomposition([group(0.1, 10, 1), group(0.4, 5, 3), group(0.8, 5, 4)]);
    expectClose(parts, {
      brier: 0.155,
      reliability: 0.01,
      resolution: 0.095,
      uncertainty: 0.24,
      withinVariance: 0,
      withinCovariance: 0,
    });
    expectClose(1 - parts.brier / parts.uncertainty, 0.3541666666666667);
  });

  it('adds up, whatever the groups', () => {
    holds(fc.tuple(forecasts, fc.integer({ min: 1, max: 10 })), ([list, bins]) => {
      const groups = equalCountBins(list, bins);
      expectClose(added(groups), murphyDecomposition(groups).brier, 1e-14);
    });
  });

  it('does not add up without the terms within the groups, which is why they are there', () => {
    const groups = [
      [
        { share: 0.1, happened: false },
        { share: 0.9, happened: true },
      ],
    ];
    const { brier, reliability, resolution, uncertainty } = murphyDecomposition(groups);
    expect(Math.abs(reliability - resolution + uncertainty - brier)).toBeGreaterThan(0.2);
    expectClose(added(groups), brier, 1e-15);
  });

  it('refuses nothing at all', () => expect(() => murphyDecomposition([])).toThrow(RangeError));
});

describe('the suggested weight', () => {
  const cases = (count: number, own: number, panel: number) =>
    Array.from({ length: count }, () => ({ own, panel }));

  it('is none below ten cases', () => expect(suggestedWeight(cases(9, 0.1, 0.2))).toBeNull());
  it('is 1 for those as good as the panel', () => expect(suggestedWeight(cases(10, 0.4, 0.4))).toBe(1));
  it('moves half way to the ratio after ten cases', () => {
    expect(suggestedWeight(cases(10, 0.2, 0.4))).toBeCloseTo(1.5, 12);
    expect(suggestedWeight(cases(10, 0.8, 0.4))).toBeCloseTo(0.75, 12);
  });
  it('stays within 0.33 and 3', () => {
    expect(suggestedWeight(cases(1000, 0.001, 1))).toBe(3);
    expect(suggestedWeight(cases(1000, 2, 0.001))).toBe(0.33);
    expect(suggestedWeight(cases(10, 0, 1))).toBe(3);
    expect(suggestedWeight(cases(10, 0, 0))).toBe(1);
  });
  it('refuses what is no Brier score', () => {
    expect(() => suggestedWeight(cases(10, 2.1, 1))).toThrow(RangeError);
    expect(() => suggestedWeight(cases(3, NaN, 1))).toThrow(RangeError);
  });
});
