import type { TrailEntry } from '@weighhouse/shared/contracts/trail';
import { describe, expect, it } from 'vitest';
import { runsOf } from './trail-runs';

const entry = (
  id: number,
  who: string | null,
  sentence: string,
  at = `2026-12-01T10:0${String(id)}:00Z`,
): TrailEntry => ({
  id,
  at,
  who,
  action: 'x',
  sentence,
});

describe('runsOf', () => {
  it('tells what somebody did several times in a row once, with how often and since when', () => {
    const runs = runsOf([
      entry(5, 'A', 'saved'),
      entry(4, 'A', 'saved'),
      entry(3, 'A', 'saved'),
      entry(2, 'B', 'saved'),
    ]);
    expect(runs.map(({ times, since, entry: { who } }) => [who, times, since])).toEqual([
      ['A', 3, '2026-12-01T10:03:00Z'],
      ['B', 1, '2026-12-01T10:02:00Z'],
    ]);
  });

  it('keeps apart what was said between', () => {
    expect(runsOf([entry(3, 'A', 'saved'), entry(2, 'A', 'opened'), entry(1, 'A', 'saved')])).toHaveLength(3);
    expect(runsOf([entry(2, null, 'saved'), entry(1, 'A', 'saved')])).toHaveLength(2);
    expect(runsOf([])).toEqual([]);
  });
});
