import { describe, expect, it } from 'vitest';
import { axisSteps, labelSpots, stair } from './scatter-geometry';

describe('the steps of an axis', () => {
  it('are round, begin at nothing and cover the largest', () => {
    expect(axisSteps(13, 5)).toEqual([0, 5, 10, 15]);
    expect(axisSteps(0.17, 4)).toEqual([0, 0.05, 0.1, 0.15, 0.2]);
    expect(axisSteps(1400, 5)).toEqual([0, 500, 1000, 1500]);
    expect(axisSteps(3, 5)).toEqual([0, 1, 2, 3]);
  });
  it('stand even where nothing takes anything', () => {
    expect(axisSteps(0, 5)).toEqual([0, 1]);
    expect(axisSteps(Number.NEGATIVE_INFINITY, 5)).toEqual([0, 1]);
  });
  it.each([0.0041, 0.3, 1, 7, 99, 3650, 10_000_000])('never need more than asked for %d', (largest) => {
    const steps = axisSteps(largest, 5);
    expect(steps.length).toBeLessThanOrEqual(6);
    expect(steps.at(-1)).toBeGreaterThanOrEqual(largest);
  });
});

describe('the stair of what can be settled', () => {
  const dot = (id: string, takes: number | null, settles: number) => ({ id, takes, settles });
  it('goes up only where something that takes more settles more', () => {
    expect(stair([dot('a', 6, 0.17), dot('b', 5, 0.07), dot('c', 14, 0.08), dot('d', 2, 0.02)])).toEqual([
      { takes: 2, settles: 0.02 },
      { takes: 5, settles: 0.07 },
      { takes: 6, settles: 0.17 },
    ]);
  });
  it('takes the better of two that take the same, and no test of which nothing was said', () => {
    expect(stair([dot('a', 3, 0.1), dot('b', 3, 0.2), dot('c', null, 0.9)])).toEqual([
      { takes: 3, settles: 0.2 },
    ]);
    expect(stair([dot('a', null, 0.3)])).toEqual([]);
  });
});

describe('the numbers of the dots', () => {
  it('stand beside their dot and on no other', () => {
    const dots = [
      { x: 100, y: 100 },
      { x: 112, y: 100 },
      { x: 100, y: 110 },
      { x: 95, y: 95 },
    ];
    const spots = labelSpots(dots);
    spots.forEach((spot, index) => {
      const own = dots[index] ?? { x: 0, y: 0 };
      expect(Math.hypot(spot.x - own.x, spot.y - own.y)).toBeLessThan(25);
      const middle = { x: spot.x, y: spot.y - 4 };
      for (const dot of dots)
        expect(Math.abs(dot.x - middle.x) >= 8 || Math.abs(dot.y - middle.y) >= 8).toBe(true);
    });
    expect(new Set(spots.map(({ x, y }) => `${String(x)} ${String(y)}`)).size).toBe(4);
  });
});
