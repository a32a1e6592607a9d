import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assess } from './assess.js';
import type { Panel, PanelContributor } from './panel.js';
import { arbitraryPanel, distribution } from './testing/arbitrary-panel.js';
import { expectClose } from './testing/expect-close.js';
import { expectSound } from './testing/expect-sound.js';
import { holds } from './testing/laws-hold.js';
import { panelOfPriors } from './testing/quick-panel.js';

const people = (panel: Panel): readonly PanelContributor[] => panel.contributors ?? [];
const sum = (numbers: readonly number[]) => numbers.reduce((total, number) => total + number, 0);
const weightsOf = (panel: Panel) => people(panel).map(({ weight }) => weight ?? 1);
const shares = (weights: readonly number[]) => weights.map((weight) => weight / sum(weights));

describe('every accepted panel', () => {
  it('is answered with finite shares that sum to 1', () => {
    holds(arbitraryPanel(), (panel) => expectSound(assess(panel)));
  });

  it('has a leader standing that `only: standing` gives alone', () => {
    holds(arbitraryPanel(), (panel) => {
      expectClose(assess(panel, { only: 'standing' }).standing, assess(panel).standing);
    });
  });
});

describe('unanimity', () => {
  it('leaves what all say as it is', () => {
    const everyone = fc.record({
      panel: arbitraryPanel({ contributors: [1, 1], blanks: false }),
      weights: fc.array(fc.integer({ min: 1, max: 30 }), { minLength: 1, maxLength: 5 }),
    });
    holds(everyone, ({ panel, weights }) => {
      const one = people(panel)[0]!;
      const contributors = weights.map((weight, index) => ({ ...one, id: `${index}`, weight: weight / 10 }));
      const alone = assess(panel);
      const together = assess({ ...panel, contributors });
      expectClose(together.pooledPrior, alone.pooledPrior);
      expectClose(together.pooledCells, alone.pooledCells);
      expectClose(together.standing, alone.standing);
      for (const own of Object.values(together.own)) expectClose(own, alone.standing);
      expectClose(together.disagreementBits, 0);
    });
  });
});

describe('external Bayesianity', () => {
  it('with one shared likelihood the log pool of the own standings is the standing', () => {
    const panels = arbitraryPanel({
      contributors: [1, 4],
      blanks: false,
      coexistence: 'none',
      zeroWeights: false,
    });
    holds(panels, (panel) => {
      const shared = people(panel)[0]!.likelihoods ?? {};
      const contributors = people(panel).map((one) => ({ ...one, likelihoods: shared }));
      const { own, standing } = assess({ ...panel, contributors });
      const weights = shares(weightsOf(panel));
      const raw = standing.map((_, column) =>
        Math.exp(sum(contributors.map(({ id }, j) => weights[j]! * Math.log(own[id]![column]!)))),
      );
      expectClose(
        raw.map((share) => share / sum(raw)),
        standing,
      );
    });
  });
});

describe('the log pool', () => {
  const priors = fc.integer({ min: 2, max: 6 }).chain((columns) =>
    fc.record({
      distributions: fc.array(distribution(columns), { minLength: 1, maxLength: 6 }),
      weights: fc.array(
        fc.integer({ min: 1, max: 30 }).map((tenths) => tenths / 10),
        { minLength: 6, maxLength: 6 },
      ),
    }),
  );

  it('is as far from the opinions as its constant says: Σ w̄ KL(pool‖d) = −ln Z', () => {
    holds(priors, ({ distributions, weights }) => {
      const { pooledPrior } = assess(panelOfPriors(distributions, weights));
      const normal = shares(weights.slice(0, distributions.length));
      const z = sum(
        pooledPrior.map((_, i) => distributions.reduce((product, d, j) => product * d[i]! ** normal[j]!, 1)),
      );
      const divergence = sum(
        distributions.map((d, j) => normal[j]! * sum(pooledPrior.map((p, i) => p * Math.log(p / d[i]!)))),
      );
      expectClose(divergence, -Math.log(z));
    });
  });

  it('differs among its contributors by no more than the entropy of the weights', () => {
    holds(priors, ({ distributions, weights }) => {
      const { disagreementBits } = assess(panelOfPriors(distributions, weights));
      const normal = shares(weights.slice(0, distributions.length));
      const entropy = -sum(normal.map((weight) => weight * Math.log2(weight)));
      expect(disagreementBits).toBeLessThanOrEqual(entropy + 1e-12);
    });
  });
});

describe('weights', () => {
  it('may be scaled by any positive number', () => {
    const scaled = fc.record({
      panel: arbitraryPanel({ contributors: [1, 4] }),
      factor: fc.oneof(fc.double({ min: 0.001, max: 1, noNaN: true }), fc.constantFrom(1e-9, 1e-100)),
    });
    holds(scaled, ({ panel, factor }) => {
      const contributors = people(panel).map((one) => ({ ...one, weight: (one.weight ?? 1) * factor }));
      expectClose(assess({ ...panel, contributors }), assess(panel), 1e-11);
    });
  });

  it('of 0 are as good as leaving the contributor out', () => {
    holds(arbitraryPanel({ contributors: [1, 4], zeroWeights: false }), (panel) => {
      const silent = { ...people(panel)[0]!, id: 'silent', weight: 0 };
      const { own, rows, without, ...rest } = assess(panel);
      const more = assess({ ...panel, contributors: [silent, ...people(panel)] });
      const { silent: _, ...others } = more.own;
      expectClose(others, { ...own });
      expectClose(without.findings, more.without.findings);
      expectClose(more.without.contributors.silent, rest.standing);
      for (const [id, row] of Object.entries(rows)) {
        expectClose(more.rows[id]!.swing, row.swing);
        expectClose(more.rows[id]!.apart, row.apart);
        expectClose(more.rows[id]!.weightOfEvidence, row.weightOfEvidence);
      }
      const { own: _own, rows: _rows, without: _without, ...moreRest } = more;
      expectClose(moreRest, rest);
    });
  });
});

describe('a blank row', () => {
  it('is as good as leaving it out', () => {
    holds(arbitraryPanel({ contributors: [1, 4], findings: [1, 4] }), (panel) => {
      const blank = { given: panel.candidates.map(() => null).concat(null) };
      const [first, ...others] = people(panel);
      const { 'finding 0': _, ...rest } = first!.likelihoods ?? {};
      const absent = { ...first!, likelihoods: rest };
      const blanked = { ...first!, likelihoods: { ...rest, 'finding 0': blank } };
      expectClose(
        assess({ ...panel, contributors: [blanked, ...others] }),
        assess({ ...panel, contributors: [absent, ...others] }),
      );
    });
  });

  it('that everybody leaves blank counts nowhere', () => {
    holds(arbitraryPanel({ contributors: [1, 4] }), (panel) => {
      const unjudged = { id: 'nobody', observed: 0, group: 'group 0' };
      const more = assess({ ...panel, findings: [unjudged, ...(panel.findings ?? [])] });
      const { standing, range, own, nextTests, without } = assess(panel);
      expectClose(
        [more.standing, more.range, more.own, more.nextTests, more.without],
        [standing, range, own, nextTests, without],
      );
      expect(more.pooledCells).not.toHaveProperty('nobody');
      expect(more.rows.nobody).toMatchObject({ weightOfEvidence: [], apart: null, swing: 0 });
      expect(more.unjudged.filter(({ finding }) => finding === 'nobody')).toHaveLength(standing.length);
    });
  });
});
