import { type ChangeFinding, reliabilityShare } from '@weighhouse/shared/contracts/findings';
import type { FindingRow } from './finding.entity.js';

type Asked = Omit<ChangeFinding, 'version' | 'levelLabels'>;

/** The columns that an input sets; what it leaves out stays as it is. A source is replaced as a whole. */
export function findingColumns(asked: Asked): Partial<FindingRow> {
  const columns: Partial<FindingRow> = {};
  if (asked.title !== undefined) columns.title = asked.title;
  if (asked.detail !== undefined) columns.detail = asked.detail;
  if (asked.kind !== undefined) columns.kind = asked.kind;
  if (asked.observed !== undefined) columns.observed = asked.observed;
  if (asked.reliability !== undefined) columns.reliability = reliabilityShare(asked.reliability);
  if (asked.groupId !== undefined) columns.groupId = asked.groupId;
  if (asked.observedOn !== undefined) columns.observedOn = asked.observedOn;
  if (asked.cost !== undefined) columns.cost = asked.cost;
  if (asked.waitDays !== undefined) columns.waitDays = asked.waitDays;
  if (asked.burden !== undefined) columns.burden = asked.burden;
  if (asked.source !== undefined) {
    const text = asked.source?.text ?? '';
    columns.sourceReportId = asked.source?.reportId ?? null;
    columns.sourceText = text === '' ? null : text;
    columns.sourcePage = asked.source?.page ?? null;
  }
  return columns;
}
