import fc from 'fast-check';
import type { GivenCell, Panel, PanelContributor, PanelFinding, PanelLikelihood } from '../panel.js';

/** A distribution whose shares are far enough from 0 for every bound. */
export const distribution = (length: number, smallest = 10): fc.Arbitrary<number[]> =>
  fc
    .array(fc.integer({ min: smallest, max: 1000 }), { minLength: length, maxLength: length })
    .map((parts) => {
      const total = parts.reduce((sum, part) => sum + part, 0);
      return parts.map((part) => part / total);
    });

/** P(present), also at both bounds. */
export const presentShare = fc.oneof(
  { weight: 8, arbitrary: fc.integer({ min: 1, max: 999 }).map((thousandths) => thousandths / 1000) },
  { weight: 1, arbitrary: fc.constantFrom(0.001, 0.999) },
);

const cell = (levels: number, blanks: boolean): fc.Arbitrary<GivenCell> => {
  const filled: fc.Arbitrary<GivenCell> =
    levels === 2 ? fc.oneof({ weight: 3, arbitrary: presentShare }, distribution(2)) : distribution(levels);
  return blanks ? fc.oneof({ weight: 5, arbitrary: filled }, fc.constant(null)) : filled;
};

export interface PanelShape {
  candidates?: [number, number];
  contributors?: [number, number];
  findings?: [number, number];
  /** Largest number of levels. */
  levels?: number;
  /** Blank cells, blank rows, priors not given. */
  blanks?: boolean;
  /** Groups, reliability below 1, tempering below 1. */
  discounts?: boolean;
  /** Contributors of weight 0 (never all of them). */
  zeroWeights?: boolean;
  coexistence?: 'none' | 'some' | 'either';
  pairs?: boolean;
  pending?: boolean;
}

/** Panels that are accepted, small enough for the plain engine. */
export function arbitraryPanel(shape: PanelShape = {}): fc.Arbitrary<Panel> {
  const {
    candidates = [1, 4],
    contributors = [0, 4],
    findings = [0, 4],
    levels = 4,
    blanks = true,
    discounts = true,
    zeroWeights = true,
    coexistence = 'either',
    pairs = true,
    pending = true,
  } = shape;
  return fc
    .record({
      k: fc.integer({ min: candidates[0], max: candidates[1] }),
      j: fc.integer({ min: contributors[0], max: contributors[1] }),
      levelCounts: fc.array(fc.integer({ min: 2, max: levels }), {
        minLength: findings[0],
        maxLength: findings[1],
      }),
    })
    .chain(({ k, j, levelCounts }) =>
      fc.record({
        candidates: fc.constant(Array.from({ length: k }, (_, index) => `candidate ${index}`)),
        coexistence: coexistenceOf(coexistence),
        tempering: discounts ? fc.integer({ min: 3, max: 10 }).map((tenths) => tenths / 10) : fc.constant(1),
        together: pairs && k > 1 ? pairsOf(k) : fc.constant([]),
        groups: fc.tuple(...[0, 1].map((index) => groupOf(index, discounts))),
        findings: fc.tuple(...levelCounts.map((count, index) => findingOf(index, count, discounts, pending))),
        contributors: fc
          .tuple(
            ...Array.from({ length: j }, (_, index) =>
              contributorOf(index, k, levelCounts, blanks, zeroWeights),
            ),
          )
          .map((people) =>
            people.map((person, index) =>
              index === 0 && person.weight === 0 ? { ...person, weight: 1 } : person,
            ),
          ),
      }),
    );
}

function coexistenceOf(choice: 'none' | 'some' | 'either'): fc.Arbitrary<number> {
  const some = fc.integer({ min: 1, max: 50 }).map((hundredths) => hundredths / 100);
  if (choice === 'none') return fc.constant(0);
  return choice === 'some' ? some : fc.oneof(fc.constant(0), some);
}

function pairsOf(k: number): fc.Arbitrary<{ a: number; b: number; times: number }[]> {
  const pair = fc.record({
    a: fc.integer({ min: 0, max: k - 1 }),
    b: fc.integer({ min: 0, max: k - 1 }),
    times: fc.oneof(
      fc.constantFrom(0, 1, 100),
      fc.integer({ min: 1, max: 100 }).map((tenths) => tenths / 10),
    ),
  });
  return fc
    .uniqueArray(pair, { maxLength: 3, selector: ({ a, b }) => `${Math.min(a, b)} ${Math.max(a, b)}` })
    .map((list) => list.filter(({ a, b }) => a !== b));
}

const groupOf = (index: number, discounts: boolean) =>
  fc.record({
    id: fc.constant(`group ${index}`),
    overlap: discounts ? fc.integer({ min: 0, max: 10 }).map((tenths) => tenths / 10) : fc.constant(0),
  });

const findingOf = (
  index: number,
  levels: number,
  discounts: boolean,
  pending: boolean,
): fc.Arbitrary<PanelFinding> =>
  fc.record({
    id: fc.constant(`finding ${index}`),
    levels: fc.constant(levels),
    observed: pending
      ? fc.oneof({ weight: 3, arbitrary: fc.integer({ min: 0, max: levels - 1 }) }, fc.constant(null))
      : fc.integer({ min: 0, max: levels - 1 }),
    reliability: discounts ? fc.constantFrom(1, 0.7, 0.4) : fc.constant(1),
    group: discounts ? fc.constantFrom(null, null, 'group 0', 'group 1') : fc.constant(null),
    cost: fc.constantFrom(0, 100, 200),
    waitDays: fc.constantFrom(0, 1, 7),
    burden: fc.constantFrom(0, 1, 3),
  });

function contributorOf(
  index: number,
  k: number,
  levelCounts: readonly number[],
  blanks: boolean,
  zeroWeights: boolean,
): fc.Arbitrary<PanelContributor> {
  const prior = distribution(k + 1);
  const weight = fc.integer({ min: 1, max: 30 }).map((tenths) => tenths / 10);
  return fc.record({
    id: fc.constant(`contributor ${index}`),
    weight: zeroWeights ? fc.oneof({ weight: 6, arbitrary: weight }, fc.constant(0)) : weight,
    prior: blanks ? fc.oneof({ weight: 4, arbitrary: prior }, fc.constant(null)) : prior,
    likelihoods: fc
      .tuple(...levelCounts.map((levels) => likelihoodOf(k, levels, blanks)))
      .map((rows) =>
        Object.fromEntries(
          rows.flatMap((row, finding) => (row ? [[`finding ${finding}`, row] as const] : [])),
        ),
      ),
  });
}

function likelihoodOf(k: number, levels: number, blanks: boolean): fc.Arbitrary<PanelLikelihood | null> {
  const row = fc.record({
    exposure: fc.constantFrom('seldom' as const, 'sometimes' as const, 'often' as const),
    given: fc.array(cell(levels, blanks), { minLength: k + 1, maxLength: k + 1 }),
  });
  return blanks ? fc.oneof({ weight: 6, arbitrary: row }, fc.constant(null)) : row;
}
