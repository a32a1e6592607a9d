import { describe, expect, it } from 'vitest';
import { makeAssessment, makeCandidate, makeDifferential, makeFinding } from '../testing/make-differential';
import { keepingRowCells } from './row-cells';

const findings = [makeFinding({ id: 'fever' }), makeFinding({ id: 'rash' })];
const row = (decibans: number[]) => ({
  weightOfEvidence: decibans,
  by: { a: decibans },
  apart: null,
  swing: Math.random(),
});
const differential = (rash: number, fever = 0.4) =>
  makeDifferential({
    candidates: [makeCandidate('still')],
    findings,
    assessment: makeAssessment({
      standing: [Math.random(), 0.5],
      pooledCells: {
        fever: [
          [1 - fever, fever],
          [0.8, 0.2],
        ],
        rash: [
          [1 - rash, rash],
          [0.5, 0.5],
        ],
      },
      rows: { fever: row([fever, -fever]), rash: row([rash, -rash]) },
    }),
  });

describe('the cells of the rows', () => {
  it('are the same object in a row that a change does not touch, and new ones in a row that it does', () => {
    const cellsOf = keepingRowCells();
    const before = cellsOf(differential(0.3), findings, 2);
    const after = cellsOf(differential(0.7), findings, 2);
    expect(after.get('fever')).toBe(before.get('fever'));
    expect(after.get('rash')).not.toBe(before.get('rash'));
    expect(after.get('rash')?.[0]?.figure?.share).toBe(0.7);
  });
  it('change with a single tick, and with the sealing', () => {
    const cellsOf = keepingRowCells();
    const open = differential(0.3);
    const before = cellsOf(open, findings, 2).get('rash');
    const moved = structuredClone(open);
    const by = moved.assessment?.rows['rash']?.by;
    if (by) by['a'] = [0.31, -0.3];
    expect(cellsOf(moved, findings, 2).get('rash')).not.toBe(before);
    const sealed = cellsOf({ ...open, assessment: null, sealed: true }, findings, 2).get('rash');
    expect(sealed?.every((cell) => cell.sealed && cell.figure === null && cell.ticks.length === 0)).toBe(
      true,
    );
  });
  it('grow and shrink with the candidates', () => {
    const cellsOf = keepingRowCells();
    expect(cellsOf(differential(0.3), findings, 2).get('fever')).toHaveLength(2);
    expect(cellsOf(differential(0.3), findings, 3).get('fever')).toHaveLength(3);
  });
});
