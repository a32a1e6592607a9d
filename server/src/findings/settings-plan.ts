import type { ChangeSettings } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';

type Groups = NonNullable<ChangeSettings['groups']>;
type Pairs = NonNullable<ChangeSettings['together']>;

/** Every fault of a list of groups. @param known the ids of the groups that the case has */
export function groupFaults(groups: Groups, known: ReadonlySet<string>): FieldFault[] {
  return groups.flatMap((group, index) => {
    const path = `groups[${String(index)}]`;
    const earlier = groups.slice(0, index);
    const faults: FieldFault[] = [];
    if (group.id !== undefined && !known.has(group.id)) {
      faults.push({ path: `${path}.id`, message: 'is no group of this case' });
    }
    if (group.id !== undefined && earlier.some((other) => other.id === group.id)) {
      faults.push({ path: `${path}.id`, message: 'is named twice' });
    }
    if (earlier.some((other) => other.label.toLowerCase() === group.label.toLowerCase())) {
      faults.push({ path: `${path}.label`, message: 'must differ from the other groups' });
    }
    return faults;
  });
}

/** Every fault of a list of pairs. @param inForce the ids of the candidates in force */
export function pairFaults(pairs: Pairs, inForce: ReadonlySet<string>): FieldFault[] {
  return pairs.flatMap((pair, index) => {
    const path = `together[${String(index)}]`;
    const faults: FieldFault[] = [];
    for (const end of ['a', 'b'] as const) {
      if (!inForce.has(pair[end])) {
        faults.push({ path: `${path}.${end}`, message: 'is no candidate of the set in force' });
      }
    }
    if (pair.a === pair.b) faults.push({ path, message: 'must be two different candidates' });
    if (pairs.slice(0, index).some((other) => samePair(other, pair))) {
      faults.push({ path, message: 'is named twice' });
    }
    return faults;
  });
}

const samePair = (one: Pairs[number], other: Pairs[number]): boolean =>
  (one.a === other.a && one.b === other.b) || (one.a === other.b && one.b === other.a);
