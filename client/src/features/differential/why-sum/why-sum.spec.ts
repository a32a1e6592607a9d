import { assess } from '@weighhouse/shared/reasoning/assess';
import { randomPanel } from '@weighhouse/shared/reasoning/testing/random-panel';
import { describe, expect, it } from 'vitest';
import { columnSum } from './column-sum';
import { decibansOf, oddsOf, runnerUp } from './comparison';
import { countedPanel } from './counted-panel';
import { countingFindings, oneCauseStandings, stepByStep, stepSum } from './step-sum';

const panelOf = (seed: number, coexistence = 0) =>
  randomPanel(
    {
      candidates: 1 + (seed % 7),
      findings: 3 + (seed % 20),
      pending: seed % 4,
      contributors: 1 + (seed % 6),
      coexistence,
    },
    seed,
  );
const seeds = Array.from({ length: 150 }, (_, index) => index + 1);

describe('a standing as a sum', () => {
  it('adds up under one cause, each column against each other: prior odds and what every finding adds', () => {
    for (const seed of seeds) {
      const assessment = assess(panelOf(seed));
      const { standing } = assessment;
      for (const [column] of standing.entries()) {
        for (const [against] of standing.entries()) {
          if (column === against) continue;
          const sum = columnSum(assessment, column, against);
          const total = sum.pushes.reduce((all, { decibans }) => all + decibans, sum.start);
          expect(total, `seed ${String(seed)}`).toBeCloseTo(
            decibansOf((standing[column] ?? 0) / (standing[against] ?? 0)),
            8,
          );
          expect(sum.end).toBeCloseTo(total, 9);
          expect(sum.pushes.at(-1)?.soFar ?? sum.start).toBeCloseTo(total, 9);
        }
      }
    }
  });

  it('has the largest push first, and none for what is pending or unjudged', () => {
    const assessment = assess(panelOf(11));
    const sizes = columnSum(assessment, 0, 1).pushes.map(({ decibans }) => Math.abs(decibans));
    expect(sizes).toEqual(sizes.toSorted((one, other) => other - one));
    const counting = Object.values(assessment.rows).filter((row) => row.weightOfEvidence.length > 0);
    expect(sizes).toHaveLength(counting.length);
  });

  it('adds up against everything else, step by step', () => {
    for (const seed of seeds) {
      const assessment = assess(panelOf(seed));
      const how = { column: 0, against: 'rest', oneCause: true } as const;
      const sum = stepSum(countingFindings(assessment), oneCauseStandings(assessment), how);
      const end = decibansOf(oddsOf(assessment.standing, 0, 'rest', true));
      expect(sum.end, `seed ${String(seed)}`).toBeCloseTo(end, 8);
      expect(sum.inThisOrder).toBe(true);
    }
  });

  it('adds up where candidates may coexist, over panels in which one finding after the other counts', () => {
    for (const seed of seeds.slice(0, 60)) {
      const panel = panelOf(seed, 0.02 + (seed % 9) / 20);
      const assessment = assess(panel);
      for (const against of ['rest', runnerUp(assessment.standing, 0)] as const) {
        const sum = stepSum(
          countingFindings(assessment),
          (counted) => assess(countedPanel(panel, counted), { only: 'standing' }).standing,
          { column: 0, against, oneCause: false },
        );
        const end = decibansOf(oddsOf(assessment.standing, 0, against, false));
        expect(sum.end, `seed ${String(seed)}`).toBeCloseTo(end, 7);
      }
    }
  });

  it('counts some findings by the panel as by the assessment: groups keep their size', () => {
    for (const seed of seeds) {
      const panel = panelOf(seed);
      const assessment = assess(panel);
      const all = countingFindings(assessment);
      const some = all.slice(0, Math.ceil(all.length / 2));
      const byPanel = assess(countedPanel(panel, some), { only: 'standing' }).standing;
      oneCauseStandings(assessment)(some).forEach((share, column) => {
        expect(byPanel[column], `seed ${String(seed)}`).toBeCloseTo(share, 9);
      });
    }
  });

  it('counts first what would change the odds most if it alone were left out, and can pause at every step', () => {
    const assessment = assess(panelOf(11));
    const how = { column: 0, against: 'rest', oneCause: true } as const;
    const all = countingFindings(assessment);
    const steps = stepByStep(all, oneCauseStandings(assessment), how);
    let asked = 0;
    let next = steps.next();
    for (; next.done !== true; next = steps.next()) asked = next.value;
    expect(asked).toBe(2 * all.length + 2);
    const order = next.value.pushes.map(({ findingId }) => findingId);
    const changes = order.map((findingId) => {
      const left = oneCauseStandings(assessment)(all.filter((one) => one !== findingId));
      return Math.abs(
        decibansOf(oddsOf(assessment.standing, 0, 'rest', true)) - decibansOf(oddsOf(left, 0, 'rest', true)),
      );
    });
    changes.slice(1).forEach((change, index) => {
      expect(change).toBeLessThanOrEqual((changes[index] ?? 0) + 1e-9);
    });
  });

  it('holds digits near one, where 1 less the share has none left', () => {
    expect(decibansOf(oddsOf([1 - 1e-15, 1e-15], 0, 'rest', true))).toBeCloseTo(150, 9);
  });

  it('weighs against the runner-up: the largest share but one’s own', () => {
    expect(runnerUp([0.6, 0.1, 0.3], 0)).toBe(2);
    expect(runnerUp([0.6, 0.1, 0.3], 1)).toBe(0);
    expect(runnerUp([0.5, 0.5], 0)).toBe(1);
  });
});
