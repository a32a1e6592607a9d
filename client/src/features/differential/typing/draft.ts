import type {
  Exposure,
  JudgementDraft,
  JudgementDraftInput,
  RowJudgement,
} from '@weighhouse/shared/contracts/judgements';
import { type Column, noneId } from '../model/columns';
import { numberText } from './parse-number';

/**
 * What a person typed for one row or for the prior, as typed. Cells go by the column's id, so that they stay with
 * their candidate when the candidate set changes meanwhile.
 */
export interface Draft {
  candidateSet: number;
  exposure: Exposure | null;
  /** For each column one text (how many would show it, or the share), or one for each level. */
  cells: ReadonlyMap<string, readonly string[]>;
  reason: string;
  /** The saved version that the typing began from; 0 where nothing was saved. */
  base: number;
}

export function emptyDraft(candidateSet: number, base = 0): Draft {
  return { candidateSet, exposure: null, cells: new Map(), reason: '', base };
}

/** The texts of one column, always as many as are asked for. */
export function textsOf(draft: Draft, columnId: string, count: number): string[] {
  const given = draft.cells.get(columnId) ?? [];
  return Array.from({ length: count }, (_, index) => given[index] ?? '');
}

export function withText(draft: Draft, columnId: string, index: number, count: number, text: string): Draft {
  const texts = textsOf(draft, columnId, count);
  texts[index] = text;
  return { ...draft, cells: new Map(draft.cells).set(columnId, texts) };
}

/** A saved row as texts, to go on from. */
export function draftOfRow(row: RowJudgement, columns: readonly Column[], candidateSet: number): Draft {
  const cells = new Map<string, readonly string[]>();
  for (const column of columns) {
    const given = row.outOf100[column.index] ?? [];
    cells.set(column.id, (typeof given === 'number' ? [given] : given).map(numberText));
  }
  return { candidateSet, exposure: row.exposure, cells, reason: row.reason ?? '', base: row.version };
}

/** The draft as the server keeps it: by the order of the columns in force. */
export function wireDraft(target: string, draft: Draft, columns: readonly Column[]): JudgementDraftInput {
  return {
    target,
    candidateSet: draft.candidateSet,
    exposure: draft.exposure,
    typed: columns.map((column) => [...(draft.cells.get(column.id) ?? [])].map((text) => text.slice(0, 12))),
    reason: draft.reason.slice(0, 4000),
  };
}

/**
 * A draft as the server kept it. One that was typed under another candidate set has lost which column is which, so
 * only its exposure, its reason and the last column (none of these) can be taken over.
 */
export function draftFromWire(
  kept: JudgementDraft,
  columns: readonly Column[],
  candidateSet: number,
  base: number,
): Draft {
  const same = kept.candidateSet === candidateSet && kept.typed.length === columns.length;
  const cells = same
    ? columns.map((column) => [column.id, kept.typed[column.index] ?? []] as const)
    : [[noneId, kept.typed.at(-1) ?? []] as const];
  return { candidateSet, exposure: kept.exposure, cells: new Map(cells), reason: kept.reason, base };
}

/** Whether two drafts say the same; blanks and missing columns are the same. */
export function sameDraft(one: Draft, other: Draft, columns: readonly Column[]): boolean {
  const cellsOf = (draft: Draft) =>
    columns.map((column) =>
      (draft.cells.get(column.id) ?? [])
        .map((text) => text.trim())
        .join('|')
        .replace(/\|+$/, ''),
    );
  const texts = [cellsOf(one), cellsOf(other)];
  return (
    one.exposure === other.exposure &&
    one.reason.trim() === other.reason.trim() &&
    columns.every((_, index) => texts[0]?.[index] === texts[1]?.[index])
  );
}
