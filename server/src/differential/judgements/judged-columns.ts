import type { SavedVersion } from './saved-version.js';

/** A cell in thousandths: how many would show the finding, a share for each level, or a blank. */
export type Cell = number | number[] | null;

/** A whole of 100 in thousandths. */
export const whole = 1000;

/**
 * A saved prior by columns, in thousandths.
 * @param columns candidate ids in order, null (none of these) last
 * @returns null where it was taken back or was given over other columns
 */
export function priorByColumns(saved: SavedVersion, columns: readonly (string | null)[]): number[] | null {
  const shares = new Map(saved.values.map((value) => [value.candidateId, value.thousandths]));
  const given = columns.map((column) => shares.get(column));
  const all = given.filter((share) => share !== undefined);
  return all.length === columns.length && sumOf(all) === whole ? all : null;
}

/**
 * A saved row by columns, in thousandths. Columns that came later are blank, columns that were retired drop out, and
 * a cell given over other levels than the finding has today is blank, too.
 * @param levels the finding's number of levels
 */
export function rowByColumns(
  saved: SavedVersion,
  columns: readonly (string | null)[],
  levels: number,
): Cell[] {
  return columns.map((column) => {
    const values = saved.values.filter((value) => value.candidateId === column);
    return levels === 2 ? presentOf(values) : distributionOf(values, levels);
  });
}

export const isBlank = (cells: readonly Cell[]): boolean => cells.every((cell) => cell === null);

/** A cell with every number multiplied: by 0.1 it is out of 100, by 0.001 a fraction. Exact to the last digit. */
export function scaled(cell: Cell, divisor: 10 | 1000): Cell {
  if (cell === null) return null;
  return typeof cell === 'number' ? cell / divisor : cell.map((share) => share / divisor);
}

function presentOf(values: readonly { level: number; thousandths: number }[]): number | null {
  const [only, ...more] = values;
  return only?.level === 1 && more.length === 0 ? only.thousandths : null;
}

function distributionOf(
  values: readonly { level: number; thousandths: number }[],
  levels: number,
): number[] | null {
  const shares = [...values].sort((a, b) => a.level - b.level);
  const complete = shares.length === levels && shares.every((share, level) => share.level === level);
  const numbers = shares.map((share) => share.thousandths);
  return complete && sumOf(numbers) === whole ? numbers : null;
}

export function sumOf(numbers: readonly number[]): number {
  return numbers.reduce((sum, value) => sum + value, 0);
}
