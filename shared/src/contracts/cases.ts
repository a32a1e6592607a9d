import { z } from 'zod';
import {
  daySchema,
  idSchema,
  lineSchema,
  momentSchema,
  optionalWordsSchema,
  personRefSchema,
  versionSchema,
  wordsSchema,
} from './common.js';
import { roundProgressSchema } from './rounds.js';

/** What happened to the case when the words it shows were said. */
export const wordedMoveSchema = z.enum([
  'submitted',
  'returned',
  'accepted',
  'declined',
  'withdrawn',
  'reopened',
]);
export type WordedMove = z.infer<typeof wordedMoveSchema>;

export const caseStates = [
  'draft',
  'submitted',
  'returned',
  'accepted',
  'judging',
  'concluded',
  'outcomeKnown',
  'declined',
  'withdrawn',
] as const;
export const caseStateSchema = z.enum(caseStates);
export type CaseState = z.infer<typeof caseStateSchema>;

export const parts = ['referrer', 'contributor', 'chair', 'liaison'] as const;
export const partSchema = z.enum(parts);
export type Part = z.infer<typeof partSchema>;

/** HL7 FHIR R4 AdministrativeGender. */
export const sexSchema = z.enum(['female', 'male', 'other', 'unknown']);
export type Sex = z.infer<typeof sexSchema>;

export const urgencySchema = z.enum(['withinWeek', 'withinTwoWeeks', 'withinMonth', 'noFixedTime']);
export type Urgency = z.infer<typeof urgencySchema>;

export const consentSchema = z
  .object({
    given: z.boolean({ error: 'must say whether consent was given' }),
    how: z.enum(['signed', 'spoken'], { error: 'must be signed or spoken' }),
    givenOn: daySchema,
  })
  .meta({ id: 'Consent' });
export type Consent = z.infer<typeof consentSchema>;

const draftFields = {
  question: z.string({ error: 'must be text' }).trim().max(300, 'must have at most 300 characters'),
  age: z
    .int({ error: 'must be whole years' })
    .min(0, 'must be 0 or more')
    .max(120, 'must be 120 or less')
    .nullable(),
  sex: sexSchema.nullable(),
  urgency: urgencySchema.nullable(),
  urgencyReason: z.string({ error: 'must be text' }).trim().max(1000, 'must have at most 1,000 characters'),
  consent: consentSchema.nullable(),
  /** Rich text: headings, lists, tables, emphasis. The server keeps only what it allows. */
  historyHtml: z.string({ error: 'must be text' }).max(200_000, 'must have at most 200,000 characters'),
};

/** Opens a draft; every field may still be missing. */
export const newCaseSchema = z.object(draftFields).partial().meta({ id: 'NewCase' });
export type NewCase = z.infer<typeof newCaseSchema>;
export const changeDraftSchema = z
  .object({ version: versionSchema, ...z.object(draftFields).partial().shape })
  .meta({ id: 'ChangeDraft' });
export type ChangeDraft = z.infer<typeof changeDraftSchema>;

export const teamMemberInputSchema = z
  .object({
    personId: idSchema,
    part: partSchema,
    /** Contributors alone: how much the chair lets this person count, 0 to 3. */
    weight: z
      .number({ error: 'must be a number' })
      .min(0, 'must be 0 or more')
      .max(3, 'must be 3 or less')
      .optional(),
    reason: optionalWordsSchema,
  })
  .meta({ id: 'TeamMemberInput' });
export type TeamMemberInput = z.infer<typeof teamMemberInputSchema>;
export const teamInputSchema = z
  .array(teamMemberInputSchema)
  .max(60, 'must name at most 60 people')
  .meta({ id: 'TeamInput' });

export const teamMemberSchema = z
  .object({
    person: personRefSchema,
    part: partSchema,
    weight: z.number().nullable(),
    reason: z.string().nullable(),
  })
  .meta({ id: 'TeamMember' });
export type TeamMember = z.infer<typeof teamMemberSchema>;
export const teamSchema = z.object({ items: z.array(teamMemberSchema) }).meta({ id: 'Team' });

/** A case as its team sees it. A liaison never receives one. */
export const caseSchema = z
  .object({
    id: idSchema,
    number: z.string(),
    state: caseStateSchema,
    version: versionSchema,
    /** Rises with every change that anybody on the case may have to see. */
    revision: z.int(),
    question: z.string(),
    age: z.int().nullable(),
    sex: sexSchema.nullable(),
    urgency: urgencySchema.nullable(),
    urgencyReason: z.string(),
    consent: consentSchema.nullable(),
    historyHtml: z.string(),
    referrer: personRefSchema,
    chair: personRefSchema.nullable(),
    team: z.array(teamMemberSchema),
    conferenceAt: momentSchema.nullable(),
    quorum: z.int(),
    tempering: z.number(),
    coexistence: z.number(),
    /** The open or last round in figures; who is in stands in GET …/rounds. */
    round: roundProgressSchema.nullable(),
    /** `pending`: the findings that are not known yet, among the findings. */
    counts: z.object({ reports: z.int(), findings: z.int(), pending: z.int(), candidates: z.int() }),
    /** The last words with which the case was returned, declined, withdrawn or reopened. */
    words: z
      .object({ move: wordedMoveSchema, text: z.string(), by: z.string(), at: momentSchema })
      .nullable(),
    /** What is still missing before the draft can be submitted. */
    missing: z.array(z.object({ path: z.string(), message: z.string() })),
    submittedAt: momentSchema.nullable(),
    createdAt: momentSchema,
    updatedAt: momentSchema,
    parts: z.array(partSchema),
    abilities: z.array(z.string()),
  })
  .meta({ id: 'Case' });
export type Case = z.infer<typeof caseSchema>;

export const caseSortFields = [
  'number',
  'question',
  'state',
  'urgency',
  'conferenceAt',
  'updatedAt',
] as const;
/** `sort` is a field name, with a minus in front for descending. */
export const caseQuerySchema = z.object({
  state: z.enum([...caseStates, 'open', 'closed']).optional(),
  q: z.string().max(100).optional(),
  sort: z
    .string()
    .regex(
      new RegExp(`^-?(${caseSortFields.join('|')})$`),
      'must be a column name, with - in front for descending',
    )
    .default('-updatedAt'),
  page: z.coerce.number().int().min(1).default(1),
  size: z.coerce.number().int().min(1).max(100).default(25),
});
export type CaseQuery = z.infer<typeof caseQuerySchema>;

export const sealedWord = z.literal('sealed');
export const leaderSchema = z.object({ name: z.string(), share: z.number() }).meta({ id: 'Leader' });
export const caseListItemSchema = z
  .object({
    id: idSchema,
    number: z.string(),
    question: z.string(),
    age: z.int().nullable(),
    sex: sexSchema.nullable(),
    state: caseStateSchema,
    urgency: urgencySchema.nullable(),
    referrerName: z.string(),
    chairName: z.string().nullable(),
    conferenceAt: momentSchema.nullable(),
    round: roundProgressSchema.nullable(),
    /** While a sealed round is open the word sealed stands here for everybody. */
    leader: z.union([leaderSchema, sealedWord]).nullable(),
    disagreementBits: z.union([z.number(), sealedWord]).nullable(),
    updatedAt: momentSchema,
  })
  .meta({ id: 'CaseListItem' });
export type CaseListItem = z.infer<typeof caseListItemSchema>;
export const caseListSchema = z
  .object({ items: z.array(caseListItemSchema), total: z.int() })
  .meta({ id: 'CaseList' });

export const wordsInputSchema = z.object({ words: wordsSchema }).meta({ id: 'WordsInput' });
export const submitSchema = z.object({ words: optionalWordsSchema }).meta({ id: 'Submit' });
export const acceptSchema = z
  .object({
    words: optionalWordsSchema,
    /** The team; left out when it was set before with PUT team. */
    team: teamInputSchema.optional(),
    /** The conference, or null for "not yet". */
    conferenceAt: z.iso.datetime({ error: 'must be a date and time' }).nullable().optional(),
    quorum: z.int().min(2, 'must be 2 or more').max(25, 'must be 25 or less').optional(),
  })
  .meta({ id: 'Accept' });
export type Accept = z.infer<typeof acceptSchema>;

export const overlapGroupInputSchema = z.object({
  /** Left out for a new group. */
  id: idSchema.optional(),
  label: lineSchema(120),
  overlap: z.number({ error: 'must be a number' }).min(0, 'must be 0 or more').max(1, 'must be 1 or less'),
  reason: optionalWordsSchema,
});
export const togetherInputSchema = z.object({
  a: idSchema,
  b: idSchema,
  times: z.number({ error: 'must be a number' }).min(0, 'must be 0 or more').max(100, 'must be 100 or less'),
  reason: wordsSchema,
});
export const changeSettingsSchema = z
  .object({
    coexistence: z
      .number({ error: 'must be a number' })
      .min(0, 'must be 0 or more')
      .max(0.5, 'must be 0.5 or less')
      .optional(),
    tempering: z
      .number({ error: 'must be a number' })
      .min(0.3, 'must be 0.3 or more')
      .max(1, 'must be 1 or less')
      .optional(),
    quorum: z
      .int({ error: 'must be a whole number' })
      .min(2, 'must be 2 or more')
      .max(25, 'must be 25 or less')
      .optional(),
    conferenceAt: z.iso.datetime({ error: 'must be a date and time' }).nullable().optional(),
    /** The whole list of groups of findings that one mechanism explains; those left out are dissolved. */
    groups: z.array(overlapGroupInputSchema).max(60).optional(),
    /** The whole list of pairs of candidates that go together or avoid each other. */
    together: z.array(togetherInputSchema).max(435).optional(),
    reason: wordsSchema,
  })
  .meta({ id: 'ChangeSettings' });
export type ChangeSettings = z.infer<typeof changeSettingsSchema>;

export const settingsSchema = z
  .object({
    coexistence: z.number(),
    tempering: z.number(),
    quorum: z.int(),
    conferenceAt: momentSchema.nullable(),
    groups: z.array(
      z.object({ id: idSchema, label: z.string(), overlap: z.number(), reason: z.string().nullable() }),
    ),
    together: z.array(z.object({ a: idSchema, b: idSchema, times: z.number(), reason: z.string() })),
    /** The latest change with the chair's words; null while the settings are those of a new case. */
    lastChange: z.object({ by: z.string(), at: momentSchema, reason: z.string() }).nullable(),
  })
  .meta({ id: 'Settings' });
export type Settings = z.infer<typeof settingsSchema>;
