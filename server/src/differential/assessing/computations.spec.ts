import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { assess } from '@weighhouse/shared/reasoning/assess';
import { randomPanel } from '@weighhouse/shared/reasoning/testing/random-panel';
import { describe, expect, it } from 'vitest';
import { computations } from './computations.js';

describe('what lists show', () => {
  it.each([0, 0.05, 0.3])('is what the whole assessment says, at coexistence %s', (coexistence) => {
    for (let seed = 1; seed <= 20; seed += 1) {
      const panel = randomPanel(
        { candidates: 5, findings: 8, pending: 2, contributors: 4, coexistence },
        seed,
      ) as PanelView;
      const { standing, disagreementBits } = assess(panel);
      expect(computations.leading(panel)).toEqual({ standing, disagreementBits });
      expect(computations.standing(panel).standing).toEqual(standing);
    }
  });
});
