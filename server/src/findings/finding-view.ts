import type { Finding } from '@weighhouse/shared/contracts/findings';
import type { FindingLevel } from './finding-level.entity.js';
import type { FindingRow } from './finding.entity.js';

/**
 * A finding as the contract has it.
 * @param levels in order
 * @param nameOf a person's name by id
 * @param files names of reports by id
 */
export function findingView(
  row: FindingRow,
  levels: readonly FindingLevel[],
  nameOf: (personId: string) => string,
  files: ReadonlyMap<string, string>,
): Finding {
  return {
    id: row.id,
    version: row.version,
    title: row.title,
    detail: row.detail,
    kind: row.kind,
    levelLabels: levels.map((level) => level.label),
    observed: row.observed,
    reliability: row.reliability,
    groupId: row.groupId,
    observedOn: row.observedOn,
    cost: row.cost,
    waitDays: row.waitDays,
    burden: row.burden,
    source: sourceOf(row, files),
    enteredInError: errorOf(row, nameOf),
    addedBy: nameOf(row.addedById),
    addedAt: row.addedAt.toISOString(),
  };
}

function sourceOf(row: FindingRow, files: ReadonlyMap<string, string>): Finding['source'] {
  if (row.sourceReportId === null && row.sourceText === null) return null;
  return {
    reportId: row.sourceReportId,
    fileName: row.sourceReportId === null ? null : (files.get(row.sourceReportId) ?? null),
    page: row.sourcePage,
    text: row.sourceText,
  };
}

function errorOf(row: FindingRow, nameOf: (personId: string) => string): Finding['enteredInError'] {
  if (row.errorAt === null) return null;
  return {
    words: row.errorWords ?? '',
    by: row.errorById === null ? '' : nameOf(row.errorById),
    at: row.errorAt.toISOString(),
  };
}
