import { describe, expect, it } from 'vitest';
import {
  makeAssessment,
  makeDifferential,
  makeFinding,
  makeMine,
  makeRow,
} from '../testing/make-differential';
import { cellView } from './cells';

const fever = makeFinding({ id: 'fever' });
const row = { weightOfEvidence: [4, -4], by: { me: [6, null], dr: [2, -1] }, apart: null, swing: 0 };
const assessment = makeAssessment({
  pooledCells: {
    fever: [
      [0.12, 0.88],
      [0.6, 0.4],
    ],
  },
  rows: { fever: row },
  unjudged: [{ finding: 'fever', column: 1 }],
});
const pooled = makeDifferential({ findings: [fever], assessment, mine: makeMine() });

describe('a cell of the pool', () => {
  it('shows the pooled share for what was observed, the beam, the others as ticks and oneself apart', () => {
    expect(cellView(pooled, fever, 0)).toMatchObject({
      figure: { share: 0.88, level: 1 },
      decibans: 4,
      ticks: [2],
      own: 6,
      unjudged: 'no',
      ownFigure: false,
    });
  });

  it('shows for an absent finding how many would not show it', () => {
    expect(cellView(pooled, { ...fever, observed: 0 }, 0).figure).toEqual({ share: 0.12, level: 0 });
  });

  it('has a figure and no beam while the finding is pending', () => {
    const differential = {
      ...pooled,
      assessment: { ...assessment, rows: { fever: { ...row, weightOfEvidence: [], by: {} } } },
    };
    const cell = cellView(differential, { ...fever, observed: null }, 0);
    expect(cell.figure?.share).toBe(0.88);
    expect(cell.decibans).toBeNull();
    expect(cell.ticks).toEqual([]);
  });

  it('says where nobody judged it', () => {
    expect(cellView(pooled, fever, 1)).toMatchObject({ unjudged: 'cell', own: null, ticks: [-1] });
    expect(cellView(pooled, makeFinding({ id: 'other' }), 0)).toMatchObject({
      unjudged: 'row',
      figure: null,
    });
  });

  it('names the likeliest level of a pending finding with more than two', () => {
    const biopsy = makeFinding({ id: 'biopsy', levelLabels: ['a', 'b', 'c'], observed: null });
    const differential = {
      ...pooled,
      assessment: makeAssessment({ pooledCells: { biopsy: [[0.2, 0.7, 0.1]] } }),
    };
    expect(cellView(differential, biopsy, 0).figure).toEqual({ share: 0.7, level: 1 });
  });
});

describe('a cell of a sealed round', () => {
  const mine = makeMine({ findings: [makeRow('fever', [65, null])] });
  const sealed = makeDifferential({ findings: [fever], sealed: true, mine });

  it('shows one’s own number and nothing else', () => {
    expect(cellView(sealed, fever, 0)).toEqual({
      figure: { share: 0.65, level: 1 },
      ownFigure: true,
      decibans: null,
      ticks: [],
      own: null,
      sealed: true,
      unjudged: 'no',
    });
  });

  it('is empty where one left it blank, and for whoever does not judge', () => {
    expect(cellView(sealed, fever, 1)).toMatchObject({ figure: null, sealed: true });
    expect(cellView({ ...sealed, mine: null }, fever, 0)).toMatchObject({ figure: null, sealed: true });
  });
});

it('counts nothing for a row that was entered in error', () => {
  const struck = { ...fever, enteredInError: { words: 'x', by: 'y', at: '2026-12-01T09:00:00.000Z' } };
  expect(cellView(pooled, struck, 0)).toMatchObject({ figure: null, decibans: null, ticks: [] });
});
