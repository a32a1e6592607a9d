import type { EntityManager } from 'typeorm';
import { FindingRow } from './finding.entity.js';

/** Whether a finding was taken from a report; one entered in error still shows where it came from. */
export const reportIsInFindings = (reportId: string, em: EntityManager): Promise<boolean> =>
  em.existsBy(FindingRow, { sourceReportId: reportId });
