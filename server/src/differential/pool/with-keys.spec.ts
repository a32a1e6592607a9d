import { assess } from '@weighhouse/shared/reasoning/assess';
import { randomPanel } from '@weighhouse/shared/reasoning/testing/random-panel';
import { describe, expect, it } from 'vitest';
import { withKeys } from './with-keys.js';

const plain = (value: unknown): unknown => JSON.parse(JSON.stringify(value));

describe('an assessment under other keys', () => {
  it('is the one that the panel under those keys has, and leaves no old key behind', () => {
    for (let seed = 1; seed <= 20; seed += 1) {
      const panel = randomPanel(
        { candidates: 4, findings: 7, pending: 2, contributors: 4, coexistence: seed % 2 ? 0 : 0.1 },
        seed,
      );
      const people = (panel.contributors ?? []).map((one, k) => ({ ...one, id: `person-${String(k)}` }));
      const keys = new Map(people.map(({ id }, k) => [id, `c${String(k + 1)}`]));
      const unnamed = people.map((one) => ({ ...one, id: keys.get(one.id) ?? '' }));
      const renamed = withKeys(assess({ ...panel, contributors: people }), keys);
      expect(plain(renamed)).toEqual(plain(assess({ ...panel, contributors: unnamed })));
      expect(JSON.stringify(renamed)).not.toContain('person-');
    }
  });

  it('is refused where a key is missing, rather than left as it was', () => {
    const panel = { candidates: ['a'], contributors: [{ id: 'person', prior: [0.5, 0.5] }] };
    expect(() => withKeys(assess(panel), new Map())).toThrow('every contributor has a key');
  });
});
