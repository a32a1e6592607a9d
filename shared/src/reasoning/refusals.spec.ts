import { describe, expect, it } from 'vitest';
import { type Fault, PanelRefused, assess } from './assess.js';

const sound = {
  candidates: ['a', 'b'],
  findings: [{ id: 'f', observed: 1 }],
  contributors: [{ id: 'c', prior: [0.2, 0.3, 0.5], likelihoods: { f: { given: [0.5, 0.4, 0.3] } } }],
};

function faultsOf(input: unknown): Fault[] {
  try {
    assess(input);
  } catch (error) {
    if (error instanceof PanelRefused) return [...error.errors];
    throw error;
  }
  return [];
}

const pathsOf = (input: unknown) => faultsOf(input).map(({ path }) => path);
const contributor = (change: object) => ({
  ...sound,
  contributors: [{ ...sound.contributors[0], ...change }],
});
const finding = (change: object) => ({ ...sound, findings: [{ ...sound.findings[0], ...change }] });
const given = (cells: unknown, levels = 2) => ({
  ...contributor({ likelihoods: { f: { given: cells } } }),
  findings: [{ id: 'f', levels }],
});
const withHole = new Array<number>(3);
withHole[0] = withHole[2] = 0.5;
const many = (length: number, make: (index: number) => unknown) =>
  Array.from({ length }, (_, index) => make(index));

describe('a sound panel', () => {
  it('is taken', () => expect(faultsOf(sound)).toEqual([]));
  it('may have unknown keys', () =>
    expect(faultsOf({ ...sound, note: 'x', findings: [{ id: 'f', x: 1 }] })).toEqual([]));
  it('may be a single candidate that nobody judged', () => {
    expect(assess({ candidates: ['a'] }).standing).toEqual([0.5, 0.5]);
  });
  it('may have 30 candidates, 300 findings and 25 contributors', () => {
    const panel = {
      candidates: many(30, (index) => `${index}`),
      findings: many(300, (index) => ({ id: `${index}` })),
      contributors: many(25, (index) => ({ id: `${index}` })),
    };
    expect(faultsOf(panel)).toEqual([]);
  });
  it('may sum to 1 within 0.0005, and is renormalised', () => {
    expect(assess(contributor({ prior: [0.2, 0.3, 0.4995] })).pooledPrior[0]).toBeCloseTo(0.2 / 0.9995, 12);
    expect(faultsOf(contributor({ prior: [0.2, 0.3, 0.5005] }))).toEqual([]);
    expect(pathsOf(contributor({ prior: [0.2, 0.3, 0.5006] }))).toEqual(['contributors[0].prior']);
  });
});

describe('refused, with the path of the fault', () => {
  it.each<[string, unknown, string[]]>([
    ['no object', 7, ['']],
    ['null', null, ['']],
    ['a list', [], ['']],
    ['nothing', undefined, ['']],
    ['no candidates', {}, ['candidates']],
    ['an empty list of candidates', { candidates: [] }, ['candidates']],
    ['31 candidates', { candidates: many(31, (index) => `${index}`) }, ['candidates']],
    ['candidates as text', { candidates: 'ab' }, ['candidates']],
    ['an empty id', { candidates: ['a', ''] }, ['candidates[1]']],
    ['a number as an id', { candidates: ['a', 1] }, ['candidates[1]']],
    ['a candidate twice', { candidates: ['a', 'b', 'a'] }, ['candidates[2]']],
    ['a finding twice', { ...sound, findings: [{ id: 'f' }, { id: 'f' }] }, ['findings[1].id']],
    ['a finding without id', { ...sound, contributors: [], findings: [{}] }, ['findings[0].id']],
    [
      'a contributor twice',
      { candidates: ['a'], contributors: [{ id: 'c' }, { id: 'c' }] },
      ['contributors[1].id'],
    ],
    [
      'a group twice',
      {
        ...sound,
        groups: [
          { id: 'g', overlap: 0 },
          { id: 'g', overlap: 0 },
        ],
      },
      ['groups[1].id'],
    ],
    ['findings as an object', { candidates: ['a'], findings: {} }, ['findings']],
    ['contributors as text', { candidates: ['a'], contributors: 'c' }, ['contributors']],
    [
      '301 findings',
      { candidates: ['a'], findings: many(301, (index) => ({ id: `${index}` })) },
      ['findings'],
    ],
    [
      '26 contributors',
      { candidates: ['a'], contributors: many(26, (index) => ({ id: `${index}` })) },
      ['contributors'],
    ],
    ['a null finding', { candidates: ['a'], findings: [null] }, ['findings[0]']],
    ['a contributor that is a list', { candidates: ['a'], contributors: [[]] }, ['contributors[0]']],

    ['a coexistence over one half', { ...sound, coexistence: 0.51 }, ['coexistence']],
    ['a negative coexistence', { ...sound, coexistence: -0.1 }, ['coexistence']],
    ['NaN for coexistence', { ...sound, coexistence: NaN }, ['coexistence']],
    ['text for coexistence', { ...sound, coexistence: '0.1' }, ['coexistence']],
    ['null for coexistence', { ...sound, coexistence: null }, ['coexistence']],
    ['a tempering below 0.3', { ...sound, tempering: 0.29 }, ['tempering']],
    ['a tempering above 1', { ...sound, tempering: 1.01 }, ['tempering']],

    ['a pair of one', { ...sound, together: [{ a: 1, b: 1, times: 2 }] }, ['together[0]']],
    [
      'a pair twice',
      {
        ...sound,
        together: [
          { a: 0, b: 1, times: 2 },
          { a: 1, b: 0, times: 3 },
        ],
      },
      ['together[1]'],
    ],
    ['a pair with none of these', { ...sound, together: [{ a: 0, b: 2, times: 2 }] }, ['together[0].b']],
    ['a pair with half a candidate', { ...sound, together: [{ a: 0.5, b: 1, times: 2 }] }, ['together[0].a']],
    ['times over 100', { ...sound, together: [{ a: 0, b: 1, times: 101 }] }, ['together[0].times']],
    ['no times', { ...sound, together: [{ a: 0, b: 1 }] }, ['together[0].times']],
    ['times infinite', { ...sound, together: [{ a: 0, b: 1, times: Infinity }] }, ['together[0].times']],

    ['an overlap over 1', { ...sound, groups: [{ id: 'g', overlap: 1.1 }] }, ['groups[0].overlap']],
    ['no overlap', { ...sound, groups: [{ id: 'g' }] }, ['groups[0].overlap']],

    ['one level', finding({ levels: 1 }), ['findings[0].levels']],
    ['seven levels', { candidates: ['a'], findings: [{ id: 'f', levels: 7 }] }, ['findings[0].levels']],
    ['an observed level that is not there', finding({ observed: 2 }), ['findings[0].observed']],
    ['a negative level', finding({ observed: -1 }), ['findings[0].observed']],
    ['present as true', finding({ observed: true }), ['findings[0].observed']],
    ['a reliability of 0', finding({ reliability: 0 }), ['findings[0].reliability']],
    ['a reliability over 1', finding({ reliability: 1.2 }), ['findings[0].reliability']],
    ['an unknown group', finding({ group: 'g' }), ['findings[0].group']],
    ['a negative cost', finding({ cost: -1 }), ['findings[0].cost']],
    ['an infinite wait', finding({ waitDays: Infinity }), ['findings[0].waitDays']],
    ['a burden of 4', finding({ burden: 4 }), ['findings[0].burden']],

    ['a weight over 3', contributor({ weight: 3.1 }), ['contributors[0].weight']],
    ['a negative weight', contributor({ weight: -1 }), ['contributors[0].weight']],
    ['weights all 0', contributor({ weight: 0 }), ['contributors']],
    ['a short prior', contributor({ prior: [0.5, 0.5] }), ['contributors[0].prior']],
    ['a long prior', contributor({ prior: [0.25, 0.25, 0.25, 0.25] }), ['contributors[0].prior']],
    ['a prior as text', contributor({ prior: '0.2,0.3,0.5' }), ['contributors[0].prior']],
    ['text in a prior', contributor({ prior: [0.2, '0.3', 0.5] }), ['contributors[0].prior[1]']],
    ['null in a prior', contributor({ prior: [0.5, null, 0.5] }), ['contributors[0].prior[1]']],
    ['NaN in a prior', contributor({ prior: [0.5, NaN, 0.5] }), ['contributors[0].prior[1]']],
    ['1e-300 in a prior', contributor({ prior: [0.5, 1e-300, 0.5] }), ['contributors[0].prior[1]']],
    ['a hole in a prior', contributor({ prior: withHole }), ['contributors[0].prior[1]']],
    ['a prior that sums to 0.9', contributor({ prior: [0.2, 0.2, 0.5] }), ['contributors[0].prior']],

    ['likelihoods as a list', contributor({ likelihoods: [] }), ['contributors[0].likelihoods']],
    [
      'an unknown finding',
      contributor({ likelihoods: { g: { given: [null, null, null] } } }),
      ['contributors[0].likelihoods.g'],
    ],
    [
      'an odd unknown finding',
      contributor({ likelihoods: { 'a.b': {} } }),
      ['contributors[0].likelihoods["a.b"]'],
    ],
    [
      'an unknown exposure',
      contributor({ likelihoods: { f: { exposure: 'daily', given: [null, null, null] } } }),
      ['contributors[0].likelihoods.f.exposure'],
    ],
    ['a row without cells', contributor({ likelihoods: { f: {} } }), ['contributors[0].likelihoods.f.given']],
    ['a row that is a number', contributor({ likelihoods: { f: 0.5 } }), ['contributors[0].likelihoods.f']],
    ['too few cells', given([0.5, 0.5]), ['contributors[0].likelihoods.f.given']],
    ['too many cells', given([0.5, 0.5, 0.5, 0.5]), ['contributors[0].likelihoods.f.given']],
    ['a likelihood of 0', given([0, 0.5, null]), ['contributors[0].likelihoods.f.given[0]']],
    ['a likelihood of 1', given([0.5, 1, null]), ['contributors[0].likelihoods.f.given[1]']],
    ['a likelihood as text', given(['0.5', 0.5, null]), ['contributors[0].likelihoods.f.given[0]']],
    ['a cell left out', given([undefined, 0.5, null]), ['contributors[0].likelihoods.f.given[0]']],
    ['a number for three levels', given([0.5, null, null], 3), ['contributors[0].likelihoods.f.given[0]']],
    [
      'two shares for three levels',
      given([[0.5, 0.5], null, null], 3),
      ['contributors[0].likelihoods.f.given[0]'],
    ],
    [
      'a share of 0 for a level',
      given([[0.5, 0.5, 0], null, null], 3),
      ['contributors[0].likelihoods.f.given[0][2]'],
    ],
    [
      'levels that sum to 1.1',
      given([null, [0.5, 0.5, 0.1], null], 3),
      ['contributors[0].likelihoods.f.given[1]'],
    ],
    [
      'levels nested too deep',
      given([[[0.5], 0.5], null, null]),
      ['contributors[0].likelihoods.f.given[0][0]'],
    ],
  ])('%s', (_, input, paths) => expect(pathsOf(input)).toEqual(paths));

  it('every fault at once, not only the first', () => {
    const paths = pathsOf({
      candidates: ['a', ''],
      coexistence: 2,
      findings: [{ id: 'f', reliability: 0, observed: 5 }, 'x'],
      contributors: [
        { id: 'c', weight: 9, prior: [2, 'x', 0.5], likelihoods: { f: { given: [7, 0.5, 0] }, g: {} } },
      ],
    });
    expect(paths.sort()).toEqual(
      [
        'candidates[1]',
        'coexistence',
        'findings[0].reliability',
        'findings[0].observed',
        'findings[1]',
        'contributors[0].weight',
        'contributors[0].prior[0]',
        'contributors[0].prior[1]',
        'contributors[0].likelihoods.f.given[0]',
        'contributors[0].likelihoods.f.given[2]',
        'contributors[0].likelihoods.g',
      ].sort(),
    );
  });

  it('says what is wrong, in words', () => {
    expect(faultsOf(contributor({ prior: [0.2, 0.2, 0.5] }))).toEqual([
      { path: 'contributors[0].prior', message: 'must sum to 1, sums to 0.9' },
    ]);
  });
});
