import { exposureSchema } from '@weighhouse/shared/contracts/judgements';
import { z } from 'zod';

const cell = z.union([z.number(), z.array(z.number())]).nullable();
const row = z.object({
  /** Null: as it is saved. */
  exposure: exposureSchema.nullable(),
  /** Out of 100, by the column's id, so that a cell stays with its candidate; null takes the number out. */
  cells: z.record(z.string(), cell),
});

/**
 * What one person tries on the panel, for themselves alone: only what differs from it. So a trial stays as it is when
 * the panel under it moves, and what others change meanwhile counts in it.
 */
export const trialSchema = z.object({
  /** The whole of one's own prior, out of 100, by the column's id. */
  prior: z.record(z.string(), z.number()).nullable(),
  rows: z.record(z.string(), row),
  /** The state of a finding by its id: a level, or null for not known. */
  observed: z.record(z.string(), z.int().nullable()),
  /** The overlap of a group by its id, 0 to 1. */
  overlaps: z.record(z.string(), z.number()),
  tempering: z.number().nullable(),
  coexistence: z.number().nullable(),
});
export type Trial = z.infer<typeof trialSchema>;
export type TrialRow = z.infer<typeof row>;
export type TrialCell = z.infer<typeof cell>;

export const noTrial: Trial = {
  prior: null,
  rows: {},
  observed: {},
  overlaps: {},
  tempering: null,
  coexistence: null,
};

const emptyRow: TrialRow = { exposure: null, cells: {} };

export const isEmptyRow = ({ exposure, cells }: TrialRow) =>
  exposure === null && Object.keys(cells).length === 0;

/** Whether nothing is tried. */
export function isEmptyTrial(trial: Trial): boolean {
  return (
    trial.prior === null &&
    Object.keys(trial.rows).length === 0 &&
    Object.keys(trial.observed).length === 0 &&
    Object.keys(trial.overlaps).length === 0 &&
    trial.tempering === null &&
    trial.coexistence === null
  );
}

/** Whether something of it is one's own judgement, which can be kept. */
export const hasOwn = (trial: Trial) => trial.prior !== null || Object.keys(trial.rows).length > 0;

/** What stays when one's own judgements are saved: everything else. */
export const withoutOwn = (trial: Trial): Trial => ({ ...trial, prior: null, rows: {} });

function withoutKey<T>(record: Record<string, T>, key: string): Record<string, T> {
  return Object.fromEntries(Object.entries(record).filter(([known]) => known !== key));
}

/** Tries a row's cells or exposure; `undefined` for a cell goes back to what the panel holds. */
export function withCell(
  trial: Trial,
  findingId: string,
  columnId: string,
  value: TrialCell | undefined,
): Trial {
  const known = trial.rows[findingId] ?? emptyRow;
  const cells =
    value === undefined ? withoutKey(known.cells, columnId) : { ...known.cells, [columnId]: value };
  return withRow(trial, findingId, { ...known, cells });
}

export function withExposure(trial: Trial, findingId: string, exposure: TrialRow['exposure']): Trial {
  return withRow(trial, findingId, { ...(trial.rows[findingId] ?? emptyRow), exposure });
}

/** A row of which nothing differs any more is not in the trial. */
export function withRow(trial: Trial, findingId: string, row: TrialRow | null): Trial {
  const rows = withoutKey(trial.rows, findingId);
  return { ...trial, rows: row === null || isEmptyRow(row) ? rows : { ...rows, [findingId]: row } };
}

/** Tries another state of a finding; `undefined` goes back to the one that is known. */
export function withObserved(trial: Trial, findingId: string, observed: number | null | undefined): Trial {
  const others = withoutKey(trial.observed, findingId);
  return { ...trial, observed: observed === undefined ? others : { ...others, [findingId]: observed } };
}

export function withOverlap(trial: Trial, groupId: string, overlap: number | undefined): Trial {
  const others = withoutKey(trial.overlaps, groupId);
  return { ...trial, overlaps: overlap === undefined ? others : { ...others, [groupId]: overlap } };
}
