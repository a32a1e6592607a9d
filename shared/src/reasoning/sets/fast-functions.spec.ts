import { describe, expect, it } from 'vitest';
import { randomNumbers } from '../testing/random-panel.js';
import { fastLog } from './fast-log.js';
import { FixedPower } from './fixed-power.js';

const random = randomNumbers(7);
const edges = [1, 0.5, 0.25, 0.001, 0.999, 1 - 2 ** -53, 0.5 - 2 ** -55, 2 ** -32, 2 ** -33, 1e-48, 1e-290];

describe('a fixed power', () => {
  const numbers = [
    ...edges,
    ...Array.from({ length: 20_000 }, () => random()),
    ...edges.map((x) => x * random()),
  ];

  it.each([1, 0.8, 0.5, 0.3, 0.18, 0.0123, 0])('of %d is as exact as Math.pow', (exponent) => {
    const raised = Float64Array.from(numbers);
    new FixedPower(exponent).raise(raised);
    const wrong = numbers.filter((x, index) => !(Math.abs(raised[index]! / x ** exponent - 1) < 1e-15));
    expect(wrong).toEqual([]);
  });

  it('takes what rounding makes of 1', () => {
    const raised = Float64Array.of(1 + 2 ** -52);
    new FixedPower(0.5).raise(raised);
    expect(raised[0]).toBeCloseTo(1, 15);
  });
});

describe('a fast logarithm', () => {
  it('is as exact as Math.log, down to the smallest products', () => {
    const numbers = [
      ...edges,
      2 ** -1022,
      ...Array.from({ length: 20_000 }, () => Math.exp(-700 * random())),
    ];
    const wrong = numbers.filter((x) => {
      const exact = Math.log(x);
      return !(Math.abs(fastLog(x) - exact) <= 1e-15 + 4e-16 * Math.abs(exact));
    });
    expect(wrong).toEqual([]);
  });
});
