import { assess } from '@weighhouse/shared/reasoning/assess';
import { describe, expect, it } from 'vitest';
import { priorTarget, type SavedVersion } from '../judgements/saved-version.js';
import { makeVersion, priorValues, rowValues } from '../testing/make-version.js';
import { buildPanel, canBePooled, type PanelSource } from './panel-builder.js';

const columns = ['a', 'b', null];
const finding = (id: string, parts: Partial<PanelSource['findings'][number]> = {}) => ({
  id,
  levelLabels: ['absent', 'present'],
  observed: 1,
  reliability: 1,
  groupId: null,
  cost: null,
  waitDays: null,
  burden: null,
  ...parts,
});
const prior = (candidateSet: number, shares: number[], over = columns) =>
  makeVersion({ candidateSet, values: priorValues(over, shares) });
const row = (target: string, present: number[], over: (string | null)[] = columns) =>
  makeVersion({ target, exposure: 'often', values: rowValues(over, present) });
const judged = (...versions: SavedVersion[]) => new Map(versions.map((one) => [one.target, one]));

const source = (parts: Partial<PanelSource> = {}): PanelSource => ({
  candidateSet: 2,
  candidateIds: ['a', 'b'],
  findings: [finding('f1'), finding('f2', { observed: null })],
  settings: { coexistence: 0, tempering: 0.6, groups: [], together: [] },
  contributors: [
    { key: 'c1', weight: 2, judgements: judged(prior(2, [300, 200, 500]), row('f1', [650, 450, 100])) },
  ],
  ...parts,
});

describe('the panel', () => {
  it('holds fractions in the order of columns and rows, and is what assess() takes', () => {
    const panel = buildPanel(source());
    expect(panel.contributors).toEqual([
      {
        id: 'c1',
        weight: 2,
        prior: [0.3, 0.2, 0.5],
        likelihoods: { f1: { exposure: 'often', given: [0.65, 0.45, 0.1] } },
      },
    ]);
    expect(panel).toMatchObject({ candidates: ['a', 'b'], coexistence: 0, tempering: 0.6 });
    expect(panel.findings).toEqual([
      { id: 'f1', levels: 2, observed: 1, reliability: 1 },
      { id: 'f2', levels: 2, observed: null, reliability: 1 },
    ]);
    expect(assess(panel).standing.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
  });

  it('leaves out a prior of another candidate set and keeps the rows', () => {
    const contributors = [
      {
        key: 'c1',
        weight: 1,
        judgements: judged(prior(1, [300, 700], ['a', null]), row('f1', [650, 450, 100])),
      },
    ];
    const [only] = buildPanel(source({ contributors })).contributors;
    expect(only?.prior).toBeNull();
    expect(Object.keys(only?.likelihoods ?? {})).toEqual(['f1']);
  });

  it('shows a later column blank and drops a retired one', () => {
    const judgements = judged(row('f1', [650, 450, 100]));
    const panel = buildPanel(
      source({ candidateIds: ['new', 'b'], contributors: [{ key: 'c1', weight: 1, judgements }] }),
    );
    expect(panel.contributors[0]?.likelihoods.f1?.given).toEqual([null, 0.45, 0.1]);
  });

  it('leaves out whoever has nothing to pool: nothing said, taken back, or rows that count nowhere', () => {
    const contributors = [
      { key: 'c1', weight: 1, judgements: judged() },
      { key: 'c2', weight: 1, judgements: judged(makeVersion({ target: 'f1' })) },
      { key: 'c3', weight: 1, judgements: judged(row('in error', [1, 2, 3])) },
    ];
    const panel = buildPanel(source({ contributors }));
    expect(panel.contributors).toEqual([]);
    expect(canBePooled(panel)).toBe(false);
  });

  it('is not pooled while everybody in it weighs nothing', () => {
    const [one] = source().contributors;
    const panel = buildPanel(source({ contributors: one ? [{ ...one, weight: 0 }] : [] }));
    expect(panel.contributors).toHaveLength(1);
    expect(canBePooled(panel)).toBe(false);
  });

  it('carries groups, pairs by column and what tests cost, and forgets dissolved groups and retired pairs', () => {
    const panel = buildPanel(
      source({
        findings: [
          finding('f1', { groupId: 'g1', cost: 0, waitDays: 3, burden: 2 }),
          finding('f2', { groupId: 'dissolved' }),
        ],
        settings: {
          coexistence: 0.1,
          tempering: 1,
          groups: [{ id: 'g1', label: 'one mechanism', overlap: 0.33, reason: null }],
          together: [
            { a: 'b', b: 'a', times: 3, reason: 'known' },
            { a: 'a', b: 'retired', times: 2, reason: 'known' },
          ],
        },
      }),
    );
    expect(panel).toMatchObject({ coexistence: 0.1, tempering: 1, groups: [{ id: 'g1', overlap: 0.33 }] });
    expect(panel.together).toEqual([{ a: 1, b: 0, times: 3 }]);
    expect(panel.findings).toEqual([
      { id: 'f1', levels: 2, observed: 1, reliability: 1, group: 'g1', cost: 0, waitDays: 3, burden: 2 },
      { id: 'f2', levels: 2, observed: 1, reliability: 1 },
    ]);
  });

  it('takes a distribution where the finding has more levels, and blanks cells given over other levels', () => {
    const three = finding('f1', { levelLabels: ['low', 'middle', 'high'] });
    const values = [
      { candidateId: 'a', level: 0, thousandths: 100 },
      { candidateId: 'a', level: 1, thousandths: 200 },
      { candidateId: 'a', level: 2, thousandths: 700 },
      { candidateId: 'b', level: 1, thousandths: 450 },
    ];
    const judgements = judged(makeVersion({ target: 'f1', exposure: 'seldom', values }));
    const panel = buildPanel(
      source({ findings: [three], contributors: [{ key: 'c1', weight: 1, judgements }] }),
    );
    expect(panel.contributors[0]?.likelihoods.f1).toEqual({
      exposure: 'seldom',
      given: [[0.1, 0.2, 0.7], null, null],
    });
  });

  it('counts a prior only under its own target', () => {
    expect(priorTarget).toBe('prior');
    const contributors = [{ key: 'c1', weight: 1, judgements: new Map([['f1', prior(2, [300, 200, 500])]]) }];
    expect(buildPanel(source({ contributors })).contributors).toEqual([]);
  });
});
