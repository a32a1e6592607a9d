import type { PanelView } from '@weighhouse/shared/contracts/differential';
import type { Column } from '../model/columns';
import { trialPrior } from './apply-to-ledger';
import type { Trial, TrialCell, TrialRow } from './trial';

type Contributor = PanelView['contributors'][number];
type Likelihoods = Contributor['likelihoods'];

/** Whose numbers a trial changes. */
export interface OwnVoice {
  /** The key of one's own entries in the panel. */
  key: string;
  /** What one weighs, where the panel does not hold one yet. */
  weight: number;
}

/**
 * The panel with a trial applied; everything else stays as it is, the assumption too, which the reading decides. What
 * no longer fits (a finding, a group or a column that is gone, cells over other levels) is left out, not refused.
 */
export function tryOnPanel(
  panel: PanelView,
  trial: Trial,
  columns: readonly Column[],
  own: OwnVoice | null,
): PanelView {
  return {
    ...panel,
    tempering: trial.tempering ?? panel.tempering,
    groups: panel.groups.map((group) => ({ ...group, overlap: trial.overlaps[group.id] ?? group.overlap })),
    findings: panel.findings.map((finding) => {
      const tried = trial.observed[finding.id];
      return tried === undefined || (tried !== null && tried >= finding.levels)
        ? finding
        : { ...finding, observed: tried };
    }),
    contributors: own ? tryOnContributors(panel, trial, columns, own) : panel.contributors,
  };
}

function tryOnContributors(
  panel: PanelView,
  trial: Trial,
  columns: readonly Column[],
  own: OwnVoice,
): Contributor[] {
  const known = panel.contributors.find((one) => one.id === own.key);
  const before = known ?? { id: own.key, weight: own.weight, prior: null, likelihoods: {} };
  const prior = trialPrior(trial, columns)?.map((share) => share / 100) ?? before.prior;
  const likelihoods = tryOnRows(before.likelihoods, panel, trial, columns);
  const tried = { ...before, prior, likelihoods };
  if (known) return panel.contributors.map((one) => (one === known ? tried : one));
  const says = prior !== null || Object.keys(likelihoods).length > 0;
  return says ? [...panel.contributors, tried] : panel.contributors;
}

function tryOnRows(
  saved: Likelihoods,
  panel: PanelView,
  trial: Trial,
  columns: readonly Column[],
): Likelihoods {
  const rows = new Map(Object.entries(saved));
  for (const { id, levels } of panel.findings) {
    const row = trial.rows[id];
    if (!row) continue;
    const exposure = row.exposure ?? rows.get(id)?.exposure;
    if (exposure === undefined) continue;
    const given = givenOf(rows.get(id)?.given, row, columns, levels);
    if (given.every((cell) => cell === null)) rows.delete(id);
    else rows.set(id, { exposure, given });
  }
  return Object.fromEntries(rows);
}

function givenOf(
  saved: Likelihoods[string]['given'] | undefined,
  row: TrialRow,
  columns: readonly Column[],
  levels: number,
): Likelihoods[string]['given'] {
  return columns.map((column) => {
    const tried = row.cells[column.id];
    return tried === undefined || !fits(tried, levels) ? (saved?.[column.index] ?? null) : fractions(tried);
  });
}

const fits = (cell: TrialCell, levels: number) =>
  cell === null || (typeof cell === 'number' ? levels === 2 : cell.length === levels);

const fractions = (cell: TrialCell) =>
  cell === null || typeof cell === 'number'
    ? cell === null
      ? null
      : cell / 100
    : cell.map((share) => share / 100);
