import { describe, expect, it } from 'vitest';
import { barPlace, beamPlace, beamShape } from './beam-geometry';

describe('the place of a weight of evidence', () => {
  it('is the centre line at zero and the ends at 6 decibans', () => {
    expect([0, 6, -6, 3, -1.2].map(beamPlace)).toEqual([50, 100, 0, 75, 40]);
  });

  it('is held at the ends beyond the reach', () => {
    expect([40, -40].map(beamPlace)).toEqual([100, 0]);
  });
});

describe('a beam', () => {
  it('goes right where it counts for a candidate', () => {
    expect(beamShape(2.4)).toEqual({ start: 50, width: 20, side: 'for', beyond: false });
  });

  it('goes left where it counts against', () => {
    expect(beamShape(-2.4)).toEqual({ start: 30, width: 20, side: 'against', beyond: false });
  });

  it('has an arrow only beyond 6 decibans', () => {
    expect(beamShape(6).beyond).toBe(false);
    expect(beamShape(6.1)).toEqual({ start: 50, width: 50, side: 'for', beyond: true });
    expect(beamShape(-22)).toEqual({ start: 0, width: 50, side: 'against', beyond: true });
  });

  it('has no side at zero', () => {
    expect(beamShape(0)).toEqual({ start: 50, width: 0, side: 'neither', beyond: false });
  });
});

it('keeps a share that misses its bounds by rounding inside the bar', () => {
  expect([-1e-12, 0, 0.5, 1 + 1e-12].map(barPlace)).toEqual([0, 0, 50, 100]);
});
