import { z } from 'zod';
import { assessmentSchema } from './assessment.js';
import { idSchema } from './common.js';

/** Live events over socket.io at the path /live. The cookie authenticates. */
export const liveEvents = {
  watch: 'watch',
  unwatch: 'unwatch',
  changed: 'case.changed',
  standing: 'case.standing',
  assessment: 'case.assessment',
  present: 'case.present',
} as const;

/**
 * What changed. While a round is sealed only `round` tells of hand-ins; a save in a sealed round is announced to
 * nobody but the person who saved.
 */
export const changedWhat = [
  'case',
  'team',
  'settings',
  'reports',
  'candidates',
  'findings',
  'agenda',
  'round',
  'judgements',
  'plan',
  'summary',
  'outcome',
] as const;
export const changedWhatSchema = z.enum(changedWhat);
export type ChangedWhat = z.infer<typeof changedWhatSchema>;

export const watchSchema = z.object({ caseId: idSchema });
export const caseChangedSchema = z.object({ caseId: idSchema, revision: z.int(), what: changedWhatSchema });
export type CaseChanged = z.infer<typeof caseChangedSchema>;
/** The new standing, sent to those who may see the pool and only where no round is sealed. */
export const caseStandingSchema = z.object({
  caseId: idSchema,
  revision: z.int(),
  candidateSet: z.int(),
  standing: z.array(z.number()),
});
export type CaseStanding = z.infer<typeof caseStandingSchema>;
/**
 * The whole assessment of a panel that takes long to compute, after its standing: next tests, influence and range. Of
 * a panel that takes little it is not sent, because whoever hears of the change fetches it as fast.
 */
export const caseAssessmentSchema = z.object({
  caseId: idSchema,
  revision: z.int(),
  candidateSet: z.int(),
  /** With the keys of the contributors under which the receiver reads them in the differential. */
  assessment: assessmentSchema,
});
export type CaseAssessment = z.infer<typeof caseAssessmentSchema>;
/** How many people of the team have the case open. */
export const casePresentSchema = z.object({ caseId: idSchema, people: z.int() });
export type CasePresent = z.infer<typeof casePresentSchema>;
