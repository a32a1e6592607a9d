import { z } from 'zod';
import { idSchema, momentSchema, optionalWordsSchema, personRefSchema, versionSchema } from './common.js';

export const roundKindSchema = z.enum(['sealed', 'live'], { error: 'must be sealed or live' });
export type RoundKind = z.infer<typeof roundKindSchema>;
/** open: people judge. unsealed: a sealed round whose numbers everybody now sees. closed: over. */
export const roundStateSchema = z.enum(['open', 'unsealed', 'closed']);

export const roundMemberSchema = z
  .object({ person: personRefSchema, handedInAt: momentSchema.nullable(), digest: z.string().nullable() })
  .meta({ id: 'RoundMember' });

/** A round as everybody on the case sees it: who is in and with which seal, never a number. */
export const roundSchema = z
  .object({
    id: idSchema,
    number: z.int(),
    kind: roundKindSchema,
    state: roundStateSchema,
    candidateSet: z.int(),
    openedAt: momentSchema,
    deadline: momentSchema.nullable(),
    unsealedAt: momentSchema.nullable(),
    /** Why it was unsealed before the quorum was in. */
    unsealReason: z.string().nullable(),
    closedAt: momentSchema.nullable(),
    members: z.array(roundMemberSchema),
  })
  .meta({ id: 'Round' });
export type Round = z.infer<typeof roundSchema>;

/** How far a round is, in figures that tell nobody's number. */
export const roundProgressSchema = z
  .object({
    number: z.int(),
    kind: roundKindSchema,
    open: z.boolean(),
    handedIn: z.int(),
    contributors: z.int(),
  })
  .meta({ id: 'RoundProgress' });
export type RoundProgress = z.infer<typeof roundProgressSchema>;

export const openRoundSchema = z
  .object({
    kind: roundKindSchema,
    deadline: z.iso.datetime({ error: 'must be a date and time' }).nullable().optional(),
  })
  .meta({ id: 'OpenRound' });
export const roundParamsSchema = z.object({ roundId: idSchema });
export const roundListSchema = z.object({ items: z.array(roundSchema) }).meta({ id: 'RoundList' });

export const handInInputSchema = z
  .object({
    /** Explicitly: nothing more will come from me, although rows are blank. */
    noMore: z.boolean().optional(),
    /** The version of one's own judgement that is handed in; a stale one is refused. */
    version: versionSchema.optional(),
  })
  .meta({ id: 'HandInInput' });
export const handInSchema = z
  .object({ digest: z.string(), handedInAt: momentSchema, version: versionSchema })
  .meta({ id: 'HandIn' });
export const unsealSchema = z.object({ reason: optionalWordsSchema }).meta({ id: 'Unseal' });

/** What a seal closes over; see seals/seal.ts. Numbers are thousandths. */
export const sealedDocumentSchema = z
  .object({
    caseId: idSchema,
    roundId: idSchema,
    personId: idSchema,
    candidateSet: z.int(),
    findings: z.array(idSchema),
    judgement: z.object({
      prior: z.array(z.int()).nullable(),
      rows: z.array(
        z.object({
          finding: idSchema,
          exposure: z.enum(['seldom', 'sometimes', 'often']),
          given: z.array(z.union([z.int(), z.array(z.int())]).nullable()),
        }),
      ),
    }),
  })
  .meta({ id: 'SealedDocument' });
export type SealedDocument = z.infer<typeof sealedDocumentSchema>;

export const sealSchema = z
  .object({
    roundId: idSchema,
    roundNumber: z.int(),
    person: personRefSchema,
    handedInAt: momentSchema,
    /** SHA-256, 64 hexadecimal digits. */
    digest: z.string(),
    /** The 32 random bytes as 64 hexadecimal digits, once the round is unsealed. */
    random: z.string().nullable(),
    document: sealedDocumentSchema.nullable(),
  })
  .meta({ id: 'Seal' });
export type Seal = z.infer<typeof sealSchema>;
export const sealListSchema = z.object({ items: z.array(sealSchema) }).meta({ id: 'SealList' });
