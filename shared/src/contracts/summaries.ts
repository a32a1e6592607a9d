import { z } from 'zod';
import { daySchema, idSchema, lineSchema, momentSchema, versionSchema } from './common.js';

export const summaryStates = ['none', 'draft', 'waiting', 'approved', 'told'] as const;
export const summaryStateSchema = z.enum(summaryStates);

export const contactInputSchema = z
  .object({
    at: z.iso.datetime({ error: 'must be a date and time' }),
    how: z.enum(['meeting', 'telephone', 'video', 'letter'], {
      error: 'must be meeting, telephone, video or letter',
    }),
    reached: z.boolean({ error: 'must say whether the patient was reached' }),
    understood: z.enum(['yes', 'partly', 'no']).nullable().optional(),
    questions: z.string().trim().max(4000, 'must have at most 4,000 characters').optional(),
    notes: z.string().trim().max(4000, 'must have at most 4,000 characters').optional(),
  })
  .meta({ id: 'ContactInput' });
export type ContactInput = z.infer<typeof contactInputSchema>;
export const contactSchema = z
  .object({
    id: idSchema,
    at: momentSchema,
    how: z.string(),
    reached: z.boolean(),
    understood: z.enum(['yes', 'partly', 'no']).nullable(),
    questions: z.string(),
    notes: z.string(),
    /** This contact told the summary. */
    told: z.boolean(),
    by: z.string(),
  })
  .meta({ id: 'Contact' });

/** The plain-language text that the patient is told from, and what of the plan concerns the patient. */
export const summarySchema = z
  .object({
    caseId: idSchema,
    number: z.string(),
    state: summaryStateSchema,
    version: versionSchema,
    /** Paragraphs, separated by empty lines. */
    body: z.string(),
    planNumber: z.int().nullable(),
    safetyNet: z.string().nullable(),
    /** Those that concern the patient, and those that the reader owns. */
    actions: z.array(
      z.object({
        id: idSchema.optional(),
        what: z.string(),
        due: daySchema.nullable(),
        /** The reader owns it and reports it done. */
        mine: z.boolean().optional(),
        doneAt: momentSchema.nullable().optional(),
      }),
    ),
    /** What the chair asks to be changed. */
    returnedWords: z.string().nullable(),
    approvedBy: z.string().nullable(),
    approvedAt: momentSchema.nullable(),
    toldAt: momentSchema.nullable(),
    /** The contact log; for the referrer, the liaison and the chair. */
    contacts: z.array(contactSchema),
    abilities: z.array(z.string()),
  })
  .meta({ id: 'Summary' });
export type Summary = z.infer<typeof summarySchema>;
export const summaryInputSchema = z
  .object({
    version: versionSchema,
    body: z.string({ error: 'must be text' }).trim().max(20_000, 'must have at most 20,000 characters'),
    /** Hands it to the chair for approval. */
    ready: z.boolean().optional(),
  })
  .meta({ id: 'SummaryInput' });
export type SummaryInput = z.infer<typeof summaryInputSchema>;
export const approveSummarySchema = z.object({ version: versionSchema }).meta({ id: 'ApproveSummary' });

/** What waits for the liaison: nothing clinical, a number and how far it is. */
export const tellListSchema = z
  .object({
    items: z.array(
      z.object({
        caseId: idSchema,
        number: z.string(),
        state: summaryStateSchema,
        /** There is a signed plan to tell from. */
        hasPlan: z.boolean(),
        since: momentSchema,
        attempts: z.int(),
      }),
    ),
  })
  .meta({ id: 'TellList' });
export type TellList = z.infer<typeof tellListSchema>;

/** Who the patient is, for the case's referrer and liaison alone; every opening is in the trail. */
const identityFields = {
  name: lineSchema(200),
  birthDate: daySchema,
  telephone: z.string().trim().max(40, 'must have at most 40 characters'),
  language: z.string().trim().max(120, 'must have at most 120 characters'),
  howToReach: z.string().trim().max(1000, 'must have at most 1,000 characters'),
};
export const identityInputSchema = z
  .object({ version: versionSchema, ...identityFields })
  .meta({ id: 'IdentityInput' });
export type IdentityInput = z.infer<typeof identityInputSchema>;
export const identitySchema = z
  .object({
    version: versionSchema,
    card: z.object(identityFields).nullable(),
    abilities: z.array(z.string()),
  })
  .meta({ id: 'Identity' });
export type Identity = z.infer<typeof identitySchema>;
