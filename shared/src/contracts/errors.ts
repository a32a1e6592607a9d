import { z } from 'zod';

/** Every error id that the server answers with, and the HTTP status it goes with. The client shows errors by id. */
export const errorStatus = {
  invalid: 400,
  malformed: 400,
  'link-unusable': 400,
  'signed-out': 401,
  'wrong-credentials': 401,
  'wrong-password': 403,
  forbidden: 403,
  sealed: 403,
  'not-found': 404,
  stale: 409,
  'wrong-state': 409,
  'not-ready': 409,
  'round-open': 409,
  'round-not-open': 409,
  'set-frozen': 409,
  'weights-frozen': 409,
  'already-handed-in': 409,
  duplicate: 409,
  'too-large': 413,
  'wrong-type': 415,
  'panel-refused': 422,
  'too-many': 429,
  failed: 500,
  unavailable: 503,
} as const;

export type ErrorId = keyof typeof errorStatus;

export const fieldFaultSchema = z
  .object({ path: z.string(), message: z.string() })
  .meta({ id: 'FieldFault' });
export type FieldFault = z.infer<typeof fieldFaultSchema>;

/**
 * The body of every refusal. `fields` lists all faults of the input, or all parts that are still missing for a move.
 * `current` is the state that the writer has not seen yet, with `stale`.
 */
export const errorBodySchema = z
  .object({
    error: z.object({
      id: z.string(),
      message: z.string(),
      fields: z.array(fieldFaultSchema).optional(),
      current: z.unknown().optional(),
    }),
  })
  .meta({ id: 'ErrorBody' });
export type ErrorBody = z.infer<typeof errorBodySchema>;
