import { expect } from 'vitest';
import type { Assessment } from '../assessment.js';

/** No NaN, Infinity or negative share anywhere, and every distribution sums to 1. */
export function expectSound(assessment: Assessment): void {
  expectFinite(assessment, '');
  const oneCause =
    assessment.explains.length === 0 && assessment.sets.every(({ members }) => members.length < 2);
  expectSumsToOne(assessment.pooledPrior, 'pooledPrior');
  for (const cell of Object.values(assessment.pooledCells).flat()) expectSumsToOne(cell, 'pooledCells');
  const standings = [
    assessment.standing,
    assessment.linearPool,
    ...Object.values(assessment.own),
    ...Object.values(assessment.without.findings),
    ...Object.values(assessment.without.contributors).filter((one) => one !== null),
    ...assessment.nextTests.flatMap(({ levels }) => levels.map(({ standing }) => standing)),
  ];
  for (const standing of standings) {
    for (const share of standing) expect(share, 'a share').toBeGreaterThanOrEqual(0);
    for (const share of standing) expect(share, 'a share').toBeLessThanOrEqual(1 + 1e-12);
    if (oneCause) expectSumsToOne(standing, 'a standing');
  }
  for (const { bits, leaderChanges, levels } of assessment.nextTests) {
    expect(bits).toBeGreaterThanOrEqual(0);
    expect(leaderChanges).toBeGreaterThanOrEqual(0);
    expectSumsToOne(
      levels.map(({ p }) => p),
      'the levels of a test',
    );
  }
  expect(assessment.disagreementBits).toBeGreaterThanOrEqual(0);
  for (const { low, high } of assessment.range) expect(low).toBeLessThanOrEqual(high);
}

function expectSumsToOne(shares: readonly number[], what: string): void {
  expect(Math.abs(shares.reduce((sum, share) => sum + share, 0) - 1), what).toBeLessThanOrEqual(1e-12);
}

function expectFinite(value: unknown, path: string): void {
  if (typeof value === 'number') expect(Number.isFinite(value), `${path} is ${value}`).toBe(true);
  else if (typeof value === 'object' && value !== null) {
    for (const [key, entry] of Object.entries(value)) expectFinite(entry, `${path}.${key}`);
  }
}
