import { describe, expect, it } from 'vitest';
import { assess } from './assess.js';
import { expectClose } from './testing/expect-close.js';
import { panelOfOne } from './testing/quick-panel.js';

/** The share of the one candidate after a positive test. */
const after = (prior: number, sensitivity: number, falsePositive: number) =>
  assess(panelOfOne([prior, 1 - prior], [{ given: [sensitivity, falsePositive] }])).standing[0];

describe('one test and one candidate', () => {
  it('gives the predictive values of ferritin (Guyatt et al. 1992, J Gen Intern Med 7:145-153: 73% and 95%; epiR 2.0.57)', () => {
    const [truePositive, falsePositive, falseNegative, trueNegative] = [731, 270, 78, 1500];
    const ill = truePositive + falseNegative;
    const well = falsePositive + trueNegative;
    const prior = [ill / (ill + well), well / (ill + well)];
    const given = [truePositive / ill, falsePositive / well];
    expectClose(prior[0], 0.3136874757658007);
    expectClose(assess(panelOfOne(prior, [{ given }])).standing[0], 731 / 1001);
    expectClose(assess(panelOfOne(prior, [{ given, observed: 0 }])).standing[1], 0.9505703422053232);
    const { weightOfEvidence } = assess(panelOfOne(prior, [{ given }])).rows['row 0']!;
    expectClose(10 ** ((weightOfEvidence[0]! - weightOfEvidence[1]!) / 10), 5.9234995192968, 1e-12);
  });

  it('gives 7.7% for a mammogram (Eddy 1982, in Kahneman, Slovic & Tversky; quoted from memory)', () => {
    expectClose(after(0.01, 0.792, 0.096), 1 / 13);
  });

  it('gives 7.8% for a mammogram (Gigerenzer & Hoffrage 1995, Psych. Review 102:684-704; quoted from memory)', () => {
    expectClose(after(0.01, 0.8, 0.096), 25 / 322);
  });

  it('turns 25% into two thirds at a likelihood ratio of 6 (own computation; the nomogram of Fagan 1975, NEJM 293:257)', () => {
    expectClose(after(0.25, 0.6, 0.1), 2 / 3);
  });
});

describe('two findings that always come together, likelihood ratio 5 each (own computation)', () => {
  const rows = [0, 1].map(() => ({ given: [0.5, 0.1], group: 'same' }));
  const standing = (overlap: number) =>
    assess(panelOfOne([0.1, 0.9], rows, { groups: [{ id: 'same', overlap }] })).standing[0];

  it('count twice without an overlap: 25/34', () => expectClose(standing(0), 25 / 34));
  it('count once with an overlap of 1: 5/14', () => expectClose(standing(1), 5 / 14));
});

describe('what a pending finding is expected to settle', () => {
  const bits = (prior: number, levels: number, given: number[][]) => {
    const { nextTests } = assess(panelOfOne([prior, 1 - prior], [{ given, levels, observed: null }]));
    return nextTests[0]?.bits;
  };

  it('is the information gain of the weather to play tennis in (Mitchell 1997, after Quinlan 1986: 0.151, 0.048, 0.029)', () => {
    expectClose(
      bits(9 / 14, 2, [
        [3 / 9, 6 / 9],
        [4 / 5, 1 / 5],
      ]),
      0.15183550136234159,
    );
    expectClose(
      bits(9 / 14, 2, [
        [6 / 9, 3 / 9],
        [2 / 5, 3 / 5],
      ]),
      0.04812703040826949,
    );
    expectClose(
      bits(9 / 14, 3, [
        [2 / 9, 4 / 9, 3 / 9],
        [2 / 5, 2 / 5, 1 / 5],
      ]),
      0.02922256565895487,
    );
    // The fourth column of that table, Outlook, has a share of 0, which a panel may not give.
    expect(() =>
      bits(9 / 14, 3, [
        [2 / 9, 4 / 9, 3 / 9],
        [3 / 5, 0, 2 / 5],
      ]),
    ).toThrow('given[1][1]');
  });

  it('of a test with sensitivity 0.9 and specificity 0.8 (own computation from Lindley 1956)', () => {
    expectClose(
      bits(0.3, 2, [
        [0.1, 0.9],
        [0.8, 0.2],
      ]),
      0.3304521242598861,
    );
    expectClose(
      bits(0.3, 2, [
        [0.5, 0.5],
        [0.5, 0.5],
      ]),
      0,
    );
  });
});
