import { Decimal as Decimals } from 'decimal.js';
import type { GivenCell, Panel, PanelContributor } from '../panel.js';

const Decimal = Decimals.clone({ precision: 60, toExpNeg: -9e15, toExpPos: 9e15 });
type Decimal = Decimals;

const sum = (list: readonly Decimal[]) => list.reduce((total, next) => total.plus(next), new Decimal(0));
const product = (list: readonly Decimal[]) => list.reduce((total, next) => total.times(next), new Decimal(1));
const normalised = (list: readonly Decimal[]) => {
  const total = sum(list);
  return list.map((next) => next.div(total));
};

function cellOf(given: GivenCell | undefined): Decimal[] | null {
  if (given === null || given === undefined) return null;
  if (typeof given === 'number') return [new Decimal(1).minus(given), new Decimal(given)];
  return normalised(given.map((share) => new Decimal(share)));
}

function logPool(distributions: readonly (readonly Decimal[])[], weights: readonly Decimal[]): Decimal[] {
  const shares = normalised(weights);
  return normalised(
    distributions[0]!.map((_, index) =>
      sum(distributions.map((distribution, j) => distribution[index]!.ln().times(shares[j]!))).exp(),
    ),
  );
}

const exposures = { seldom: 0.25, sometimes: 0.5, often: 1 };

function pooledRow(people: readonly PanelContributor[], id: string, columns: number): Decimal[][] | null {
  const cells = Array.from({ length: columns }, (_, column) => {
    const given = people.flatMap((one) => {
      const row = one.likelihoods?.[id];
      const cell = cellOf(row?.given[column]);
      return cell
        ? [{ cell, weight: new Decimal(one.weight ?? 1).times(exposures[row?.exposure ?? 'often']) }]
        : [];
    });
    return given.length === 0
      ? null
      : logPool(
          given.map(({ cell }) => cell),
          given.map(({ weight }) => weight),
        );
  });
  const filled = cells.filter((cell) => cell !== null);
  if (filled.length === 0) return null;
  const neutral = logPool(
    filled,
    filled.map(() => new Decimal(1)),
  );
  return cells.map((cell) => cell ?? neutral);
}

function givenSet(row: readonly (readonly Decimal[])[], set: readonly number[], level: number): Decimal {
  const none = row.at(-1)!;
  if (none.length > 2) {
    return normalised(none.map((share, v) => product([share, ...set.map((k) => row[k]![v]!.div(share))])))[
      level
    ]!;
  }
  const leak = none[1]!;
  const causes = set.filter((k) => row[k]![1]!.gte(leak));
  const inhibitors = set.filter((k) => row[k]![1]!.lt(leak));
  const quiet = product(causes.map((k) => row[k]![0]!.div(none[0]!)));
  const present = new Decimal(1)
    .minus(none[0]!.times(quiet))
    .times(product(inhibitors.map((k) => row[k]![1]!.div(leak))));
  return level === 1 ? present : new Decimal(1).minus(present);
}

/** τ by bisection on the logarithm, to 55 digits. */
function solveTau(sums: readonly Decimal[], coexistence: number): Decimal {
  const target = new Decimal(coexistence).div(new Decimal(1).minus(coexistence));
  let [low, high] = [new Decimal('1e-20'), new Decimal('1e20')];
  for (let step = 0; step < 260; step += 1) {
    const middle = low.times(high).sqrt();
    const value = sum(sums.slice(2).map((weight, index) => weight.times(middle.pow(index + 1))));
    if (value.lt(target)) low = middle;
    else high = middle;
  }
  return low;
}

/**
 * The standing of a panel in arithmetic of 60 digits, straight from the
 * definitions. All subsets of the candidates are counted.
 */
export function decimalStanding(panel: Panel): number[] {
  const k = panel.candidates.length;
  const people = (panel.contributors ?? []).filter(({ weight }) => weight !== 0);
  const giving = people.filter(({ prior }) => prior);
  const prior =
    giving.length === 0
      ? Array.from({ length: k + 1 }, () => new Decimal(1).div(k + 1))
      : logPool(
          giving.map((one) => normalised((one.prior ?? []).map((share) => new Decimal(share)))),
          giving.map((one) => new Decimal(one.weight ?? 1)),
        );
  const rows = (panel.findings ?? []).flatMap((finding) => {
    const row = pooledRow(people, finding.id, k + 1);
    return row && typeof finding.observed === 'number' ? [{ finding, row, observed: finding.observed }] : [];
  });
  const coexistence = panel.coexistence ?? 0;
  const sets = Array.from({ length: 2 ** k }, (_, bits) =>
    [...Array(k).keys()].filter((one) => (bits >> one) & 1),
  ).filter((set) => coexistence > 0 || set.length < 2);
  const products = sets.map((set) =>
    product([
      ...set.map((one) => prior[one]!),
      ...(panel.together ?? [])
        .filter(({ a, b }) => set.includes(a) && set.includes(b))
        .map(({ times }) => new Decimal(times)),
    ]),
  );
  const ofSize = Array.from({ length: k + 1 }, (_, size) =>
    sum(products.filter((_p, i) => sets[i]!.length === size)),
  );
  const none = ofSize.slice(2).every((weight) => weight.isZero());
  const tau = none ? new Decimal(0) : solveTau(ofSize, coexistence);
  const weights = sets.map((set, index) => {
    const before = set.length === 0 ? prior[k]! : products[index]!.times(tau.pow(set.length - 1));
    const evidence = rows.map(({ finding, row, observed }) => {
      const rho = new Decimal(finding.reliability ?? 1);
      const mean = sum(row.map((cell) => cell[observed]!)).div(k + 1);
      const reported = rho.times(givenSet(row, set, observed)).plus(new Decimal(1).minus(rho).times(mean));
      const size = rows.filter((other) => finding.group && other.finding.group === finding.group).length;
      const overlap = panel.groups?.find(({ id }) => id === finding.group)?.overlap ?? 0;
      const discount = new Decimal(overlap).times(Math.max(size - 1, 0)).plus(1);
      return reported.pow(new Decimal(panel.tempering ?? 1).div(discount));
    });
    return product([before, ...evidence]);
  });
  const shares = normalised(weights);
  return [
    ...Array.from({ length: k }, (_, one) =>
      sum(shares.filter((_s, index) => sets[index]!.includes(one))).toNumber(),
    ),
    shares[0]!.toNumber(),
  ];
}
