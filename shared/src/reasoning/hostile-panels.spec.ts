import { describe, expect, it } from 'vitest';
import { assess } from './assess.js';
import { expectSound } from './testing/expect-sound.js';
import { panelOfOne } from './testing/quick-panel.js';

describe('300 findings at the bounds', () => {
  const prior = [0.2, 0.3, 0.5];
  const rows = (first: number[], second: number[]) =>
    Array.from({ length: 300 }, (_, index) => ({ given: index < 150 ? first : second }));

  it.each([0, 0.1])('of 0.001 everywhere leave the prior as it was (coexistence %d)', (coexistence) => {
    const low = [0.001, 0.001, 0.001];
    const { standing, without } = assess(panelOfOne(prior, rows(low, low), { coexistence }));
    const { standing: start } = assess(panelOfOne(prior, [], { coexistence }));
    standing.forEach((share, column) => expect(share).toBeCloseTo(start[column]!, 12));
    expect(Object.keys(without.findings)).toHaveLength(300);
  });

  it.each([0, 0.1])('150 against a candidate and 150 for it cancel (coexistence %d)', (coexistence) => {
    const against = [0.001, 0.999, 0.999];
    const forIt = [0.999, 0.001, 0.001];
    const { standing } = assess(panelOfOne(prior, rows(against, forIt), { coexistence }), {
      only: 'standing',
    });
    expect(standing.every((share) => share > 0 && share < 1)).toBe(true);
    if (coexistence === 0) standing.forEach((share, column) => expect(share).toBeCloseTo(prior[column]!, 11));
  });

  it('all for one candidate leave it nearly certain, never more than 1', () => {
    const assessment = assess(panelOfOne(prior, rows([0.999, 0.001, 0.001], [0.999, 0.001, 0.001])));
    expectSound(assessment);
    expect(assessment.standing[0]).toBeGreaterThan(1 - 1e-12);
    expect(assessment.standing[0]).toBeLessThanOrEqual(1);
  });
});

describe('weights', () => {
  it.each([5e-324, 1e-310, 1e-300, 1e-12])('as small as %d are weights', (weight) => {
    const contributors = [0.2, 0.7].map((share, index) => ({
      id: `${index}`,
      weight,
      prior: [share, 1 - share],
      likelihoods: { f: { exposure: 'seldom', given: [share, 0.5] } },
    }));
    const panel = { candidates: ['a'], findings: [{ id: 'f', observed: 1 }], contributors };
    const assessment = assess(panel);
    expectSound(assessment);
    const full = assess({ ...panel, contributors: contributors.map((one) => ({ ...one, weight: 1 })) });
    assessment.standing.forEach((share, column) => expect(share).toBeCloseTo(full.standing[column]!, 12));
    expectSound(assess({ ...panel, contributors: [{ ...contributors[0], weight: 3 }, contributors[1]] }));
  });

  it('of 0 count nowhere but in `own`', () => {
    const contributors = [
      { id: 'counts', prior: [0.2, 0.8] },
      { id: 'not', weight: 0, prior: [0.9, 0.1], likelihoods: { f: { given: [0.9, 0.1] } } },
    ];
    const { standing, own, unjudged, rows, pooledCells, without } = assess({
      candidates: ['a'],
      findings: [{ id: 'f', observed: 1 }],
      contributors,
    });
    expect(standing[0]).toBeCloseTo(0.2, 15);
    expect(own.not?.[0]).toBeCloseTo(0.9, 15);
    expect(unjudged).toEqual([
      { finding: 'f', column: 0 },
      { finding: 'f', column: 1 },
    ]);
    expect(rows.f?.weightOfEvidence).toEqual([]);
    expect(Object.keys(pooledCells)).toEqual([]);
    expect(without.contributors.counts).toBeNull();
    expect(without.contributors.not?.[0]).toBeCloseTo(0.2, 15);
  });
});

describe('ids that are words of the language', () => {
  const text = JSON.stringify({
    candidates: ['__proto__', 'constructor'],
    groups: [{ id: 'toString', overlap: 0.5 }],
    findings: [
      { id: 'PROTO', observed: 1, group: 'toString' },
      { id: 'constructor', observed: 0, group: 'toString' },
      { id: '1', observed: null },
    ],
    contributors: ['PROTO', 'hasOwnProperty'].map((id, index) => ({
      id,
      prior: [0.2 + index / 10, 0.3, 0.5 - index / 10],
      likelihoods: Object.fromEntries(
        ['PROTO', 'constructor', '1'].map((key) => [key, { given: [0.5, 0.4, 0.2 + index / 10] }]),
      ),
    })),
  });

  it('are keys like any other, and come out in the JSON', () => {
    const named = text.replaceAll('PROTO', '__proto__');
    const assessment = assess(JSON.parse(named));
    const plain = assess(JSON.parse(text));
    expect(JSON.stringify(assessment)).toBe(JSON.stringify(plain).replaceAll('PROTO', '__proto__'));
    expect(Object.keys(assessment.own)).toContain('__proto__');
    expect(Object.keys(assessment.rows)).toContain('__proto__');
    expect(Object.getPrototypeOf({})).toBe(Object.prototype);
  });
});

describe('pairs', () => {
  const prior = [0.2, 0.1, 0.3, 0.4];
  const rows = [{ given: [0.9, 0.5, 0.2, 0.1] }];
  const standing = (together: { a: number; b: number; times: number }[]) => {
    const assessment = assess(panelOfOne(prior, rows, { coexistence: 0.2, together }));
    expectSound(assessment);
    return assessment;
  };

  it.each([5e-324, 1e-300, 1e-12])(
    'that go together %d times as often do not upset the share of several',
    (times) => {
      const all = [0, 1, 2].flatMap((a) => [0, 1, 2].filter((b) => b > a).map((b) => ({ a, b, times })));
      const { sets } = standing(all);
      expect(sets.filter(({ members }) => members.length > 1).length).toBeGreaterThan(0);
    },
  );

  it('that all exclude each other leave one cause', () => {
    const all = [0, 1, 2].flatMap((a) => [0, 1, 2].filter((b) => b > a).map((b) => ({ a, b, times: 0 })));
    const { exact, explains, sets, standing: shares } = standing(all);
    expect(shares.reduce((sum, share) => sum + share)).toBeCloseTo(1, 12);
    expect({ exact, explains, sets: sets.length }).toEqual({ exact: true, explains: [], sets: 4 });
  });
});
