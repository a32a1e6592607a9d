import type { Exposure, GivenCell, Panel, PanelFinding } from '../panel.js';

/** Numbers from 0 to 1, the same for the same seed (mulberry32, public domain). */
export function randomNumbers(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

export interface RandomShape {
  candidates: number;
  findings: number;
  pending: number;
  contributors: number;
  coexistence: number;
}

/**
 * A panel as it might come out of a long conference: a fifth of the rows with
 * three or four levels, half of them doubtful, two in five grouped (four to a
 * group), tempering 0.8, 15% of the cells blank.
 */
export function randomPanel(shape: RandomShape, seed: number): Panel {
  const random = randomNumbers(seed);
  const chance = (share: number) => random() < share;
  const pick = <Value>(values: readonly Value[]): Value => values[Math.floor(random() * values.length)]!;
  const shares = (length: number): number[] => {
    const parts = Array.from({ length }, () => 0.05 + random());
    const total = parts.reduce((sum, part) => sum + part, 0);
    return parts.map((part) => part / total);
  };
  const groups = Array.from({ length: Math.ceil(shape.findings / 10) }, (_, index) => ({
    id: `group ${index}`,
    overlap: pick([0.1, 0.25, 0.33, 0.5]),
  }));
  const findings = Array.from({ length: shape.findings }, (_, index): PanelFinding => {
    const levels = chance(0.2) ? pick([3, 4]) : 2;
    return {
      id: `finding ${index}`,
      levels,
      observed: index < shape.pending ? null : Math.floor(random() * levels),
      reliability: chance(0.5) ? 0.4 : 1,
      group: chance(0.4) ? pick(groups).id : null,
      cost: Math.round(random() * 2000),
      waitDays: Math.round(random() * 20),
      burden: Math.round(random() * 3),
    };
  });
  const cell = (levels: number): GivenCell => {
    if (chance(0.15)) return null;
    return levels === 2 ? 0.01 + 0.98 * random() : shares(levels);
  };
  const contributors = Array.from({ length: shape.contributors }, (_, index) => ({
    id: `contributor ${index}`,
    weight: pick([0.5, 1, 1, 2]),
    prior: shares(shape.candidates + 1),
    likelihoods: Object.fromEntries(
      findings.map(({ id, levels }) => [
        id,
        {
          exposure: pick<Exposure>(['seldom', 'sometimes', 'often']),
          given: Array.from({ length: shape.candidates + 1 }, () => cell(levels ?? 2)),
        },
      ]),
    ),
  }));
  return {
    candidates: Array.from({ length: shape.candidates }, (_, index) => `candidate ${index}`),
    coexistence: shape.coexistence,
    tempering: 0.8,
    groups,
    findings,
    contributors,
  };
}
