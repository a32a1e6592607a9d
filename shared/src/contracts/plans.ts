import { z } from 'zod';
import {
  daySchema,
  idSchema,
  lineSchema,
  momentSchema,
  personRefSchema,
  versionSchema,
  wordsSchema,
} from './common.js';

/** How certain the working diagnosis is: HL7 FHIR R4 condition-ver-status, the four that apply before an outcome. */
export const certainties = ['unconfirmed', 'provisional', 'differential', 'confirmed'] as const;
export const certaintySchema = z.enum(certainties);
export type Certainty = z.infer<typeof certaintySchema>;

export const planActionInputSchema = z
  .object({
    /** Left out for a new action. */
    id: idSchema.optional(),
    what: lineSchema(500),
    ownerId: idSchema.nullable(),
    due: daySchema.nullable(),
    /** The patient is told of it. */
    concernsPatient: z.boolean().default(false),
  })
  .meta({ id: 'PlanActionInput' });

/** The draft of the plan; parts may still be empty, concluding names what is missing. */
export const planInputSchema = z
  .object({
    version: versionSchema,
    workingDiagnosis: z.string().trim().max(500, 'must have at most 500 characters'),
    candidateId: idSchema.nullable().optional(),
    certainty: certaintySchema.nullable(),
    remainingDoubt: z.string().trim().max(4000, 'must have at most 4,000 characters'),
    safetyNet: z.string().trim().max(4000, 'must have at most 4,000 characters'),
    actions: z.array(planActionInputSchema).max(60),
  })
  .meta({ id: 'PlanInput' });
export type PlanInput = z.infer<typeof planInputSchema>;

export const planActionSchema = z
  .object({
    id: idSchema,
    what: z.string(),
    owner: personRefSchema.nullable(),
    due: daySchema.nullable(),
    concernsPatient: z.boolean(),
    doneAt: momentSchema.nullable(),
    doneWords: z.string().nullable(),
  })
  .meta({ id: 'PlanAction' });
export const stanceSchema = z.enum(['agree', 'dissent']);
export const stanceOfSchema = z
  .object({
    person: personRefSchema,
    stance: stanceSchema.nullable(),
    words: z.string().nullable(),
    at: momentSchema.nullable(),
    /** The plan was changed after this was said. */
    changedSince: z.boolean().optional(),
  })
  .meta({ id: 'Stance' });

export const planSchema = z
  .object({
    id: idSchema,
    /** 1 for the first signed plan; a draft carries the number it will get. */
    number: z.int(),
    version: versionSchema,
    workingDiagnosis: z.string(),
    candidateId: idSchema.nullable(),
    certainty: certaintySchema.nullable(),
    remainingDoubt: z.string(),
    safetyNet: z.string(),
    actions: z.array(planActionSchema),
    /** Contributors have been asked for agreement or dissent. */
    askedAt: momentSchema.nullable(),
    stances: z.array(stanceOfSchema),
    signedAt: momentSchema.nullable(),
    signedBy: personRefSchema.nullable(),
    /** Where the panel stood at signing: candidate names as they were, none of these last. */
    standing: z.array(z.object({ name: z.string(), share: z.number() })).nullable(),
    method: z.string().nullable(),
  })
  .meta({ id: 'Plan' });
export type Plan = z.infer<typeof planSchema>;
export const planViewSchema = z
  .object({
    draft: planSchema.nullable(),
    signed: z.array(planSchema),
    /** What concluding still needs; empty when it can be done. */
    missing: z.array(z.object({ path: z.string(), message: z.string() })),
    abilities: z.array(z.string()),
  })
  .meta({ id: 'PlanView' });
export type PlanView = z.infer<typeof planViewSchema>;

/** Agreement, or dissent with words that stand in the plan. */
export const dissentSchema = z.object({ words: wordsSchema }).meta({ id: 'Dissent' });
export const concludeSchema = z
  .object({ password: z.string({ error: 'must be your password' }).min(1, 'must be your password').max(200) })
  .meta({ id: 'Conclude' });
export const actionParamsSchema = z.object({ actionId: idSchema });
export const actionDoneSchema = z.object({ words: wordsSchema }).meta({ id: 'ActionDone' });
