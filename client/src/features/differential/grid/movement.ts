/** A place in the grid. Row 0 is the prior, the last row the standing; column 0 is the row's title. */
export interface Place {
  row: number;
  column: number;
}

export interface GridSize {
  rows: number;
  columns: number;
}

/** How many rows Page up and Page down pass over. */
export const pageRows = 8;

/**
 * Where a key moves to.
 * @param key as KeyboardEvent.key names it
 * @param whole with Control: Home and End go to the grid's corners
 * @returns null for a key that does not move
 * @source WAI-ARIA Authoring Practices, grid pattern
 */
export function moveInGrid(from: Place, key: string, whole: boolean, size: GridSize): Place | null {
  const step = steps.get(key);
  if (step) return held({ row: from.row + step.row, column: from.column + step.column }, size);
  if (key === 'Home') return held({ row: whole ? 0 : from.row, column: 0 }, size);
  if (key === 'End') return held({ row: whole ? size.rows - 1 : from.row, column: size.columns - 1 }, size);
  return null;
}

const steps = new Map<string, Place>([
  ['ArrowUp', { row: -1, column: 0 }],
  ['ArrowDown', { row: 1, column: 0 }],
  ['ArrowLeft', { row: 0, column: -1 }],
  ['ArrowRight', { row: 0, column: 1 }],
  ['PageUp', { row: -pageRows, column: 0 }],
  ['PageDown', { row: pageRows, column: 0 }],
]);

/** The nearest place inside the grid; rows and columns may have gone meanwhile. */
export function held(place: Place, size: GridSize): Place {
  const inside = (index: number, count: number) => Math.max(0, Math.min(count - 1, index));
  return { row: inside(place.row, size.rows), column: inside(place.column, size.columns) };
}

/** Whether a key begins typing a number. */
export function startsNumber(key: string): boolean {
  return /^[0-9]$/.test(key);
}
