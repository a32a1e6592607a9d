import { describe, expect, it } from 'vitest';
import { setsUpTo } from '../oracle/set-weights.js';
import { membersOf } from './explains.js';
import { largestCounted, mostSets, setTable } from './set-table.js';

function listed(candidates: number): string[] {
  const { low, high, starts, lows } = setTable(candidates);
  return [...high.members].flatMap((bits, h) =>
    [...lows.subarray(starts[h], starts[h + 1])].map((l) =>
      [...membersOf(low.members[l]!, low.from), ...membersOf(bits, high.from)].join(' '),
    ),
  );
}

describe('the sets that are counted', () => {
  it.each([1, 2, 5, 8, 11, 17, 24])(
    'of %d candidates are those of the definition, each once',
    (candidates) => {
      const expected = setsUpTo(candidates, largestCounted(candidates)).map((members) => members.join(' '));
      expect(listed(candidates).sort()).toEqual(expected.sort());
    },
  );

  it('are all sets up to 16 candidates, and never more than 2^16', () => {
    expect(setTable(16)).toMatchObject({ size: mostSets, largest: 16 });
    expect(setTable(17)).toMatchObject({ size: mostSets, largest: 8 });
    expect(setTable(30).largest).toBe(4);
    for (let candidates = 17; candidates <= 30; candidates += 1) {
      expect(setTable(candidates).size).toBeLessThanOrEqual(mostSets);
    }
  });

  it('begin with the empty set', () => expect(listed(20)[0]).toBe(''));
});
