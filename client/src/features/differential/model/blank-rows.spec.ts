import { expect, it } from 'vitest';
import { makeFinding, makeMine, makeRow } from '../testing/make-differential';
import { blanksOf } from './blank-rows';

const findings = ['a', 'b', 'c', 'd'].map((id) => makeFinding({ id }));

it('tells blank rows from partly blank ones and leaves out what was entered in error', () => {
  const struck = makeFinding({
    id: 'e',
    enteredInError: { words: 'x', by: 'y', at: '2026-12-01T09:00:00.000Z' },
  });
  const mine = makeMine({
    findings: [
      makeRow('a', [10, 20]),
      makeRow('b', [10, null]),
      makeRow('c', [null, null]),
      makeRow('e', [1, 1]),
    ],
  });
  const blanks = blanksOf(mine, [...findings, struck]);
  expect(blanks.rows.map((row) => row.id)).toEqual(['c', 'd']);
  expect(blanks.partly.map((row) => row.id)).toEqual(['b']);
  expect(blanks).toMatchObject({ judged: 2, total: 4, underHalf: false });
});

it('is under half below two of four, and not at two of four', () => {
  expect(blanksOf(makeMine({ findings: [makeRow('a', [10, 20])] }), findings).underHalf).toBe(true);
  expect(blanksOf(makeMine(), []).underHalf).toBe(false);
});

it('misses the prior where none was given or the candidate set has changed since', () => {
  const prior = {
    candidateSet: 1,
    version: 1,
    outOf100: [20, 80],
    reason: null,
    savedAt: '2026-12-01T09:00:00.000Z',
  };
  expect(blanksOf(makeMine(), findings).priorMissing).toBe(true);
  expect(blanksOf(makeMine({ prior, priorInForce: false }), findings).priorMissing).toBe(true);
  expect(blanksOf(makeMine({ prior, priorInForce: true }), findings).priorMissing).toBe(false);
});
