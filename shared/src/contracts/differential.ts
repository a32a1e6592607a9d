import { z } from 'zod';
import { assessmentSchema } from './assessment.js';
import { settingsSchema } from './cases.js';
import { idSchema, momentSchema, versionSchema } from './common.js';
import { candidateSchema, findingSchema } from './findings.js';
import { judgementDraftSchema, priorJudgementSchema, rowJudgementSchema } from './judgements.js';
import { roundSchema } from './rounds.js';

/** One's own judgement; nobody else ever receives it while a round is sealed. */
export const mineSchema = z
  .object({
    /** The key of one's own entries in the assessment. */
    key: z.string(),
    version: versionSchema,
    prior: priorJudgementSchema.nullable(),
    /** False where the candidate set has changed since: it is asked again and not pooled. */
    priorInForce: z.boolean(),
    findings: z.array(rowJudgementSchema),
    drafts: z.array(judgementDraftSchema),
    handedInAt: momentSchema.nullable(),
    digest: z.string().nullable(),
    /** Where one stands alone, one's own numbers only; null before a prior or a row is given. */
    standing: z.array(z.number()).nullable(),
  })
  .meta({ id: 'Mine' });
export type Mine = z.infer<typeof mineSchema>;

/** Another contributor's numbers, after unsealing. The referrer gets them without names. */
export const otherSchema = z
  .object({
    /** The key of this contributor's entries in the assessment. */
    key: z.string(),
    personId: idSchema.nullable(),
    name: z.string(),
    specialty: z.string().nullable(),
    weight: z.number(),
    prior: priorJudgementSchema.nullable(),
    priorInForce: z.boolean(),
    findings: z.array(rowJudgementSchema),
  })
  .meta({ id: 'Other' });
export type Other = z.infer<typeof otherSchema>;

/** A row that the chair wants discussed first, with the words why. */
export const agendaItemSchema = z
  .object({
    findingId: idSchema,
    note: z.string(),
    version: versionSchema,
    addedBy: z.string(),
    addedAt: momentSchema,
  })
  .meta({ id: 'AgendaItem' });
export type AgendaItem = z.infer<typeof agendaItemSchema>;
export const putOnAgendaSchema = z
  .object({
    note: z
      .string({ error: 'must say in words what to discuss' })
      .trim()
      .min(1, 'must say in words what to discuss')
      .max(1000, 'must have at most 1,000 characters'),
    /** The version one last saw, 0 where it was not on the agenda; left out, the save is unconditional. */
    version: versionSchema.optional(),
  })
  .meta({ id: 'PutOnAgenda' });
export type PutOnAgenda = z.infer<typeof putOnAgendaSchema>;
/** The query of taking a row off: the version one last saw; left out, it is taken off as it is. */
export const takeOffAgendaSchema = z.object({ version: z.coerce.number().pipe(versionSchema).optional() });

export const differentialSchema = z
  .object({
    caseId: idSchema,
    revision: z.int(),
    candidateSet: z.int(),
    candidates: z.array(candidateSchema),
    findings: z.array(findingSchema),
    settings: settingsSchema,
    /** The open round, or the last one. */
    round: roundSchema.nullable(),
    /** A sealed round is open: no number of it is here but one's own. */
    sealed: z.boolean(),
    /** The round whose numbers the assessment shows; null where there are none yet. */
    shownRound: z.object({ number: z.int(), live: z.boolean(), notIn: z.array(z.string()) }).nullable(),
    mine: mineSchema.nullable(),
    assessment: assessmentSchema.nullable(),
    /** Where the panel stood before the open or last round, by today's columns; null where a column is new. */
    before: z.array(z.number().nullable()).nullable(),
    others: z.array(otherSchema).nullable(),
    /** What to discuss first, in the order in which it was put there. */
    agenda: z.array(agendaItemSchema),
    abilities: z.array(z.string()),
  })
  .meta({ id: 'Differential' });
export type Differential = z.infer<typeof differentialSchema>;

/** The panel exactly as assess() takes it. */
export const panelSchema = z
  .object({
    candidates: z.array(z.string()),
    coexistence: z.number(),
    tempering: z.number(),
    together: z.array(z.object({ a: z.int(), b: z.int(), times: z.number() })),
    groups: z.array(z.object({ id: z.string(), overlap: z.number() })),
    findings: z.array(
      z.object({
        id: z.string(),
        levels: z.int(),
        observed: z.int().nullable(),
        reliability: z.number(),
        group: z.string().optional(),
        cost: z.number().optional(),
        waitDays: z.number().optional(),
        burden: z.number().optional(),
      }),
    ),
    contributors: z.array(
      z.object({
        id: z.string(),
        weight: z.number(),
        prior: z.array(z.number()).nullable(),
        likelihoods: z.record(
          z.string(),
          z.object({
            exposure: z.enum(['seldom', 'sometimes', 'often']),
            given: z.array(z.union([z.number(), z.array(z.number())]).nullable()),
          }),
        ),
      }),
    ),
  })
  .meta({ id: 'Panel' });
export type PanelView = z.infer<typeof panelSchema>;
