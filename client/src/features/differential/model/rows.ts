import type { Finding, FindingKind } from '@weighhouse/shared/contracts/findings';

export interface RowGroup {
  title: string;
  kind: 'observed' | 'pending' | 'error';
  rows: Finding[];
}

const sections: { title: string; kinds: readonly FindingKind[] }[] = [
  { title: 'Reported and examined', kinds: ['history', 'symptom', 'sign'] },
  { title: 'Laboratory', kinds: ['laboratory'] },
  { title: 'Imaging and tests', kinds: ['imaging', 'test'] },
];

/**
 * The ledger's rows in their groups: what is known by where it comes from, then what is not known yet, then what was
 * entered in error. Inside a group the order of the findings stays; empty groups are left out.
 */
export function rowGroups(findings: readonly Finding[]): RowGroup[] {
  const inForce = findings.filter((finding) => !finding.enteredInError);
  const observed = inForce.filter((finding) => finding.observed !== null);
  const groups: RowGroup[] = sections.map(({ title, kinds }) => ({
    title,
    kind: 'observed',
    rows: observed.filter((finding) => kinds.includes(finding.kind)),
  }));
  groups.push(
    { title: 'Not known yet', kind: 'pending', rows: inForce.filter((finding) => finding.observed === null) },
    { title: 'Entered in error', kind: 'error', rows: findings.filter((finding) => finding.enteredInError) },
  );
  return groups.filter((group) => group.rows.length > 0);
}

/** The rows in the order in which the ledger shows them. */
export function rowsInOrder(findings: readonly Finding[]): Finding[] {
  return rowGroups(findings).flatMap((group) => group.rows);
}
