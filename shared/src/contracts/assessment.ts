import { z } from 'zod';

const shares = z.array(z.number());
const byId = <T extends z.ZodType>(value: T) => z.record(z.string(), value);
const pole = z.object({ contributor: z.string(), p: z.number() });

/** What assess() answers, whole; see reasoning/assessment.ts for every key's meaning. */
export const assessmentSchema = z
  .object({
    method: z.string(),
    exact: z.boolean(),
    leftOut: z.number().nullable(),
    priorGiven: z.boolean(),
    pooledPrior: shares,
    pooledCells: byId(z.array(shares)),
    unjudged: z.array(z.object({ finding: z.string(), column: z.int() })),
    standing: shares,
    sets: z.array(z.object({ members: z.array(z.int()), p: z.number() })),
    explains: z.array(z.object({ if: z.int(), then: z.int(), from: z.number(), to: z.number() })),
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
    nextTests: z.array(
      z.object({
        finding: z.string(),
        bits: z.number(),
        leaderChanges: z.number(),
        frontier: z.boolean(),
        levels: z.array(z.object({ p: z.number(), standing: shares })),
      }),
    ),
    without: z.object({ contributors: byId(shares.nullable()), findings: byId(shares) }),
    range: z.array(z.object({ low: z.number(), high: z.number() })),
  })
  .meta({ id: 'Assessment' });
export type AssessmentView = z.infer<typeof assessmentSchema>;
