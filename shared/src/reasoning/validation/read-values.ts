import type { Faults } from './faults.js';

type Fields = Readonly<Record<string, unknown>>;

/** The value as an object with fields, or null after noting the fault. */
export function readObject(value: unknown, path: string, faults: Faults): Fields | null {
  if (typeof value === 'object' && value !== null && !Array.isArray(value)) return value as Fields;
  faults.add(path, 'must be an object');
  return null;
}

/** The value as a list; absent is an empty one. */
export function readList(value: unknown, path: string, faults: Faults): readonly unknown[] {
  if (value === undefined) return [];
  if (Array.isArray(value)) return value as readonly unknown[];
  faults.add(path, 'must be a list');
  return [];
}

/** A number within the bounds, both included; `absent` where there is no such field. */
export function readNumber(
  value: unknown,
  low: number,
  high: number,
  absent: number,
  path: string,
  faults: Faults,
): number {
  if (value === undefined) return absent;
  if (typeof value === 'number' && value >= low && value <= high) return value;
  faults.add(
    path,
    `must be a number ${high < Number.MAX_VALUE ? `from ${low} to ${high}` : `of ${low} or more`}`,
  );
  return absent;
}

/** A whole number within the bounds, both included, or -1 after noting the fault. */
export function readIndex(value: unknown, low: number, high: number, path: string, faults: Faults): number {
  if (typeof value === 'number' && Number.isInteger(value) && value >= low && value <= high) return value;
  faults.add(path, `must be a whole number from ${low} to ${high}`);
  return -1;
}

/**
 * Positions of ids. Non-empty and distinct strings are taken; the others are
 * noted at `pathOf(position)` and cannot be referred to. Undefined is skipped:
 * it stands for an entry whose fault is already noted.
 */
export function readIds(
  ids: readonly unknown[],
  pathOf: (position: number) => string,
  faults: Faults,
): ReadonlyMap<string, number> {
  const positions = new Map<string, number>();
  ids.forEach((id, position) => {
    if (id === undefined) return;
    if (typeof id !== 'string' || id === '') faults.add(pathOf(position), 'must be a non-empty string');
    else if (positions.has(id)) faults.add(pathOf(position), `is used twice: ${JSON.stringify(id)}`);
    else positions.set(id, position);
  });
  return positions;
}

/** The ids of a list of objects, as `readIds` takes them: null where one is missing. */
export function idsOf(entries: readonly (Fields | null)[]): unknown[] {
  return entries.map((entry) => (entry ? (entry.id ?? null) : undefined));
}
