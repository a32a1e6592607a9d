import { expect } from 'vitest';
import type { Assessment } from '../assessment.js';

/** No NaN, Infinity or negative share anywhere, and every distribution sums to 1. */
export function expectSound(assessment: Assessment): void {
  expect(faults(assessment)).toEqual([]);
}

function faults(assessment: Assessment): string[] {
  const { explains, sets, pooledPrior, pooledCells, nextTests, range, disagreementBits } = assessment;
  const oneCause = explains.length === 0 && sets.every(({ members }) => members.length < 2);
  const distributions = [
    pooledPrior,
    ...Object.values(pooledCells).flat(),
    ...nextTests.map(({ levels }) => levels.map(({ p }) => p)),
    ...(oneCause ? standingsOf(assessment) : []),
  ];
  const shares = [...standingsOf(assessment), ...distributions].flat();
  const amounts = [
    ...nextTests.flatMap(({ bits, leaderChanges }) => [bits, leaderChanges]),
    disagreementBits,
  ];
  return [
    ...notFinite(assessment, 'assessment'),
    ...distributions
      .map((distribution) => distribution.reduce((sum, share) => sum + share, 0))
      .filter((sum) => !(Math.abs(sum - 1) <= 1e-12))
      .map((sum) => `a distribution sums to ${String(sum)}`),
    ...shares
      .filter((share) => !(share >= 0 && share <= 1 + 1e-12))
      .map((share) => `a share is ${String(share)}`),
    ...amounts.filter((amount) => !(amount >= 0)).map((amount) => `an amount is ${String(amount)}`),
    ...range.filter(({ low, high }) => !(low <= high)).map(() => 'a range is upside down'),
  ];
}

function standingsOf({ standing, linearPool, own, without, nextTests }: Assessment): number[][] {
  return [
    standing,
    linearPool,
    ...Object.values(own),
    ...Object.values(without.findings),
    ...Object.values(without.contributors).filter((one) => one !== null),
    ...nextTests.flatMap(({ levels }) => levels.map((level) => level.standing)),
  ];
}

function notFinite(value: unknown, path: string): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} is ${String(value)}`];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, entry]) => notFinite(entry, `${path}.${key}`));
}
