import { z } from 'zod';
import { leaderSchema, sealedWord } from './cases.js';
import { idSchema, momentSchema } from './common.js';

/** What a person is asked to do. */
export const todayKindSchema = z.enum([
  'judge',
  'answer',
  'review',
  'unseal',
  'stance',
  'approve',
  'tell',
  'act',
  'draft',
]);
export type TodayKind = z.infer<typeof todayKindSchema>;
export const todayItemSchema = z
  .object({
    kind: todayKindSchema,
    caseId: idSchema,
    number: z.string(),
    /** The question, or what is to be done; for a liaison never a clinical word. */
    title: z.string(),
    detail: z.string(),
    /** Where to go, a path of the application. */
    path: z.string(),
    waitsSince: momentSchema,
    dueOn: z.string().nullable(),
    late: z.boolean(),
    /** Rows left to judge in a sealed round. */
    sealedRows: z.int().nullable(),
  })
  .meta({ id: 'TodayItem' });
export type TodayItem = z.infer<typeof todayItemSchema>;
export const todaySchema = z
  .object({
    now: momentSchema,
    waiting: z.array(todayItemSchema),
    /** Cases one sits on. */
    cases: z.array(
      z.object({
        id: idSchema,
        number: z.string(),
        question: z.string(),
        detail: z.string(),
        leader: z.union([leaderSchema, sealedWord]).nullable(),
        conferenceAt: momentSchema.nullable(),
      }),
    ),
    closedThisMonth: z.int(),
    nextConference: z
      .object({
        at: momentSchema,
        cases: z.array(z.object({ id: idSchema, number: z.string(), detail: z.string() })),
      })
      .nullable(),
  })
  .meta({ id: 'Today' });
export type Today = z.infer<typeof todaySchema>;
