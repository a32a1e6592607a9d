import type { Differential, Mine } from '@weighhouse/shared/contracts/differential';
import type { RowJudgement } from '@weighhouse/shared/contracts/judgements';
import type { Column } from '../model/columns';
import type { Trial, TrialRow } from './trial';

/**
 * The ledger as a trial shows it: the findings in the states that are tried, the settings, and one's own numbers. The
 * numbers of the pool are computed apart.
 */
export function tryOnLedger(
  differential: Differential,
  trial: Trial,
  columns: readonly Column[],
): Differential {
  const { settings } = differential;
  return {
    ...differential,
    findings: differential.findings.map((finding) => {
      const tried = trial.observed[finding.id];
      return tried === undefined || finding.enteredInError ? finding : { ...finding, observed: tried };
    }),
    settings: {
      ...settings,
      tempering: trial.tempering ?? settings.tempering,
      groups: settings.groups.map((group) => ({
        ...group,
        overlap: trial.overlaps[group.id] ?? group.overlap,
      })),
    },
    mine: differential.mine && tryOnMine(differential.mine, trial, columns, differential.candidateSet),
  };
}

function tryOnMine(mine: Mine, trial: Trial, columns: readonly Column[], candidateSet: number): Mine {
  const triedPrior = trialPrior(trial, columns);
  const known = new Map(mine.findings.map((row) => [row.findingId, row]));
  for (const [findingId, row] of Object.entries(trial.rows)) {
    const tried = tryOnRow(findingId, known.get(findingId), row, columns);
    if (tried) known.set(findingId, tried);
  }
  const prior =
    triedPrior === null
      ? {}
      : {
          prior: {
            candidateSet,
            version: mine.prior?.version ?? 0,
            outOf100: triedPrior,
            reason: mine.prior?.reason ?? null,
            savedAt: mine.prior?.savedAt ?? new Date(0).toISOString(),
          },
          priorInForce: true,
        };
  return { ...mine, ...prior, findings: [...known.values()] };
}

/** The tried prior in the order of the columns; null where none is tried, or where it lacks a column of today. */
export function trialPrior(trial: Trial, columns: readonly Column[]): number[] | null {
  const { prior } = trial;
  if (prior === null) return null;
  const shares = columns.map((column) => prior[column.id]);
  const whole = shares.every((share) => share !== undefined);
  const sum = shares.reduce<number>((total, share) => total + (share ?? 0), 0);
  return whole && Math.abs(sum - 100) < 0.05 ? shares : null;
}

/** A row of one's own judgement with what is tried on it; null while it has no exposure to count by. */
export function tryOnRow(
  findingId: string,
  saved: RowJudgement | undefined,
  row: TrialRow,
  columns: readonly Column[],
): RowJudgement | null {
  const exposure = row.exposure ?? saved?.exposure ?? null;
  if (exposure === null) return null;
  const outOf100 = columns.map((column) => {
    const tried = row.cells[column.id];
    return tried === undefined ? (saved?.outOf100[column.index] ?? null) : tried;
  });
  return {
    findingId,
    version: saved?.version ?? 0,
    exposure,
    outOf100,
    reason: saved?.reason ?? null,
    savedAt: saved?.savedAt ?? new Date(0).toISOString(),
  };
}
