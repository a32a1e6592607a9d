import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import type { RowJudgement } from '@weighhouse/shared/contracts/judgements';
import { isTwoLevel } from './finding-words';

/** A share for what was observed; for a pending finding of more than two levels, of the likeliest level. */
export interface Figure {
  share: number;
  level: number;
}

/** One cell of a finding's row. */
export interface CellView {
  /** The pool's figure; one's own while the round is sealed; null where there is none. */
  figure: Figure | null;
  /** The figure is one's own alone. */
  ownFigure: boolean;
  decibans: number | null;
  ticks: number[];
  own: number | null;
  /** Others' numbers lie behind the seal. */
  sealed: boolean;
  /** Nobody judged this cell although the row is judged, or nobody judged the row. */
  unjudged: 'no' | 'cell' | 'row';
}

/** The numbers of an open sealed round are on nobody's screen; those of an earlier round are, where there was one. */
export function showsPool(differential: Differential): boolean {
  return differential.assessment !== null;
}

/** One's own numbers alone: a sealed round with no earlier one to show. */
export function isBehindSeal(differential: Differential): boolean {
  return differential.sealed && differential.assessment === null;
}

export function cellView(differential: Differential, finding: Finding, column: number): CellView {
  const { assessment, mine } = differential;
  if (finding.enteredInError) return { ...empty, unjudged: 'no' };
  if (!assessment) {
    const figure = ownFigure(
      mine?.findings.find((row) => row.findingId === finding.id),
      finding,
      column,
    );
    const sealed = differential.sealed;
    return {
      ...empty,
      figure,
      ownFigure: figure !== null,
      sealed,
      unjudged: sealed || figure ? 'no' : 'row',
    };
  }
  return pooledCell(assessment, mine?.key ?? null, finding, column);
}

const empty: CellView = {
  figure: null,
  ownFigure: false,
  decibans: null,
  ticks: [],
  own: null,
  sealed: false,
  unjudged: 'row',
};

function pooledCell(
  assessment: AssessmentView,
  ownKey: string | null,
  finding: Finding,
  column: number,
): CellView {
  const levels = assessment.pooledCells[finding.id]?.[column];
  if (!levels) return empty;
  const row = assessment.rows[finding.id];
  const by = Object.entries(row?.by ?? {}).map(([key, values]) => ({ key, value: values[column] ?? null }));
  const unjudged = assessment.unjudged.some((cell) => cell.finding === finding.id && cell.column === column);
  return {
    figure: figureOf(levels, finding),
    ownFigure: false,
    decibans: row?.weightOfEvidence[column] ?? null,
    ticks: by.flatMap(({ key, value }) => (key === ownKey || value === null ? [] : [value])),
    own: by.find(({ key }) => key === ownKey)?.value ?? null,
    sealed: false,
    unjudged: unjudged ? 'cell' : 'no',
  };
}

/** The figure that a cell shows out of its share for each level. */
export function figureOf(levels: readonly number[], finding: Finding): Figure | null {
  const level = finding.observed ?? (isTwoLevel(finding) ? 1 : levels.indexOf(Math.max(...levels)));
  const share = levels[level];
  return share === undefined ? null : { share, level };
}

/** The same from one person's own saved numbers. */
export function ownFigure(row: RowJudgement | undefined, finding: Finding, column: number): Figure | null {
  const given = row?.outOf100[column] ?? null;
  return given === null ? null : figureOf(levelShares(given), finding);
}

/** A judged cell as a share for each level. */
export function levelShares(given: number | readonly number[]): number[] {
  return typeof given === 'number' ? [1 - given / 100, given / 100] : given.map((share) => share / 100);
}
