import type { CheckedContributor, CheckedFinding } from './checked-panel.js';
import { type Faults, pathStep } from './faults.js';
import { exposures, limits } from './limits.js';
import { readDistribution } from './read-distribution.js';
import { idsOf, readIds, readNumber, readObject } from './read-values.js';

/** What the readers of one panel's contributors need to know of it. */
interface Context {
  columns: number;
  findings: readonly CheckedFinding[];
  cellCount: number;
  /** Position of each finding id. */
  positions: ReadonlyMap<string, number>;
  faults: Faults;
}

/** Reads the contributors with their priors and likelihoods. */
export function readContributors(list: readonly unknown[], context: Context): CheckedContributor[] {
  const { faults } = context;
  if (list.length > limits.contributors) faults.add('contributors', `must be at most ${limits.contributors}`);
  const entries = list.map((entry, index) => readObject(entry, `contributors[${index}]`, faults));
  readIds(idsOf(entries), (index) => `contributors[${index}].id`, faults);
  const contributors = entries.map((entry, index): CheckedContributor => {
    const at = `contributors[${index}]`;
    const fields = entry ?? {};
    // NaN where refused: then nobody can say whether all weights are 0.
    const weight =
      fields.weight === undefined
        ? 1
        : readNumber(fields.weight, 0, limits.weight, NaN, `${at}.weight`, faults);
    return {
      id: typeof fields.id === 'string' ? fields.id : '',
      weight,
      prior: readPrior(fields.prior, context.columns, `${at}.prior`, faults),
      ...readLikelihoods(fields.likelihoods, `${at}.likelihoods`, context),
    };
  });
  if (contributors.length > 0 && contributors.every(({ weight }) => weight === 0)) {
    faults.add('contributors', 'must not all have weight 0');
  }
  return contributors;
}

function readPrior(value: unknown, columns: number, path: string, faults: Faults): number[] | null {
  if (value === undefined || value === null) return null;
  const prior = new Array<number>(columns).fill(0);
  return readDistribution(value, columns, 1, prior, 0, () => path, faults) ? prior : null;
}

type Likelihoods = Pick<CheckedContributor, 'exposures' | 'cells'>;

function readLikelihoods(value: unknown, path: string, context: Context): Likelihoods {
  const { findings, cellCount, positions, faults } = context;
  const likelihoods = { exposures: new Float64Array(findings.length), cells: new Float64Array(cellCount) };
  const fields = value === undefined ? null : readObject(value, path, faults);
  if (!fields) return likelihoods;
  for (const id of Object.keys(fields)) {
    const position = positions.get(id);
    const at = () => path + pathStep(id);
    if (position === undefined) faults.add(at(), 'is not the id of a finding');
    else
      likelihoods.exposures[position] = readRow(
        fields[id],
        findings[position]!,
        likelihoods.cells,
        at,
        context,
      );
  }
  return likelihoods;
}

/** Reads the cells of one row into `cells`. Returns how much it counts: 0 where every cell is blank. */
function readRow(
  value: unknown,
  { levels, start }: CheckedFinding,
  cells: Float64Array,
  path: () => string,
  { columns, faults }: Context,
): number {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    faults.add(path(), 'must be an object');
    return 0;
  }
  const { exposure, given } = value as { exposure?: unknown; given?: unknown };
  const counts = exposure === undefined ? 1 : exposures.get(exposure);
  if (counts === undefined) faults.add(`${path()}.exposure`, 'must be seldom, sometimes or often');
  if (!Array.isArray(given)) {
    faults.add(`${path()}.given`, `must be a list of ${columns} cells`);
    return 0;
  }
  const list = given as readonly unknown[];
  let filled = false;
  if (list.length === columns) {
    for (let column = 0; column < columns; column += 1) {
      const cell = list[column];
      if (cell === null) continue;
      filled =
        readCell(cell, levels, cells, start + column * levels, () => `${path()}.given[${column}]`, faults) ||
        filled;
    }
  } else {
    faults.add(`${path()}.given`, `must have ${columns} entries, has ${list.length}`);
    const aside = new Float64Array(levels);
    list.forEach((cell, column) => {
      if (cell !== null) readCell(cell, levels, aside, 0, () => `${path()}.given[${column}]`, faults);
    });
  }
  return filled ? (counts ?? 1) : 0;
}

/** Reads one cell, P(present) or a share for each level, into `cells` from `offset`. */
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
