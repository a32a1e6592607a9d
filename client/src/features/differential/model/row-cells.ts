import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { type CellView, cellView } from './cells';

/**
 * The cells of the rows, by the column's index. A row of which nothing changed keeps its cells as the very same object
 * from one call to the next, so that a live change draws the rows that it touches and no other.
 */
export function keepingRowCells(): (
  differential: Differential,
  rows: readonly Finding[],
  columns: number,
) => Map<string, CellView[]> {
  let known = new Map<string, CellView[]>();
  return (differential, rows, columns) => {
    const next = new Map<string, CellView[]>();
    for (const finding of rows) {
      const cells = Array.from({ length: columns }, (_, column) => cellView(differential, finding, column));
      const before = known.get(finding.id);
      next.set(finding.id, before && sameCells(before, cells) ? before : cells);
    }
    known = next;
    return next;
  };
}

function sameCells(before: readonly CellView[], now: readonly CellView[]): boolean {
  return before.length === now.length && before.every((cell, index) => sameCell(cell, now[index]));
}

function sameCell(one: CellView, other: CellView | undefined): boolean {
  return (
    other !== undefined &&
    one.figure?.share === other.figure?.share &&
    one.figure?.level === other.figure?.level &&
    one.ownFigure === other.ownFigure &&
    one.decibans === other.decibans &&
    one.own === other.own &&
    one.sealed === other.sealed &&
    one.unjudged === other.unjudged &&
    one.ticks.length === other.ticks.length &&
    one.ticks.every((tick, index) => tick === other.ticks[index])
  );
}
