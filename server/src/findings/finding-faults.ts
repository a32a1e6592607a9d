import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { NewFinding } from '@weighhouse/shared/contracts/findings';

/** What a finding refers to on its case. */
export interface Surroundings {
  groupIds: ReadonlySet<string>;
  /** Whether the report that it names is there and of this case. */
  reportIsThere: boolean;
}

type Asked = Partial<Pick<NewFinding, 'levelLabels' | 'groupId' | 'source'>>;

/**
 * Every fault that the schema cannot see.
 * @param labels the names of the levels as they will be
 * @param observed the index of the observed level as it will be, or null while pending
 */
export function findingFaults(
  asked: Asked,
  labels: readonly string[],
  observed: number | null,
  around: Surroundings,
): FieldFault[] {
  const faults: FieldFault[] = [];
  if (observed !== null && observed >= labels.length) {
    const most = String(labels.length - 1);
    faults.push({ path: 'observed', message: `must be the index of one of the levels, 0 to ${most}` });
  }
  for (const [index, label] of (asked.levelLabels ?? []).entries()) {
    const same = (other: string): boolean => other.toLowerCase() === label.toLowerCase();
    if (asked.levelLabels?.slice(0, index).some(same) === true) {
      faults.push({ path: `levelLabels[${String(index)}]`, message: 'must differ from the other levels' });
    }
  }
  if (asked.groupId != null && !around.groupIds.has(asked.groupId)) {
    faults.push({ path: 'groupId', message: 'is no group of this case' });
  }
  return [...faults, ...sourceFaults(asked.source, around)];
}

function sourceFaults(source: Asked['source'], around: Surroundings): FieldFault[] {
  if (source == null) return [];
  const { reportId = null, page = null, text = null } = source;
  if (reportId !== null && !around.reportIsThere) {
    return [{ path: 'source.reportId', message: 'is no report of this case' }];
  }
  if (page !== null && reportId === null && (text ?? '') === '') {
    return [
      {
        path: 'source.page',
        message: 'must be a page of something: name a report, or say where it is written',
      },
    ];
  }
  return [];
}
