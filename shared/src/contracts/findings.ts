import { z } from 'zod';
import {
  daySchema,
  idSchema,
  lineSchema,
  momentSchema,
  optionalWordsSchema,
  versionSchema,
  wordsSchema,
} from './common.js';

/** Where a finding comes from; the ledger groups its rows by it. */
export const findingKinds = ['history', 'symptom', 'sign', 'laboratory', 'imaging', 'test'] as const;
export const findingKindSchema = z.enum(findingKinds);
export type FindingKind = z.infer<typeof findingKindSchema>;

/** How far the report of a finding can be trusted, as the share that reasoning uses. */
export const reliabilityWords = { firm: 1, fair: 0.7, doubtful: 0.4 } as const;

const sourceSchema = z.object({
  reportId: idSchema.nullable().optional(),
  page: z.int({ error: 'must be a page number' }).min(1, 'must be 1 or more').max(5000).nullable().optional(),
  /** Where it is written or who saw it, in words, when it is not a report. */
  text: z.string().trim().max(300, 'must have at most 300 characters').nullable().optional(),
});

const findingFields = {
  title: lineSchema(300),
  detail: z.string().trim().max(2000, 'must have at most 2,000 characters').optional(),
  kind: findingKindSchema.optional(),
  /** Names of the levels in order; left out: absent and present. Two to six. */
  levelLabels: z
    .array(lineSchema(80))
    .min(2, 'must have two levels or more')
    .max(6, 'must have six levels or fewer')
    .optional(),
  /** The index of the observed level; null while it is pending. */
  observed: z.int({ error: 'must be the index of a level, or null while pending' }).min(0).max(5).nullable(),
  reliability: z.union([z.enum(['firm', 'fair', 'doubtful']), z.number().min(0.05).max(1)], {
    error: 'must be firm, fair or doubtful, or a share from 0.05 to 1',
  }),
  groupId: idSchema.nullable().optional(),
  observedOn: daySchema.nullable().optional(),
  cost: z.number().min(0, 'must be 0 or more').max(10_000_000).nullable().optional(),
  waitDays: z.number().min(0, 'must be 0 or more').max(3650).nullable().optional(),
  burden: z.number().min(0, 'must be 0 or more').max(3, 'must be 3 or less').nullable().optional(),
  source: sourceSchema.nullable().optional(),
};

export const newFindingSchema = z
  .object({
    ...findingFields,
    reliability: findingFields.reliability.default('firm'),
    observed: findingFields.observed.default(null),
  })
  .meta({ id: 'NewFinding' });
export type NewFinding = z.infer<typeof newFindingSchema>;
export const changeFindingSchema = z
  .object({ version: versionSchema, ...z.object(findingFields).partial().shape })
  .meta({ id: 'ChangeFinding' });
export type ChangeFinding = z.infer<typeof changeFindingSchema>;
export const findingParamsSchema = z.object({ findingId: idSchema });
export const enteredInErrorSchema = z.object({ words: wordsSchema }).meta({ id: 'EnteredInError' });

export const findingSchema = z
  .object({
    id: idSchema,
    version: versionSchema,
    title: z.string(),
    detail: z.string(),
    kind: findingKindSchema,
    levelLabels: z.array(z.string()),
    observed: z.int().nullable(),
    reliability: z.number(),
    groupId: idSchema.nullable(),
    observedOn: daySchema.nullable(),
    cost: z.number().nullable(),
    waitDays: z.number().nullable(),
    burden: z.number().nullable(),
    source: z
      .object({
        reportId: idSchema.nullable(),
        fileName: z.string().nullable(),
        page: z.int().nullable(),
        text: z.string().nullable(),
      })
      .nullable(),
    enteredInError: z.object({ words: z.string(), by: z.string(), at: momentSchema }).nullable(),
    addedBy: z.string(),
    addedAt: momentSchema,
  })
  .meta({ id: 'Finding' });
export type Finding = z.infer<typeof findingSchema>;
export const findingListSchema = z.object({ items: z.array(findingSchema) }).meta({ id: 'FindingList' });

export const newCandidateSchema = z
  .object({
    name: lineSchema(160),
    mustNotMiss: z.boolean().optional(),
    detail: z.string().trim().max(1000).optional(),
  })
  .meta({ id: 'NewCandidate' });
export type NewCandidate = z.infer<typeof newCandidateSchema>;
export const candidateSchema = z
  .object({
    id: idSchema,
    name: z.string(),
    detail: z.string(),
    mustNotMiss: z.boolean(),
    addedBy: z.string(),
    retired: z.boolean(),
    retiredWords: z.string().nullable(),
  })
  .meta({ id: 'Candidate' });
export type Candidate = z.infer<typeof candidateSchema>;
/** The candidate set in force. None of these is not in it: it is always the last column. */
export const candidateSetSchema = z
  .object({ candidateSet: z.int(), items: z.array(candidateSchema) })
  .meta({ id: 'CandidateSet' });
export type CandidateSet = z.infer<typeof candidateSetSchema>;
export const candidateParamsSchema = z.object({ candidateId: idSchema });
export const retireSchema = z.object({ words: optionalWordsSchema }).meta({ id: 'Retire' });

/** The share that reasoning uses for a reliability given as a word or as a share. */
export function reliabilityShare(reliability: NewFinding['reliability']): number {
  return typeof reliability === 'number' ? reliability : reliabilityWords[reliability];
}
