import { z } from 'zod';

const shares = z.array(z.number());
const byId = <T extends z.ZodType>(value: T) => z.record(z.string(), value);
const pole = z.object({ contributor: z.string(), p: z.number() });

/** What assess() answers, as the ledger needs it; see reasoning/assess.ts for every key's meaning. */
export const assessmentSchema = z
  .object({
    method: z.string(),
    priorGiven: z.boolean(),
    pooledPrior: shares,
    pooledCells: byId(z.array(shares)),
    unjudged: z.array(z.object({ finding: z.string(), column: z.int() })),
    standing: shares,
    own: byId(shares),
    linearPool: shares,
    disagreementBits: z.number(),
    rows: byId(
      z.object({
        weightOfEvidence: shares,
        by: byId(z.array(z.number().nullable())),
        apart: z.object({ column: z.int(), low: pole, high: pole }).nullable(),
        swing: z.number(),
      }),
    ),
    range: z.array(z.object({ low: z.number(), high: z.number() })),
  })
  .meta({ id: 'Assessment' });
export type AssessmentView = z.infer<typeof assessmentSchema>;
