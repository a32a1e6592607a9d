import type { CaseAction } from '@weighhouse/shared/access/actions';
import type { Report } from '@weighhouse/shared/contracts/reports';
import type { ReportRow } from './report.entity.js';

/** A report as somebody with these abilities sees it. */
export function reportView(row: ReportRow, uploadedBy: string, abilities: readonly CaseAction[]): Report {
  return {
    id: row.id,
    caseId: row.caseId,
    fileName: row.fileName,
    mediaType: row.mediaType,
    sizeBytes: row.sizeBytes,
    sha256: row.sha256,
    uploadedBy,
    uploadedAt: row.uploadedAt.toISOString(),
    canRemove: abilities.includes('report.remove'),
  };
}
