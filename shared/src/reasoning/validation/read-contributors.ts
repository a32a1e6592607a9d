import type { CheckedContributor, CheckedFinding, Judgement } from './checked-panel.js';
import { type Faults, pathStep } from './faults.js';
import { exposures, limits } from './limits.js';
import { readDistribution } from './read-distribution.js';
import { idsOf, readIds, readNumber, readObject } from './read-values.js';

/** Reads the contributors with their priors and likelihoods; `positions` holds the position of each finding id. */
export function readContributors(
  list: readonly unknown[],
  columns: number,
  findings: readonly CheckedFinding[],
  positions: ReadonlyMap<string, number>,
  faults: Faults,
): CheckedContributor[] {
  if (list.length > limits.contributors) faults.add('contributors', `must be at most ${limits.contributors}`);
  const entries = list.map((entry, index) => readObject(entry, `contributors[${index}]`, faults));
  readIds(idsOf(entries), (index) => `contributors[${index}].id`, faults);
  const before = faults.found.length;
  const contributors = entries.map((entry, index): CheckedContributor => {
    const at = `contributors[${index}]`;
    const fields = entry ?? {};
    return {
      id: typeof fields.id === 'string' ? fields.id : '',
      weight: readNumber(fields.weight, 0, limits.weight, 1, `${at}.weight`, faults),
      prior: readPrior(fields.prior, columns, `${at}.prior`, faults),
      judgements: readLikelihoods(
        fields.likelihoods,
        columns,
        findings,
        positions,
        `${at}.likelihoods`,
        faults,
      ),
    };
  });
  const weightsSound = !faults.found.slice(before).some(({ path }) => path.endsWith('].weight'));
  if (contributors.length > 0 && weightsSound && contributors.every(({ weight }) => weight === 0)) {
    faults.add('contributors', 'must not all have weight 0');
  }
  return contributors;
}

function readPrior(value: unknown, columns: number, path: string, faults: Faults): number[] | null {
  if (value === undefined || value === null) return null;
  const prior = new Array<number>(columns).fill(0);
  return readDistribution(value, columns, 1, prior, 0, () => path, faults) ? prior : null;
}

function readLikelihoods(
  value: unknown,
  columns: number,
  findings: readonly CheckedFinding[],
  positions: ReadonlyMap<string, number>,
  path: string,
  faults: Faults,
): (Judgement | null)[] {
  const judgements = new Array<Judgement | null>(findings.length).fill(null);
  const fields = value === undefined ? {} : readObject(value, path, faults);
  if (!fields) return judgements;
  for (const id of Object.keys(fields)) {
    const position = positions.get(id);
    const at = () => path + pathStep(id);
    if (position === undefined) faults.add(at(), 'is not the id of a finding');
    else judgements[position] = readJudgement(fields[id], columns, findings[position]!.levels, at, faults);
  }
  return judgements;
}

function readJudgement(
  value: unknown,
  columns: number,
  levels: number,
  path: () => string,
  faults: Faults,
): Judgement | null {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    faults.add(path(), 'must be an object');
    return null;
  }
  const { exposure, given } = value as { exposure?: unknown; given?: unknown };
  const share = exposure === undefined ? 1 : exposures.get(exposure);
  if (share === undefined) faults.add(`${path()}.exposure`, 'must be seldom, sometimes or often');
  if (!Array.isArray(given)) {
    faults.add(`${path()}.given`, `must be a list of ${columns} cells`);
    return null;
  }
  const list = given as readonly unknown[];
  if (list.length !== columns)
    faults.add(`${path()}.given`, `must have ${columns} entries, has ${list.length}`);
  const cells = new Float64Array(Math.max(columns, list.length) * levels);
  let filled = false;
  for (let column = 0; column < list.length; column += 1) {
    const cell = list[column];
    if (cell === null) continue;
    filled =
      readCell(cell, levels, cells, column * levels, () => `${path()}.given[${column}]`, faults) || filled;
  }
  return filled ? { exposure: share ?? 1, cells } : null;
}

function readCell(
  cell: unknown,
  levels: number,
  cells: Float64Array,
  offset: number,
  path: () => string,
  faults: Faults,
): boolean {
  const { smallestShare, largestLikelihood } = limits;
  if (levels > 2 || Array.isArray(cell)) {
    return readDistribution(cell, levels, largestLikelihood, cells, offset, path, faults);
  }
  if (typeof cell === 'number' && cell >= smallestShare && cell <= largestLikelihood) {
    cells[offset] = 1 - cell;
    cells[offset + 1] = cell;
    return true;
  }
  faults.add(path(), `must be a share from ${smallestShare} to ${largestLikelihood}, or null`);
  return false;
}
