import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { type Column, columnLabel } from '../model/columns';
import { levelName } from '../model/finding-words';
import { numberText } from '../typing/parse-number';
import {
  isEmptyTrial,
  type Trial,
  type TrialCell,
  withCell,
  withExposure,
  withObserved,
  withOverlap,
} from './trial';

/** One thing that is tried, in words, and the trial without it. */
export interface TrialChange {
  key: string;
  sentence: string;
  /** One's own judgement, which can be kept. */
  own: boolean;
  undone: Trial;
}

const share = (fraction: number) => numberText(fraction * 100);

/** Everything that is tried, against what is saved. What is gone from the case meanwhile is left out. */
export function trialChanges(trial: Trial, saved: Differential, columns: readonly Column[]): TrialChange[] {
  const changes: TrialChange[] = [];
  if (trial.prior)
    changes.push({
      key: 'prior',
      sentence: `Your prior: ${columns.map((column) => `${columnLabel(column)} ${cellWords(trial.prior?.[column.id] ?? null)}`).join(', ')}`,
      own: true,
      undone: { ...trial, prior: null },
    });
  for (const finding of saved.findings) changes.push(...ofFinding(trial, finding, saved, columns));
  for (const group of saved.settings.groups) {
    const tried = trial.overlaps[group.id];
    if (tried !== undefined)
      changes.push({
        key: `overlap ${group.id}`,
        sentence: `Overlap of “${group.label}”: ${share(tried)} instead of ${share(group.overlap)} of 100`,
        own: false,
        undone: withOverlap(trial, group.id, undefined),
      });
  }
  if (trial.tempering !== null)
    changes.push({
      key: 'tempering',
      sentence: `Every finding counts at ${share(trial.tempering)} instead of ${share(saved.settings.tempering)} of 100 of its strength`,
      own: false,
      undone: { ...trial, tempering: null },
    });
  if (trial.coexistence !== null)
    changes.push({
      key: 'coexistence',
      sentence: `Two or more at once: ${share(trial.coexistence)} instead of ${share(saved.settings.coexistence)} of 100`,
      own: false,
      undone: { ...trial, coexistence: null },
    });
  return changes;
}

function ofFinding(
  trial: Trial,
  finding: Finding,
  saved: Differential,
  columns: readonly Column[],
): TrialChange[] {
  const changes: TrialChange[] = [];
  const observed = trial.observed[finding.id];
  if (observed !== undefined)
    changes.push({
      key: `observed ${finding.id}`,
      sentence: `${finding.title}: ${stateOf(finding, observed)} instead of ${stateOf(finding, finding.observed)}`,
      own: false,
      undone: withObserved(trial, finding.id, undefined),
    });
  const row = trial.rows[finding.id];
  if (!row) return changes;
  const known = saved.mine?.findings.find(({ findingId }) => findingId === finding.id);
  for (const column of columns) {
    const cell = row.cells[column.id];
    if (cell === undefined) continue;
    changes.push({
      key: `cell ${finding.id} ${column.id}`,
      sentence: `${finding.title}, ${columnLabel(column)}: you ${cellWords(cell)} instead of ${cellWords(known?.outOf100[column.index] ?? null)}`,
      own: true,
      undone: withCell(trial, finding.id, column.id, undefined),
    });
  }
  if (row.exposure !== null)
    changes.push({
      key: `exposure ${finding.id}`,
      sentence: `${finding.title}: you see it ${row.exposure}${known ? ` instead of ${known.exposure}` : ''}`,
      own: true,
      undone: withExposure(trial, finding.id, null),
    });
  return changes;
}

const stateOf = (finding: Finding, level: number | null) =>
  level === null ? 'not known' : levelName(finding, level);

function cellWords(cell: TrialCell): string {
  if (cell === null) return 'blank';
  return typeof cell === 'number' ? numberText(cell) : cell.map(numberText).join(' / ');
}

/** What is tried on one finding, for the line under its title; null where nothing is. */
export function triedOnRow(trial: Trial, finding: Finding): string | null {
  if (isEmptyTrial(trial)) return null;
  if (trial.observed[finding.id] !== undefined) return `Trial: ${stateOf(finding, finding.observed)}.`;
  return trial.rows[finding.id] ? 'Trial: your numbers.' : null;
}

const untried: readonly string[] = [];

/** The columns of a row in which one's own number is tried. */
export function triedColumns(trial: Trial, findingId: string): readonly string[] {
  const row = trial.rows[findingId];
  return row ? Object.keys(row.cells) : untried;
}
