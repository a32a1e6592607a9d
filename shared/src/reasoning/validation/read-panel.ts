import type { CheckedPair, CheckedPanel } from './checked-panel.js';
import { Faults } from './faults.js';
import { limits } from './limits.js';
import { PanelRefused } from './panel-refused.js';
import { readContributors } from './read-contributors.js';
import { readFindings } from './read-findings.js';
import { idsOf, readIds, readIndex, readList, readNumber, readObject } from './read-values.js';

/**
 * Reads an untrusted panel.
 *
 * @throws PanelRefused with every fault and its path, such as
 *   `{ path: 'contributors[0].prior', message: 'must sum to 1, sums to 0.9' }`
 */
export function readPanel(input: unknown): CheckedPanel {
  const faults = new Faults();
  const fields = readObject(input, '', faults);
  if (!fields) throw new PanelRefused(faults.found);

  const candidates = readCandidates(fields.candidates, faults);
  // Without candidates no other length can be judged, so what depends on them is not read.
  const known = candidates > 0;
  const columns = candidates + 1;
  const coexistence = readNumber(fields.coexistence, 0, limits.coexistence, 0, 'coexistence', faults);
  const tempering = readNumber(fields.tempering, limits.smallestTempering, 1, 1, 'tempering', faults);
  const pairs = known ? readPairs(readList(fields.together, 'together', faults), candidates, faults) : [];
  const groups = readGroups(readList(fields.groups, 'groups', faults), faults);
  const { findings, positions, cellCount } = readFindings(
    readList(fields.findings, 'findings', faults),
    columns,
    groups.positions,
    faults,
  );
  const contributors = readContributors(known ? readList(fields.contributors, 'contributors', faults) : [], {
    columns,
    findings,
    cellCount,
    positions,
    faults,
  });
  if (faults.found.length > 0) throw new PanelRefused(faults.found);
  return {
    candidates,
    columns,
    coexistence,
    tempering,
    pairs,
    overlaps: groups.overlaps,
    findings,
    cellCount,
    contributors,
  };
}

/** The number of candidates; their ids matter only for being distinct. */
function readCandidates(value: unknown, faults: Faults): number {
  if (!Array.isArray(value) || value.length < 1 || value.length > limits.candidates) {
    faults.add('candidates', `must be a list of 1 to ${limits.candidates} ids`);
  }
  if (!Array.isArray(value)) return 0;
  const ids = Array.from(value as unknown[], (id) => id ?? null);
  readIds(ids, (index) => `candidates[${index}]`, faults);
  return value.length;
}

function readGroups(list: readonly unknown[], faults: Faults) {
  const entries = list.map((entry, index) => readObject(entry, `groups[${index}]`, faults));
  const positions = readIds(idsOf(entries), (index) => `groups[${index}].id`, faults);
  const overlaps = entries.map((entry, index) => {
    const overlap = entry ? (entry.overlap ?? null) : null;
    return readNumber(overlap, 0, 1, 0, `groups[${index}].overlap`, faults);
  });
  return { positions, overlaps };
}

function readPairs(list: readonly unknown[], candidates: number, faults: Faults): CheckedPair[] {
  const seen = new Set<string>();
  return list.flatMap((entry, index) => {
    const at = `together[${index}]`;
    const fields = readObject(entry, at, faults);
    if (!fields) return [];
    const a = readIndex(fields.a, 0, candidates - 1, `${at}.a`, faults);
    const b = readIndex(fields.b, 0, candidates - 1, `${at}.b`, faults);
    const times = readNumber(fields.times ?? null, 0, limits.times, 1, `${at}.times`, faults);
    if (a < 0 || b < 0) return [];
    const pair = `${Math.min(a, b)} ${Math.max(a, b)}`;
    if (a === b) faults.add(at, 'must name two different candidates');
    else if (seen.has(pair)) faults.add(at, 'names a pair that is already there');
    seen.add(pair);
    return [{ a, b, times }];
  });
}
