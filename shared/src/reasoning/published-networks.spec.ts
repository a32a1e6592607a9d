import { describe, expect, it } from 'vitest';
import { assess } from './assess.js';
import { type NoisyOrRow, independentPanel } from './testing/independent-panel.js';
import { expectClose } from './testing/expect-close.js';
import { publishedNetwork } from './testing/published-network.js';

describe('explaining away in a noisy-OR of two (own computation from Pearl 1988, exact fractions)', () => {
  const priors = [0.1, 0.2];
  const f: NoisyOrRow = {
    leak: 0.05,
    links: [
      [0, 0.8],
      [1, 0.6],
    ],
  };
  const g: NoisyOrRow = { leak: 0.02, links: [[1, 0.7]] };

  it('P(F) = 0.23088 while F is pending', () => {
    const { nextTests, standing } = assess(independentPanel(priors, [{ ...f, observed: null }]));
    expectClose(nextTests[0]!.levels[1]!.p, 0.23088);
    expectClose(standing.slice(0, 2), priors);
  });

  it('P(D1 | F) and P(D2 | F), and D1 is needed less when D2 is there', () => {
    const { standing, explains } = assess(independentPanel(priors, [f]));
    expectClose(standing.slice(0, 2), [0.3607068607068607, 0.5634095634095634]);
    const away = explains.find((one) => one.if === 1 && one.then === 0);
    expectClose(away, { if: 1, then: 0, from: 0.3607068607068607, to: 0.14206642066420663 });
  });

  it('P(D1 | F, G) and P(D1 | not F)', () => {
    expectClose(assess(independentPanel(priors, [f, g])).standing[0], 0.15282366539488354);
    expectClose(assess(independentPanel(priors, [{ ...f, observed: 0 }])).standing[0], 0.021739130434782608);
  });

  it('a doubtful report is virtual evidence (Pearl 1988): P(report | F) 0.7, P(report | not F) 0.2', () => {
    // ρ P + (1 - ρ) m is proportional to 0.5 P + 0.2 when (1 - ρ) m / ρ = 0.4, m the mean of the three columns.
    const mean = (0.81 + 0.62 + 0.05) / 3;
    const reliability = 1 / (1 + 0.4 / mean);
    const { standing } = assess(independentPanel(priors, [{ ...f, reliability }]));
    expectClose(standing.slice(0, 2), [0.1954095866091808, 0.3329951813340096]);
  });
});

describe('the network of 20 conditions and 40 findings', () => {
  const { priors, leaks, links, present, absent, posterior } = publishedNetwork;
  const pending = [25, 30, 37];
  const rows = [...present, ...absent, ...pending].map((finding): NoisyOrRow => ({
    leak: leaks[finding]!,
    links: links[finding]!,
    observed: present.includes(finding) ? 1 : absent.includes(finding) ? 0 : null,
  }));
  // Of 20 candidates sets of up to six are counted, so the panel's answers are those of the network given at most six.
  const assessment = assess(independentPanel(priors, rows, 6));

  it('says that it is not exact, and how much prior is left out', () => {
    expect(assessment.exact).toBe(false);
    let ofSize = [1];
    for (const prior of priors) {
      ofSize = [...ofSize, 0].map((p, size) => p * (1 - prior) + prior * (ofSize[size - 1] ?? 0));
    }
    const more = ofSize.slice(7).reduce((sum, p) => sum + p, 0);
    expectClose(assessment.leftOut, more, 1e-12);
    expect(more).toBeLessThan(2e-6);
  });

  it('has the posterior that the exact algorithm gives, but for the sets left out', () => {
    expectClose(assessment.standing.slice(0, 20), posterior, 2e-5);
  });

  it('expects the findings to be there as often as the exact algorithm does (own computation)', () => {
    const expected = new Map([
      [21, 0.41762271522515815],
      [22, 0.0493409187420367],
      [23, 0.07364932425610766],
    ]);
    for (const [position, p] of expected) {
      const test = assessment.nextTests.find(({ finding }) => finding === `finding ${position}`);
      expectClose(test!.levels[1]!.p, p, 2e-5);
    }
  });

  it('expects each result to settle as much of the single conditions as the exact algorithm does (own computation)', () => {
    const expected = new Map([
      [21, 0.6452406528656709],
      [22, 0.003225736943291535],
      [23, 0.07690484238561535],
    ]);
    for (const [position, bits] of expected) {
      const { levels } = assessment.nextTests.find(({ finding }) => finding === `finding ${position}`)!;
      const left = levels.reduce((sum, { p, standing }) => sum + p * uncertainty(standing), 0);
      expectClose(uncertainty(assessment.standing) - left, bits, 1e-4);
    }
  });
});

/** The entropies of the single conditions, there or not, added up: in bits. */
function uncertainty(standing: readonly number[]): number {
  return standing.slice(0, -1).reduce((sum, p) => sum - p * Math.log2(p) - (1 - p) * Math.log2(1 - p), 0);
}
