import { describe, expect, it } from 'vitest';
import { groupFaults, pairFaults } from './settings-plan.js';

const pair = (a: string, b: string) => ({ a, b, times: 3, reason: 'one leads to the other' });
const paths = (faults: { path: string }[]): string[] => faults.map((fault) => fault.path);

describe('groupFaults', () => {
  it('takes known groups and new ones', () => {
    const groups = [
      { id: 'g', label: 'Fever', overlap: 0.5 },
      { label: 'Joints', overlap: 0 },
    ];
    expect(groupFaults(groups, new Set(['g']))).toEqual([]);
  });

  it('names groups of other cases, groups named twice and labels used twice', () => {
    const groups = [
      { id: 'x', label: 'Fever', overlap: 0.5 },
      { id: 'g', label: 'fever', overlap: 0.5 },
      { id: 'g', label: 'Joints', overlap: 0.5 },
    ];
    expect(paths(groupFaults(groups, new Set(['g'])))).toEqual([
      'groups[0].id',
      'groups[1].label',
      'groups[2].id',
    ]);
  });
});

describe('pairFaults', () => {
  const inForce = new Set(['a', 'b', 'c']);

  it('takes each pair once', () => {
    expect(pairFaults([pair('a', 'b'), pair('b', 'c')], inForce)).toEqual([]);
  });

  it('names strangers, a candidate with itself, and a pair turned round', () => {
    expect(
      paths(pairFaults([pair('a', 'x'), pair('b', 'b'), pair('a', 'c'), pair('c', 'a')], inForce)),
    ).toEqual(['together[0].b', 'together[1]', 'together[3]']);
  });
});
