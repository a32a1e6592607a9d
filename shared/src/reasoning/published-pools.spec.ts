import { describe, expect, it } from 'vitest';
import { assess } from './assess.js';
import { expectClose } from './testing/expect-close.js';
import { panelOfPriors } from './testing/quick-panel.js';

const two = [
  [0.5, 0.3, 0.2],
  [0.2, 0.3, 0.5],
];

/** The same likelihood row, given by both contributors. */
function withCommonRow(weights: number[]) {
  const panel = panelOfPriors(two, weights);
  return {
    ...panel,
    findings: [{ id: 'row', observed: 1 }],
    contributors: (panel.contributors ?? []).map((one) => ({
      ...one,
      likelihoods: { row: { given: [0.9, 0.3, 0.1] } },
    })),
  };
}

describe('the log pool of priors', () => {
  it('of two equal contributors (own computation from Genest & Zidek 1986: √0.1 / (2√0.1 + 0.3))', () => {
    const root = Math.sqrt(0.1);
    const expected = [0.33913441998370525, 0.3217311600325895, 0.33913441998370525];
    expectClose(expected[0], root / (2 * root + 0.3), 1e-15);
    expectClose(assess(panelOfPriors(two)).pooledPrior, expected);
    expectClose(assess(panelOfPriors(two, [0.5, 0.5])).standing, expected);
  });

  it('with weights 0.7 and 0.3 (own computation from Genest & Zidek 1986)', () => {
    const expected = [0.40274281295055353, 0.3180980831349727, 0.27915910391447385];
    expectClose(assess(panelOfPriors(two, [0.7, 0.3])).pooledPrior, expected);
  });

  it('of two hypotheses is the geometric mean of odds (own computation: (1/54)^(1/3))', () => {
    const { pooledPrior } = assess(panelOfPriors([0.1, 0.2, 0.4].map((share) => [share, 1 - share])));
    expectClose(pooledPrior[0], 0.20921538760053052);
    expectClose(pooledPrior[0]! / pooledPrior[1]!, 0.2645668419947, 1e-12);
    expectClose(
      assess(panelOfPriors([0.1, 0.2, 0.4].map((share) => [share, 1 - share]))).linearPool[0],
      0.7 / 3,
    );
  });

  it('renormalises over those who answered: odds 8 and 2, the third abstains (2^(17/7); the usual rule with Cooke 1991)', () => {
    const odds = (ratio: number) => [ratio / (1 + ratio), 1 / (1 + ratio)];
    const { pooledPrior } = assess(panelOfPriors([odds(8), null, odds(2)], [0.5, 0.3, 0.2]));
    expectClose(pooledPrior[0]! / pooledPrior[1]!, 5.383600770529425, 1e-11);
    expect(pooledPrior[0]! / pooledPrior[1]!).not.toBeCloseTo(3.249009585424942, 1);
  });

  it('leaves each of three out in turn (own computation from the definition)', () => {
    const panel = panelOfPriors([
      [0.6, 0.3, 0.1],
      [0.5, 0.4, 0.1],
      [0.1, 0.2, 0.7],
    ]);
    const assessment = assess(panel);
    expectClose(assessment.pooledPrior, [0.3930885571007814, 0.3649110914519892, 0.24200035144722953]);
    expectClose(Object.values(assessment.without.contributors), [
      [0.29001251810053147, 0.36684004286339544, 0.34314743903607314],
      [0.32466231185836114, 0.32466231185836114, 0.35067537628327766],
      [0.5509551662736595, 0.3484546428123096, 0.10059019091403094],
    ]);
  });
});

describe('pool and update', () => {
  it('commute in the log pool when the likelihood is shared (Genest 1984, Ann. Statist. 12:1100-1105; own computation)', () => {
    const expected = [0.7461057748375702, 0.19643207290943696, 0.05746215225299294];
    expectClose(assess(withCommonRow([0.7, 0.3])).standing, expected);
  });

  it('do not commute in the linear pool (Genest & Zidek 1986; own computation)', () => {
    const { linearPool } = assess(withCommonRow([0.7, 0.3]));
    const poolThenUpdate = [0.7561475409836066, 0.18442622950819673, 0.05942622950819672];
    const updateThenPool = [0.7312499999999998, 0.19687499999999997, 0.071875];
    expectClose(linearPool, updateThenPool);
    expect(Math.abs(linearPool[0]! - poolThenUpdate[0]!)).toBeGreaterThan(0.02);
  });
});

describe('a share of zero', () => {
  it('is refused, for it would be a veto (Cromwell’s rule, Lindley)', () => {
    expect(() =>
      assess(
        panelOfPriors([
          [0, 0.6, 0.4],
          [0.3, 0.3, 0.4],
        ]),
      ),
    ).toThrow('contributors[0].prior[0]');
  });

  it('mixed with 1% of uniform pools as the remedy says (own computation)', () => {
    const floor = (shares: number[]) => shares.map((share) => 0.99 * share + 0.01 / 3);
    const { pooledPrior } = assess(panelOfPriors([floor([0, 0.6, 0.4]), floor([0.3, 0.3, 0.4])]));
    expectClose(pooledPrior, [0.03702664285819603, 0.4956593919392963, 0.4673139652025077]);
  });
});
