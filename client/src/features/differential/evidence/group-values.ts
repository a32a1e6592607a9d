import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { ChangeSettings, Settings } from '@weighhouse/shared/contracts/cases';

export type GroupInput = NonNullable<ChangeSettings['groups']>[number];

/** A group of findings that overlap, as its form holds it. */
export interface GroupValues {
  id?: string;
  label: string;
  /** Out of 100, as typed. */
  overlap: string;
  reason: string;
}

export const newGroup: GroupValues = { label: '', overlap: '', reason: '' };

export const valuesOfGroups = (groups: Settings['groups']): GroupValues[] =>
  groups.map(({ id, label, overlap, reason }) => ({
    id,
    label,
    overlap: String(Math.round(overlap * 100)),
    reason: reason ?? '',
  }));

/** Reads the form; every fault is named. */
export function groupsInput(
  values: readonly GroupValues[],
  reason: string,
): { groups: GroupInput[]; faults: FieldFault[] } {
  const faults: FieldFault[] = [];
  const groups = values.map((group, index): GroupInput => {
    const path = `groups.${String(index)}`;
    const overlap = group.overlap.trim();
    if (group.label.trim() === '') faults.push({ path: `${path}.label`, message: 'needs a name' });
    if (!/^\d{1,3}$/.test(overlap) || Number(overlap) > 100)
      faults.push({ path: `${path}.overlap`, message: 'the overlap must be a whole number from 0 to 100' });
    const why = group.reason.trim();
    return {
      ...(group.id === undefined ? {} : { id: group.id }),
      label: group.label.trim(),
      overlap: Number(overlap) / 100,
      ...(why === '' ? {} : { reason: why }),
    };
  });
  if (reason.trim() === '') faults.push({ path: 'reason', message: 'say why the groups are changed' });
  return { groups, faults };
}
