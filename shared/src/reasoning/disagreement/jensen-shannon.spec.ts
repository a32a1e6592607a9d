import { describe, expect, it } from 'vitest';
import { expectClose } from '../testing/expect-close.js';
import { jensenShannonBits } from './jensen-shannon.js';

describe('how far distributions are apart', () => {
  it('is the square of SciPy’s distance, in bits (SciPy docs, jensenshannon([1, 0], [0.5, 0.5]): 0.4645…; from memory, and computed by SciPy 1.10.1)', () => {
    const distributions = [
      [1, 0],
      [0.5, 0.5],
    ];
    const nats = jensenShannonBits(distributions, [1, 1]) * Math.LN2;
    expectClose(Math.sqrt(nats), 0.46450140402245893);
  });

  it('is one bit where two exclude each other, and the entropy of the weights where their weights differ (Lin 1991)', () => {
    const apart = [
      [1, 0],
      [0, 1],
    ];
    expectClose(jensenShannonBits(apart, [1, 1]), 1);
    expectClose(jensenShannonBits(apart, [3, 1]), -(0.75 * Math.log2(0.75) + 0.25 * Math.log2(0.25)));
  });

  it('is nothing where all agree, and does not count who weighs nothing', () => {
    expect(
      jensenShannonBits(
        [
          [0.3, 0.7],
          [0.3, 0.7],
          [0.9, 0.1],
        ],
        [1, 2, 0],
      ),
    ).toBeCloseTo(0, 15);
  });
});
