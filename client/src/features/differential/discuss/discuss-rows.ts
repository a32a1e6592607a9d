import type { AgendaItem, Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { voiceName } from '../model/people';

/** Who is furthest apart in a row, on which column. */
export interface Apart {
  column: number;
  low: { name: string; p: number };
  high: { name: string; p: number };
}

/** A row that may be worth the panel's time. */
export interface DiscussRow {
  finding: Finding;
  /** How far one person's numbers in place of the pooled ones move the leader, 0 to 1; null while nothing is shown. */
  swing: number | null;
  apart: Apart | null;
  item: AgendaItem | null;
}

/**
 * What to discuss first: what the chair put on the agenda, then the other rows by how much depends on whose numbers
 * are taken. Rows on which nobody is apart are left out.
 */
export function discussRows(differential: Differential): { agenda: DiscussRow[]; others: DiscussRow[] } {
  const byId = new Map(differential.findings.map((finding) => [finding.id, finding]));
  const agenda = differential.agenda.flatMap((item) => {
    const finding = byId.get(item.findingId);
    return finding ? [rowOf(differential, finding, item)] : [];
  });
  const listed = new Set(agenda.map(({ finding }) => finding.id));
  const others = differential.findings
    .filter((finding) => !listed.has(finding.id) && finding.enteredInError === null)
    .map((finding) => rowOf(differential, finding, null))
    .filter(({ swing, apart }) => (swing ?? 0) > 0 || apart !== null)
    .toSorted((one, other) => (other.swing ?? 0) - (one.swing ?? 0));
  return { agenda, others };
}

function rowOf(differential: Differential, finding: Finding, item: AgendaItem | null): DiscussRow {
  const row = differential.assessment?.rows[finding.id];
  const apart = row?.apart ?? null;
  const named = ({ contributor, p }: { contributor: string; p: number }) => ({
    name: voiceName(differential, contributor),
    p,
  });
  return {
    finding,
    swing: row?.swing ?? null,
    apart: apart && { column: apart.column, low: named(apart.low), high: named(apart.high) },
    item,
  };
}
