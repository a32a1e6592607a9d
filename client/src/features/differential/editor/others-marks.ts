import type { Differential } from '@weighhouse/shared/contracts/differential';

/**
 * The others' numbers on one cell, out of 100, where they may be seen: how many would show the finding. While a round
 * is sealed there are none, not even those of an earlier round, so that nobody is swayed.
 */
export function othersMarks(differential: Differential, findingId: string, column: number): number[] {
  if (differential.sealed) return [];
  return (differential.others ?? []).flatMap((other) => {
    const given = other.findings.find((row) => row.findingId === findingId)?.outOf100[column] ?? null;
    if (given === null) return [];
    const shown = typeof given === 'number' ? given : given.length === 2 ? given[1] : undefined;
    return shown === undefined ? [] : [shown];
  });
}
