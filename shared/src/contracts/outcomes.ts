import { z } from 'zod';
import { daySchema, idSchema, lineSchema, momentSchema, wordsSchema } from './common.js';

export const outcomeInputSchema = z
  .object({
    /** The candidate that it turned out to be; null for none of these. */
    candidateId: idSchema.nullable(),
    diagnosis: lineSchema(300),
    /** How it is known: for instance a biopsy, a course of treatment, time. */
    howKnown: wordsSchema,
    knownOn: daySchema,
  })
  .meta({ id: 'OutcomeInput' });
export type OutcomeInput = z.infer<typeof outcomeInputSchema>;
export const outcomeSchema = z
  .object({
    candidateId: idSchema.nullable(),
    diagnosis: z.string(),
    howKnown: z.string(),
    knownOn: daySchema,
    recordedBy: z.string(),
    recordedAt: momentSchema,
  })
  .meta({ id: 'Outcome' });
export type Outcome = z.infer<typeof outcomeSchema>;

export const exportQuerySchema = z.object({
  format: z.enum(['pdf', 'letter', 'fhir', 'panel'], { error: 'must be pdf, letter, fhir or panel' }),
});
