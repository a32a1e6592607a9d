import type { CheckedFinding } from './checked-panel.js';
import type { Faults } from './faults.js';
import { limits } from './limits.js';
import { idsOf, readIds, readIndex, readNumber, readObject } from './read-values.js';

export interface ReadFindings {
  findings: CheckedFinding[];
  positions: ReadonlyMap<string, number>;
  /** Length of a list that holds the cells of all of them. */
  cellCount: number;
}

/** Reads the findings; `groups` holds the position of each group id. Their cells are laid out one after the other. */
export function readFindings(
  list: readonly unknown[],
  columns: number,
  groups: ReadonlyMap<string, number>,
  faults: Faults,
): ReadFindings {
  if (list.length > limits.findings) faults.add('findings', `must be at most ${limits.findings}`);
  const entries = list.map((entry, index) => readObject(entry, `findings[${index}]`, faults));
  const positions = readIds(idsOf(entries), (index) => `findings[${index}].id`, faults);
  let start = 0;
  const findings = entries.map((entry, index): CheckedFinding => {
    const at = `findings[${index}]`;
    const fields = entry ?? {};
    const levels =
      fields.levels === undefined ? 2 : readIndex(fields.levels, 2, limits.levels, `${at}.levels`, faults);
    const finding = {
      id: typeof fields.id === 'string' ? fields.id : '',
      levels: levels < 0 ? 2 : levels,
      observed: readObserved(fields.observed, levels, `${at}.observed`, faults),
      reliability: readReliability(fields.reliability, `${at}.reliability`, faults),
      group: readGroup(fields.group, groups, `${at}.group`, faults),
      cost: readNumber(fields.cost ?? undefined, 0, Number.MAX_VALUE, 0, `${at}.cost`, faults),
      waitDays: readNumber(fields.waitDays ?? undefined, 0, Number.MAX_VALUE, 0, `${at}.waitDays`, faults),
      burden: readNumber(fields.burden ?? undefined, 0, limits.burden, 0, `${at}.burden`, faults),
      start,
    };
    start += columns * finding.levels;
    return finding;
  });
  return { findings, positions, cellCount: start };
}

function readObserved(value: unknown, levels: number, path: string, faults: Faults): number | null {
  if (value === undefined || value === null) return null;
  // Where the number of levels is itself at fault, only the widest range can be asked for.
  const level = readIndex(value, 0, (levels < 0 ? limits.levels : levels) - 1, path, faults);
  return level < 0 ? null : level;
}

function readReliability(value: unknown, path: string, faults: Faults): number {
  if (value === undefined) return 1;
  if (typeof value === 'number' && value > 0 && value <= 1) return value;
  faults.add(path, 'must be a number above 0, at most 1');
  return 1;
}

function readGroup(
  value: unknown,
  groups: ReadonlyMap<string, number>,
  path: string,
  faults: Faults,
): number {
  if (value === undefined || value === null) return -1;
  const position = typeof value === 'string' ? groups.get(value) : undefined;
  if (position !== undefined) return position;
  faults.add(path, 'is not the id of a group');
  return -1;
}
