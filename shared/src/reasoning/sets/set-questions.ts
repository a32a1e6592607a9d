import type { Exponents } from '../evidence/exponents.js';
import type { Expectation, Reasoning } from '../reasoning.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';
import { fastLog } from './fast-log.js';
import { FixedPower } from './fixed-power.js';
import { marginals } from './marginals.js';
import { writeRow } from './row-kernels.js';
import { rowTable } from './row-table.js';
import type { SetTable } from './set-table.js';
import { type Support, allSets, significantSets } from './significant.js';

/** The part of an answer that sets left aside may account for, far below the 1e-12 that is promised. */
const harmless = 1e-13;

/** What may be left aside at first, and when that was too much. */
const budgets = [1e-16, 1e-20];

export interface Answered {
  panel: CheckedPanel;
  table: SetTable;
  view: View;
  exponents: Exponents;
  /** Posterior of each set. */
  shares: Float64Array;
  /** For each group Σ ln P' over its observed rows. */
  groupLogs: ReadonlyMap<number, Float64Array>;
}

/** An answer, and the largest part of it that the sets left aside could account for. */
interface Bounded<Value> {
  value: Value;
  missed: number;
}

/**
 * Questions about a posterior that is known: each divides a row out of it or
 * multiplies one in, over the significant sets. Where the sets left aside could
 * account for more than a harmless part of the answer, it is asked again of more.
 */
export function questions(answered: Answered): Pick<Reasoning, 'withoutFinding' | 'swapped' | 'expectation'> {
  const { table, shares } = answered;
  const supports: Support[] = [];
  const powers = new Map<number, FixedPower>();
  const powerOf = (exponent: number): FixedPower => {
    const power = powers.get(exponent) ?? new FixedPower(exponent);
    powers.set(exponent, power);
    return power;
  };
  const ask = <Value>(question: (support: Support) => Bounded<Value>): Value => {
    for (const [index, budget] of budgets.entries()) {
      const support = (supports[index] ??= significantSets(table, shares, budget));
      const { value, missed } = question(support);
      if (missed <= harmless) return value;
    }
    return question((supports[budgets.length] ??= allSets(table, shares))).value;
  };
  return {
    withoutFinding: (finding) => ask((support) => withoutFinding(answered, support, powerOf, finding)),
    swapped: (finding, views, column) => {
      const entering = rowDividedOut(answered, powerOf(answered.exponents.rows[finding]!), finding);
      return views.map((other) => ask((support) => entering(support, other, column)));
    },
    expectation: (finding) =>
      ask((support) => expectation(answered, support, powerOf(answered.exponents.rows[finding]!), finding)),
  };
}

function rowFor({ panel, table }: Answered, { cells }: View, finding: number, level?: number) {
  const described = panel.findings[finding]!;
  return rowTable(table, cells, described, panel.columns, level ?? described.observed ?? 0);
}

/** The standing without one finding: its row is divided out, the others of its group count for a little more. */
function withoutFinding(
  answered: Answered,
  support: Support,
  powerOf: (exponent: number) => FixedPower,
  finding: number,
): Bounded<Float64Array> {
  const { panel, table, view, exponents, groupLogs } = answered;
  const exponent = exponents.withoutOne[finding]!;
  const more = exponent - exponents.rows[finding]!;
  const group = groupLogs.get(panel.findings[finding]!.group);
  const row = rowFor(answered, view, finding);
  const power = powerOf(exponent);
  const entries = new Float64Array(support.size);
  writeRow(entries, support, row);
  let total = 0;
  for (let p = 0; p < entries.length; p += 1) {
    const others = group && more > 0 ? Math.exp(more * group[support.positions[p]!]!) : 1;
    total += entries[p] = (support.shares[p]! * others) / power.of(entries[p]!);
  }
  for (let p = 0; p < entries.length; p += 1) entries[p]! /= total;
  const value = marginals(table, support, entries, entries[0]!);
  return { value, missed: support.aside / row.least ** exponent / total };
}

/** One column's standing when a row takes other cells; dividing it out is done once for each support. */
function rowDividedOut(answered: Answered, power: FixedPower, finding: number) {
  const { table, view } = answered;
  const pooled = rowFor(answered, view, finding);
  const divided = new Map<Support, Float64Array>();
  const entries = new Float64Array(table.size);
  const dividedFor = (support: Support): Float64Array => {
    const known = divided.get(support);
    if (known) return known;
    writeRow(entries, support, pooled);
    const shares = new Float64Array(support.size);
    for (let p = 0; p < shares.length; p += 1) shares[p] = support.shares[p]! / power.of(entries[p]!);
    divided.set(support, shares);
    return shares;
  };
  return (support: Support, other: View, column: number): Bounded<number> => {
    const shares = dividedFor(support);
    const holds = membership(table, support, column);
    writeRow(entries, support, rowFor(answered, other, finding));
    let total = 0;
    let held = 0;
    for (let p = 0; p < shares.length; p += 1) {
      const share = shares[p]! * power.of(entries[p]!);
      total += share;
      held += share * holds[p]!;
    }
    // P' is at most 1, so no set left aside can have gained more than this.
    return { value: held / total, missed: support.aside / power.of(pooled.least) / total };
  };
}

/** For each set 1 where the column is the case in it, otherwise 0. */
const memberships = new WeakMap<Support, Map<number, Float64Array>>();

function membership(table: SetTable, support: Support, column: number): Float64Array {
  const columns = memberships.get(support) ?? new Map<number, Float64Array>();
  memberships.set(support, columns);
  const known = columns.get(column);
  if (known) return known;
  const holds = new Float64Array(support.size);
  const half = column < table.high.from ? table.low : table.high;
  const bit = 1 << (column - half.from);
  for (let h = 0; h < table.high.members.length; h += 1) {
    for (let p = support.starts[h]!; p < support.starts[h + 1]!; p += 1) {
      const members = half.members[half === table.low ? support.lows[p]! : h]!;
      holds[p] = column < table.candidates && (members & bit) !== 0 ? 1 : 0;
    }
  }
  if (column === table.candidates) holds[0] = 1;
  columns.set(column, holds);
  return holds;
}

/** Expected divergence of the posterior over sets from what it is now. Source: Lindley 1956, Ann. Math. Statist. 27:986-1005. */
function expectation(
  answered: Answered,
  support: Support,
  power: FixedPower,
  finding: number,
): Bounded<Expectation> {
  const { panel, table, view, exponents } = answered;
  const exponent = exponents.rows[finding]!;
  const reported = new Float64Array(support.size);
  const levels: Expectation['levels'] = [];
  let nats = 0;
  let missed = 0;
  for (let level = 0; level < panel.findings[finding]!.levels; level += 1) {
    writeRow(reported, support, rowFor(answered, view, finding, level));
    const after = new Float64Array(support.size);
    let p = 0;
    let total = 0;
    let logs = 0;
    for (let index = 0; index < after.length; index += 1) {
      const given = reported[index]!;
      const share = support.shares[index]!;
      const raised = share * power.of(given);
      after[index] = raised;
      p += share * given;
      total += raised;
      logs += raised * fastLog(given);
    }
    for (let index = 0; index < after.length; index += 1) after[index]! /= total;
    nats += p * ((exponent * logs) / total - Math.log(total));
    missed = Math.max(missed, support.aside / total);
    levels.push({ p, standing: marginals(table, support, after, after[0]!) });
  }
  return { value: { bits: Math.max(0, nats) / Math.LN2, levels }, missed };
}
