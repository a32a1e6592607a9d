import { casesEntities } from './cases/cases.entities.js';
import { differentialEntities } from './differential/differential.entities.js';
import { findingsEntities } from './findings/findings.entities.js';
import { outcomesEntities } from './outcomes/outcomes.entities.js';
import { peopleEntities } from './people/people.entities.js';
import { plansEntities } from './plans/plans.entities.js';
import { AuditEntry } from './platform/audit-log/audit-entry.entity.js';
import { OutboxMail } from './platform/mail/outbox-mail.entity.js';
import { reportsEntities } from './reports/reports.entities.js';
import { summariesEntities } from './summaries/summaries.entities.js';

/** Every table of the application. The migrations are made from and checked against this list. */
export const entities = [
  AuditEntry,
  OutboxMail,
  ...peopleEntities,
  ...casesEntities,
  ...reportsEntities,
  ...findingsEntities,
  ...differentialEntities,
  ...plansEntities,
  ...summariesEntities,
  ...outcomesEntities,
];
