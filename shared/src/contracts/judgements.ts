import { z } from 'zod';
import { idSchema, momentSchema, optionalWordsSchema, versionSchema } from './common.js';

export const exposureSchema = z.enum(['seldom', 'sometimes', 'often'], {
  error: 'must say how often you see this picture: seldom, sometimes or often',
});
export type Exposure = z.infer<typeof exposureSchema>;

/** Numbers are given out of 100 with at most one decimal, so every judgement is a whole number of thousandths. */
const outOf100 = z
  .number({ error: 'must be a number out of 100' })
  .min(0.1, 'must be 0.1 or more: nothing is impossible')
  .max(99.9, 'must be 99.9 or less: nothing is certain')
  .refine((value) => Math.abs(value * 10 - Math.round(value * 10)) < 1e-9, 'must have at most one decimal');

const candidateSetVersion = z.int({ error: 'must be the version of the candidate set' }).min(0);

export const judgePriorSchema = z
  .object({
    candidateSet: candidateSetVersion,
    /** Left out, the save is unconditional. */
    version: versionSchema.optional(),
    /** One share for each candidate in order, none of these last; they sum to 100. */
    outOf100: z
      .array(outOf100)
      .min(2)
      .max(31)
      .refine(
        (shares) => Math.abs(shares.reduce((sum, share) => sum + share, 0) - 100) < 0.05,
        'must sum to 100',
      ),
    reason: optionalWordsSchema,
  })
  .meta({ id: 'JudgePrior' });
export type JudgePrior = z.infer<typeof judgePriorSchema>;

/**
 * A cell: of 100 patients with this candidate, how many would show the finding; or a share for each level of the
 * finding, summing to 100; or null where the contributor has no opinion.
 */
export const cellInputSchema = z
  .union([outOf100, z.array(outOf100).min(2).max(6)], {
    error: 'must be a number out of 100, from 0.1 to 99.9, or blank',
  })
  .nullable();

export const judgeFindingSchema = z
  .object({
    candidateSet: candidateSetVersion,
    version: versionSchema.optional(),
    /** Always asked; may be left out only where every cell is blank. */
    exposure: exposureSchema.nullable().optional(),
    outOf100: z.array(cellInputSchema).min(2).max(31),
    reason: optionalWordsSchema,
  })
  .refine((row) => row.exposure != null || row.outOf100.every((cell) => cell === null), {
    path: ['exposure'],
    error: 'must say how often you see this picture: seldom, sometimes or often',
  })
  .meta({ id: 'JudgeFinding' });
export type JudgeFinding = z.infer<typeof judgeFindingSchema>;
export const judgementFindingParamsSchema = z.object({ caseId: idSchema, findingId: idSchema });

export const savedJudgementSchema = z
  .object({ version: versionSchema, savedAt: momentSchema, revision: z.int() })
  .meta({ id: 'SavedJudgement' });
export type SavedJudgement = z.infer<typeof savedJudgementSchema>;

/** A private draft: what was typed, kept as typed, also half a number. `target` is prior or the id of a finding. */
export const draftTargetSchema = z.union([z.literal('prior'), idSchema]);
export const judgementDraftInputSchema = z
  .object({
    target: draftTargetSchema,
    candidateSet: candidateSetVersion,
    exposure: exposureSchema.nullable(),
    /** As typed: for each column its texts, one for two levels (how many would show it), else one for each level. */
    typed: z.array(z.array(z.string().max(12)).max(6)).max(31),
    reason: z.string().max(4000),
  })
  .meta({ id: 'JudgementDraftInput' });
export type JudgementDraftInput = z.infer<typeof judgementDraftInputSchema>;
export const judgementDraftSchema = z
  .object({ ...judgementDraftInputSchema.shape, savedAt: momentSchema })
  .meta({ id: 'JudgementDraft' });
export type JudgementDraft = z.infer<typeof judgementDraftSchema>;
export const draftParamsSchema = z.object({ caseId: idSchema, target: draftTargetSchema });

/** A saved judgement of one row, columns in the order of the candidate set in force, none of these last. */
export const rowJudgementSchema = z
  .object({
    findingId: idSchema,
    version: versionSchema,
    exposure: exposureSchema,
    outOf100: z.array(z.union([z.number(), z.array(z.number())]).nullable()),
    reason: z.string().nullable(),
    savedAt: momentSchema,
  })
  .meta({ id: 'RowJudgement' });
export type RowJudgement = z.infer<typeof rowJudgementSchema>;
export const priorJudgementSchema = z
  .object({
    candidateSet: z.int(),
    version: versionSchema,
    outOf100: z.array(z.number()),
    reason: z.string().nullable(),
    savedAt: momentSchema,
  })
  .meta({ id: 'PriorJudgement' });
export type PriorJudgement = z.infer<typeof priorJudgementSchema>;
