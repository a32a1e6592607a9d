import type { TrailEntry } from '@weighhouse/shared/contracts/trail';

/** Entries in a row that say the same of the same person, told once. Newest first, as the entries are. */
export interface Run {
  entry: TrailEntry;
  times: number;
  /** When the first of them was; the entry is the last. */
  since: string;
}

export function runsOf(entries: readonly TrailEntry[]): Run[] {
  const runs: Run[] = [];
  for (const entry of entries) {
    const last = runs.at(-1);
    if (last && last.entry.who === entry.who && last.entry.sentence === entry.sentence) {
      last.times += 1;
      last.since = entry.at;
    } else runs.push({ entry, times: 1, since: entry.at });
  }
  return runs;
}
