import { ReportRow } from './report.entity.js';

/** The tables of this domain. */
export const reportsEntities = [ReportRow];
