/*
 * A number seen as its 64 bits, through memory that a Float64Array and a
 * Uint32Array share. Reading the exponent and the first digits this way is what
 * makes fastLog and FixedPower several times as quick as Math.log and Math.pow.
 * Each has the shared memory and the constants it works with in its own file:
 * what is imported is looked up anew in every round of an inner loop.
 */

/** Which half holds the sign, the exponent (11 bits) and the first 20 digits depends on the byte order of the machine. */
export const upper = new Uint8Array(Uint32Array.of(1).buffer)[0] === 1 ? 1 : 0;

/** Steps an octave (from one power of two to the next) is cut into. */
export const stepsPerOctave = 128;
/** Shift that leaves of an upper half the exponent and the number of the step. */
export const stepShift = 13;
export const exponentShift = 20;
export const exponentBias = 1023;

/** Middle of each step of the octave from 1 to 2: no number in the step is further from it than 1/256 of it. */
export const stepMiddles: readonly number[] = Array.from(
  { length: stepsPerOctave },
  (_, step) => 1 + (step + 0.5) / stepsPerOctave,
);
