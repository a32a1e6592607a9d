import { describe, expect, it } from 'vitest';
import { levelsGivenSet } from '../oracle/level-given-set.js';
import { distribution } from '../testing/arbitrary-panel.js';
import { expectClose } from '../testing/expect-close.js';
import { holds } from '../testing/laws-hold.js';
import { membersOf } from './explains.js';
import { writeRow } from './row-kernels.js';
import { rowSpace, rowTable } from './row-table.js';
import { type SetTable, setTable } from './set-table.js';
import fc from 'fast-check';

function finding(levels: number) {
  return {
    id: 'f',
    levels,
    observed: 1,
    reliability: 1,
    group: -1,
    cost: 0,
    waitDays: 0,
    burden: 0,
    start: 0,
  };
}

/** P(level | set) for every set of the table, with its members. */
function likelihoods(
  table: SetTable,
  row: number[][],
  level: number,
): { members: number[]; p: number; least: number }[] {
  const levels = row[0]!.length;
  const tables = rowTable(rowSpace(table), Float64Array.from(row.flat()), finding(levels), row.length, level);
  const values = new Float64Array(table.size);
  writeRow(values, table, tables);
  const sets: { members: number[]; p: number; least: number }[] = [];
  table.high.members.forEach((high, h) => {
    for (let p = table.starts[h]!; p < table.starts[h + 1]!; p += 1) {
      const low = table.low.members[table.lows[p]!]!;
      const members = [...membersOf(low, table.low.from), ...membersOf(high, table.high.from)];
      sets.push({ members, p: values[p]!, least: tables.least });
    }
  });
  return sets;
}

const present = (shares: number[]) => shares.map((share) => [1 - share, share]);
const at = (sets: { members: number[]; p: number }[], ...members: number[]) =>
  sets.find((set) => set.members.join() === members.join())!.p;

describe('leaky noisy-OR', () => {
  it('has the table of fever by cold, flu and malaria (Russell & Norvig, AIMA; leak 0)', () => {
    const sets = likelihoods(setTable(3), present([0.4, 0.8, 0.9, 0]), 1);
    expectClose(
      [
        at(sets),
        at(sets, 2),
        at(sets, 1),
        at(sets, 1, 2),
        at(sets, 0),
        at(sets, 0, 2),
        at(sets, 0, 1),
        at(sets, 0, 1, 2),
      ],
      [0, 0.9, 0.8, 0.98, 0.4, 0.94, 0.88, 0.988],
      1e-15,
    );
  });

  it('takes the leak in (Henrion 1987/1989; parameters of the NoisyOrDist example, Norsys)', () => {
    const sets = likelihoods(setTable(2), present([0.28, 0.46, 0.1]), 1);
    expectClose([at(sets), at(sets, 0), at(sets, 1), at(sets, 0, 1)], [0.1, 0.28, 0.46, 0.568], 1e-15);
  });

  it('converts what was elicited, leak included, to the link (Díez 1993): 0.3 with leak 0.1 is 2/9', () => {
    const sets = likelihoods(setTable(2), present([0.3, 0.1, 0.1]), 0);
    expectClose(1 - at(sets, 0) / at(sets), 2 / 9, 1e-15);
  });

  it('has a test of one condition as a child (own computation): sensitivity 0.9, specificity 0.8 are leak 0.2, link 7/8', () => {
    const sets = likelihoods(setTable(2), present([0.9, 0.2, 0.2]), 0);
    expectClose([at(sets), 1 - at(sets, 0) / at(sets)], [0.8, 7 / 8], 1e-15);
  });

  it('gives the sprinkler’s answers with that network’s prior (K. Murphy 1998: 0.6471, 0.4298, 0.7079, 0.1945; from memory)', () => {
    const wet = likelihoods(setTable(2), present([0.9, 0.9, 0]), 1);
    const [sprinkler, rain] = [
      [0.5, 0.1],
      [0.2, 0.8],
    ];
    const prior = (s: number, r: number) =>
      [0, 1].reduce((sum, cloudy) => {
        const [on, raining] = [sprinkler[cloudy]!, rain[cloudy]!];
        return sum + 0.5 * (s ? on : 1 - on) * (r ? raining : 1 - raining);
      }, 0);
    const [onlySprinkler, onlyRain, both] = [
      prior(1, 0) * at(wet, 0),
      prior(0, 1) * at(wet, 1),
      prior(1, 1) * at(wet, 0, 1),
    ];
    const total = onlySprinkler + onlyRain + both;
    expectClose(
      [total, (onlySprinkler + both) / total, (onlyRain + both) / total, both / (onlyRain + both)],
      [0.6471, 2781 / 6471, 4581 / 6471, 891 / 4581],
      1e-15,
    );
  });

  it('never makes a finding less likely for a cause', () => {
    const row = fc.array(
      fc.integer({ min: 1, max: 999 }).map((share) => share / 1000),
      { minLength: 5, maxLength: 5 },
    );
    holds(row, (shares) => {
      const sets = likelihoods(setTable(4), present(shares), 1);
      for (const { members, p } of sets) {
        for (const cause of [0, 1, 2, 3].filter((k) => shares[k]! >= shares[4]! && !members.includes(k))) {
          const more = [...members, cause].sort((one, other) => one - other);
          expect(at(sets, ...more)).toBeGreaterThanOrEqual(p - 1e-15);
        }
      }
    });
  });
});

describe('the tables of a row', () => {
  const rows = fc.integer({ min: 2, max: 6 }).chain((levels) =>
    fc.record({
      row: fc.array(distribution(levels, 1), { minLength: 2, maxLength: 6 }),
      level: fc.nat(levels - 1),
    }),
  );

  it('give each set what the definition says, and never less than their bound', () => {
    holds(rows, ({ row, level }) => {
      for (const { members, p, least } of likelihoods(setTable(row.length - 1), row, level)) {
        expectClose(p, levelsGivenSet(row, members)[level], 1e-13);
        expect(p).toBeGreaterThanOrEqual(least * (1 - 1e-12));
      }
    });
  });

  it('keep their digits where 1 - x would lose them: sixteen strong causes, the finding absent', () => {
    const [largest] = likelihoods(setTable(16), present([...Array<number>(16).fill(0.999), 0.001]), 0).slice(
      -1,
    );
    expect(largest!.members).toHaveLength(16);
    expect(largest!.p / (0.999 * (0.001 / 0.999) ** 16)).toBeCloseTo(1, 12);
  });
});
