import * as parts from './number-parts.js';

const written = new Float64Array(1);
const halves = new Uint32Array(written.buffer);
const { upper, stepShift, exponentShift } = parts;
const stepMask = parts.stepsPerOctave - 1;

const logs = Float64Array.from(parts.stepMiddles, Math.log);
const inverses = Float64Array.from(parts.stepMiddles, (middle) => 1 / middle);
/** For each exponent as it is stored what brings a number into the octave from 1 to 2, and the logarithm of that. */
const scales = Float64Array.from({ length: 2046 }, (_, stored) => 2 ** (parts.exponentBias - stored));
const scaleLogs = Float64Array.from(
  { length: 2046 },
  (_, stored) => (stored - parts.exponentBias) * Math.LN2,
);

/**
 * The natural logarithm of a positive number that is neither below 2^-1022 nor
 * infinite, within 2e-16 of 1 and of the result's own size.
 *
 * x = 2^e c (1 + t) with c the middle of a step and |t| ≤ 1/256; ln c comes from
 * a table and ln(1 + t) from six terms of its series.
 *
 * @example fastLog(1) // 0
 */
export function fastLog(x: number): number {
  written[0] = x;
  const half = halves[upper]!;
  const stored = half >>> exponentShift;
  const step = (half >>> stepShift) & stepMask;
  const t = x * scales[stored]! * inverses[step]! - 1;
  const series = 1 + t * (-1 / 2 + t * (1 / 3 + t * (-1 / 4 + t * (1 / 5 - t / 6))));
  return scaleLogs[stored]! + (logs[step]! + t * series);
}
