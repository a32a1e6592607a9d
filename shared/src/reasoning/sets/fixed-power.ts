import * as parts from './number-parts.js';

const written = new Float64Array(1);
const halves = new Uint32Array(written.buffer);
const { upper, stepShift, stepsPerOctave, stepMiddles } = parts;

/** Numbers down to 2^-32 have their place in the table; smaller ones are rare and take the slow way. */
const octaves = 32;
const lowestStep = (parts.exponentBias - octaves) * stepsPerOctave;

/**
 * Raises numbers from 0 to 1 to one fixed exponent (0 to 1), with a relative
 * error below 1e-15.
 *
 * x = c (1 + t) with c the middle of the step that x is in and |t| ≤ 1/256, so
 * x^γ = c^γ (1 + t)^γ: c^γ and 1/c come from a table, the rest is five terms of
 * the binomial series. A panel needs tens of millions of powers and only a few
 * exponents.
 *
 * @example new FixedPower(0.5).raise(Float64Array.of(0.25, 1)) // 0.5 and 1 are in its place
 */
export class FixedPower {
  private readonly raised = new Float64Array(octaves * stepsPerOctave + 1);
  private readonly inverses = new Float64Array(octaves * stepsPerOctave + 1);
  private readonly second: number;
  private readonly third: number;
  private readonly fourth: number;
  private readonly fifth: number;

  constructor(private readonly exponent: number) {
    const middlesRaised = stepMiddles.map((middle) => middle ** exponent);
    for (let octave = 0; octave <= octaves; octave += 1) {
      const scale = 2 ** (octave - octaves);
      const scaleRaised = scale ** exponent;
      for (let step = 0; step < stepsPerOctave; step += 1) {
        // Of the octave from 1 to 2 only the first step is kept: 1, and what rounding adds to it.
        const place = octave * stepsPerOctave + step;
        if (place >= this.raised.length) break;
        this.raised[place] = scaleRaised * middlesRaised[step]!;
        this.inverses[place] = 1 / (scale * stepMiddles[step]!);
      }
    }
    this.second = (exponent * (exponent - 1)) / 2;
    this.third = (this.second * (exponent - 2)) / 3;
    this.fourth = (this.third * (exponent - 3)) / 4;
    this.fifth = (this.fourth * (exponent - 4)) / 5;
  }

  /** Raises every number of a list, in place. What a round needs is at hand in the function, not looked up. */
  raise(numbers: Float64Array): void {
    const { exponent, raised, inverses, second, third, fourth, fifth } = this;
    for (let index = 0; index < numbers.length; index += 1) {
      const x = numbers[index]!;
      written[0] = x;
      const step = (halves[upper]! >>> stepShift) - lowestStep;
      if (step >= 0 && step < raised.length) {
        const t = x * inverses[step]! - 1;
        const series = exponent + t * (second + t * (third + t * (fourth + t * fifth)));
        numbers[index] = raised[step]! * (1 + t * series);
      } else numbers[index] = x ** exponent;
    }
  }
}
