import fc from 'fast-check';
import { describe, it } from 'vitest';
import { assess } from './assess.js';
import type { GivenCell, Panel } from './panel.js';
import { arbitraryPanel } from './testing/arbitrary-panel.js';
import { expectClose } from './testing/expect-close.js';
import { Fraction } from './testing/fraction.js';
import { holds } from './testing/laws-hold.js';

/*
 * With one contributor nothing is pooled and with exponents of 1 nothing is
 * raised, so every number of the definition is rational, τ included for two
 * candidates. This is Bayes' theorem again, written out with fractions.
 */
const one = Fraction.from(1);
const sum = (list: readonly Fraction[]) => list.reduce((total, next) => total.plus(next), Fraction.from(0));
const product = (list: readonly Fraction[]) => list.reduce((total, next) => total.times(next), one);
const normalised = (list: readonly Fraction[]) => list.map((next) => next.over(sum(list)));

function cellOf(given: GivenCell): Fraction[] {
  if (typeof given === 'number') return [one.minus(Fraction.from(given)), Fraction.from(given)];
  return normalised((given ?? []).map((share) => Fraction.from(share)));
}

/** P(level | set) by the definition; `row` has a cell for each column. */
function givenSet(row: Fraction[][], set: number[], level: number): Fraction {
  const none = row.at(-1)!;
  if (none.length > 2) {
    const weights = none.map((share, v) => product([share, ...set.map((k) => row[k]![v]!.over(share))]));
    return weights[level]!.over(sum(weights));
  }
  const leak = none[1]!;
  const [causes, inhibitors] = [
    set.filter((k) => !row[k]![1]!.isLessThan(leak)),
    set.filter((k) => row[k]![1]!.isLessThan(leak)),
  ];
  const quiet = product(causes.map((k) => row[k]![0]!.over(one.minus(leak))));
  const open = product(inhibitors.map((k) => row[k]![1]!.over(leak)));
  const present = one.minus(one.minus(leak).times(quiet)).times(open);
  return level === 1 ? present : one.minus(present);
}

function standingOf(panel: Panel): number[] {
  const [person] = panel.contributors ?? [];
  const prior = normalised((person?.prior ?? []).map((share) => Fraction.from(share)));
  const k = panel.candidates.length;
  const single = [...Array(k).keys()].map((candidate) => [candidate]);
  const c = Fraction.from(panel.coexistence ?? 0);
  const several = k === 2 && panel.coexistence ? [[0, 1]] : [];
  const times = panel.together?.[0]?.times ?? 1;
  const both = product([prior[0]!, prior[1] ?? one, Fraction.from(times)]);
  // τ W_2 = c / (1 - c) is the weight of the set of both.
  const weightOf = (set: number[]): Fraction => {
    if (set.length < 2) return prior[set[0] ?? k]!;
    return times === 0 ? Fraction.from(0) : c.over(one.minus(c).times(both)).times(both);
  };
  const sets = [...single, ...several, []];
  const weights = sets.map((set) => {
    const rows = (panel.findings ?? []).flatMap(({ id, observed, reliability }) => {
      const row = person?.likelihoods?.[id]?.given.map(cellOf);
      if (!row || observed === null || observed === undefined) return [];
      const rho = Fraction.from(reliability ?? 1);
      const mean = sum(row.map((cell) => cell[observed]!)).over(Fraction.from(k + 1));
      return [rho.times(givenSet(row, set, observed)).plus(one.minus(rho).times(mean))];
    });
    return product([weightOf(set), ...rows]);
  });
  const posterior = normalised(weights);
  const withCandidate = (candidate: number) =>
    sum(posterior.filter((_, index) => sets[index]!.includes(candidate)));
  return [...single.map(([candidate]) => withCandidate(candidate!).toNumber()), posterior.at(-1)!.toNumber()];
}

const shape = { contributors: [1, 1], blanks: false, zeroWeights: false, findings: [0, 5] } as const;
const exponentsOne = (panel: Panel): Panel => ({
  ...panel,
  tempering: 1,
  groups: [],
  findings: (panel.findings ?? []).map((finding) => ({ ...finding, group: null })),
});

describe('against exact fractions', () => {
  it('under one cause', () => {
    const panels = arbitraryPanel({ ...shape, contributors: [1, 1], findings: [0, 5], coexistence: 'none' });
    holds(panels.map(exponentsOne), (panel) => expectClose(assess(panel).standing, standingOf(panel), 1e-14));
  });

  it('with two candidates that may coexist', () => {
    const panels = arbitraryPanel({
      ...shape,
      contributors: [1, 1],
      findings: [0, 5],
      candidates: [2, 2],
      coexistence: 'some',
    });
    holds(panels.map(exponentsOne), (panel) => expectClose(assess(panel).standing, standingOf(panel), 1e-13));
  });

  it('agree with themselves: a third and two thirds are one', () => {
    holds(fc.integer({ min: 1, max: 1e6 }), (n) => {
      const third = Fraction.of(BigInt(n), BigInt(3 * n));
      expectClose(third.plus(third).plus(third).toNumber(), 1, 0);
    });
  });
});
