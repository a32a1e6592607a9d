import type { Candidate } from '@weighhouse/shared/contracts/findings';

/** A column of the ledger: a candidate of the set in force, or *none of these*, which is always the last. */
export interface Column {
  index: number;
  /** The candidate's id; `none` for none of these. */
  id: string;
  /** A to Z, then AA, AB, …; a dash for none of these. */
  letter: string;
  name: string;
  /** The name without what stands in brackets at its end, for narrow places. */
  short: string;
  mustNotMiss: boolean;
  none: boolean;
}

export const noneId = 'none';

/** The columns in the order of the candidate set in force; retired candidates have none. */
export function columnsOf(candidates: readonly Candidate[]): Column[] {
  const inForce = candidates.filter((candidate) => !candidate.retired);
  const columns = inForce.map((candidate, index) => ({
    index,
    id: candidate.id,
    letter: columnLetter(index),
    name: candidate.name,
    short: withoutBrackets(candidate.name),
    mustNotMiss: candidate.mustNotMiss,
    none: false,
  }));
  const none = { id: noneId, letter: '—', name: 'None of these', short: 'None of these' };
  return [...columns, { index: columns.length, ...none, mustNotMiss: false, none: true }];
}

export function columnLetter(index: number): string {
  const last = String.fromCharCode(65 + (index % 26));
  return index < 26 ? last : columnLetter(Math.floor(index / 26) - 1) + last;
}

function withoutBrackets(name: string): string {
  const short = name.replace(/\s*\([^()]*\)\s*$/, '');
  return short === '' ? name : short;
}

/** "A Lymphoma", and "None of these" without a letter. */
export function columnLabel(column: Column): string {
  return column.none ? column.name : `${column.letter} ${column.short}`;
}
