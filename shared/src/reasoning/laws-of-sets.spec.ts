import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Assessment, type CandidateSet, assess } from './assess.js';
import type { Panel } from './panel.js';
import { arbitraryPanel } from './testing/arbitrary-panel.js';
import { expectClose } from './testing/expect-close.js';
import { holds } from './testing/laws-hold.js';

const sum = (numbers: readonly number[]) => numbers.reduce((total, number) => total + number, 0);
const nameOf = ({ members }: CandidateSet) => members.join(' ');
const unobserved = (panel: Panel): Panel => ({
  ...panel,
  findings: (panel.findings ?? []).map((finding) => ({ ...finding, observed: null })),
});

/** Up to three candidates, so that the eight most probable sets are all there are. */
const allListed = { candidates: [1, 3] as [number, number], contributors: [1, 3] as [number, number] };

function divergence(after: Assessment, before: Assessment): number {
  const prior = new Map(before.sets.map((set) => [nameOf(set), set.p]));
  return sum(after.sets.map((set) => set.p * Math.log(set.p / prior.get(nameOf(set))!)));
}

describe('tempering', () => {
  it('never takes the posterior further from the prior as it falls', () => {
    const tempered = fc.record({ panel: arbitraryPanel(allListed), less: fc.integer({ min: 3, max: 9 }) });
    holds(tempered, ({ panel, less }) => {
      const prior = assess(unobserved(panel));
      const low = divergence(assess({ ...panel, tempering: less / 10 }), prior);
      const high = divergence(assess({ ...panel, tempering: (less + 1) / 10 }), prior);
      expect(low).toBeLessThanOrEqual(high + 1e-12);
    });
  });
});

describe('coexistence', () => {
  it('is the prior share of sets of two or more', () => {
    holds(
      arbitraryPanel({ ...allListed, candidates: [2, 3], coexistence: 'some', pairs: false }),
      (panel) => {
        const several = assess(unobserved(panel)).sets.filter(({ members }) => members.length > 1);
        expectClose(sum(several.map(({ p }) => p)), panel.coexistence!);
      },
    );
  });

  it('changes nothing among sets of at most one candidate', () => {
    holds(arbitraryPanel({ ...allListed, coexistence: 'some' }), (panel) => {
      const { sets } = assess(panel);
      const single = sets.filter(({ members }) => members.length < 2);
      const total = sum(single.map(({ p }) => p));
      const { standing } = assess({ ...panel, coexistence: 0 });
      // Among at most eight sets only one with a share of exactly 0 can be missing.
      for (const { members, p } of single)
        expectClose(p / total, standing[members[0] ?? standing.length - 1], 1e-11);
      expect(single).toHaveLength(standing.length);
    });
  });

  it('approaching 0 approaches one cause', () => {
    holds(arbitraryPanel({ contributors: [1, 3], findings: [0, 2], coexistence: 'none' }), (panel) => {
      expectClose(assess({ ...panel, coexistence: 1e-13 }).standing, assess(panel).standing, 1e-6);
    });
  });

  it('is without effect for a single candidate', () => {
    holds(arbitraryPanel({ candidates: [1, 1], coexistence: 'some' }), (panel) => {
      expectClose(assess(panel), assess({ ...panel, coexistence: 0 }));
    });
  });
});

describe('a pending finding', () => {
  it('leaves the standing where it is on average when it counts in full', () => {
    const counted = arbitraryPanel({ contributors: [1, 3], findings: [1, 3], discounts: false });
    holds(counted, (panel) => {
      const { standing, nextTests } = assess(panel);
      for (const { levels } of nextTests) {
        const average = standing.map((_, column) =>
          sum(levels.map(({ p, standing: after }) => p * after[column]!)),
        );
        expectClose(average, standing, 1e-11);
      }
    });
  });

  it('settles nothing where its columns are equal, and never less than nothing', () => {
    holds(arbitraryPanel({ contributors: [1, 3] }), (panel) => {
      const contributors = (panel.contributors ?? []).map((one) => ({
        ...one,
        likelihoods: { ...one.likelihoods, same: { given: [...panel.candidates, 'none'].map(() => 0.3) } },
      }));
      const findings = [...(panel.findings ?? []), { id: 'same', observed: null }];
      for (const { finding, bits, leaderChanges } of assess({ ...panel, findings, contributors }).nextTests) {
        if (finding !== 'same') expect(bits).toBeGreaterThanOrEqual(0);
        else expectClose([bits, leaderChanges], [0, 0]);
      }
    });
  });

  it('is as likely to be present as with fewer causes, or likelier (noisy-OR)', () => {
    const cells = fc.array(fc.integer({ min: 1, max: 999 }), { minLength: 4, maxLength: 4 });
    holds(cells, (thousandths) => {
      const leak = Math.min(...thousandths) / 1000;
      const present = (causes: number) => {
        const given = thousandths.slice(1).map((share, index) => (index < causes ? share / 1000 : leak));
        const contributors = [{ id: 'c', likelihoods: { f: { given: [...given, leak] } } }];
        const panel = {
          candidates: ['a', 'b', 'c'],
          coexistence: 0.3,
          findings: [{ id: 'f' }],
          contributors,
        };
        return assess(panel).nextTests[0]!.levels[1]!.p;
      };
      const rising = [0, 1, 2, 3].map(present);
      rising.slice(1).forEach((p, index) => expect(p).toBeGreaterThanOrEqual(rising[index]! - 1e-15));
    });
  });
});
