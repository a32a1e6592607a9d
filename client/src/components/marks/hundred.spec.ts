import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { describe, expect, it } from 'vitest';
import { hundredOf, placeOf } from './hundred';

/** Every tenth of a per mille from 0 to 1, both ends among them. */
const shares = Array.from({ length: 10_001 }, (_, tenths) => tenths / 10_000);

describe('the picture of a hundred', () => {
  it('draws as many whole marks as the words say, whatever the share', () => {
    for (const share of shares) {
      const { outOf100, words } = naturalFrequency(share);
      const { whole, part } = hundredOf(outOf100);
      const said = part === 0 ? `${String(whole)} of 100` : `${whole === 0 ? 'under 1' : 'over 99'} of 100`;
      expect(said, String(share)).toBe(words);
    }
  });

  it('has a hundred places, and is never empty and never full of whole marks', () => {
    for (const share of shares) {
      const { whole, part, empty } = hundredOf(naturalFrequency(share).outOf100);
      expect(whole + part + empty).toBe(100);
      expect(whole + part).toBeGreaterThan(0);
      expect(whole).toBeLessThan(100);
    }
  });

  it('fills ten rows of ten, each place once', () => {
    const places = Array.from({ length: 100 }, (_, mark) => placeOf(mark));
    expect(new Set(places.map(({ row, column }) => `${String(row)} ${String(column)}`)).size).toBe(100);
    expect(places[99]).toEqual({ row: 9, column: 9 });
  });
});
