import { z } from 'zod';

/**
 * A random identifier, UUID version 4 (RFC 9562). It is taken in any spelling and kept in the one it was made with: the
 * database finds a row by either, but a hand-in or a card kept under the other would belong to nothing.
 */
export const idSchema = z.uuid({ error: 'must be an identifier (UUID)' }).toLowerCase();

/** A moment in time as an ISO 8601 string in UTC. Rows may carry a Date; it leaves as a string. */
export const momentSchema = z.preprocess(
  (value) => (value instanceof Date ? value.toISOString() : value),
  z.iso.datetime(),
);

/** A calendar day, YYYY-MM-DD. */
export const daySchema = z.iso.date({ error: 'must be a date, written YYYY-MM-DD' });

/** Free words that somebody must give: trimmed, not empty. */
export const wordsSchema = z
  .string({ error: 'must be written in words' })
  .trim()
  .min(1, 'must not be empty')
  .max(4000, 'must have at most 4,000 characters');

/** Free words that may be left out. */
export const optionalWordsSchema = z
  .string({ error: 'must be text' })
  .trim()
  .max(4000, 'must have at most 4,000 characters')
  .optional();

/** Line breaks and other controls (Unicode Cc, Zl, Zp), which have no place in one line. */
const controls = /[\p{Cc}\p{Zl}\p{Zp}]+/gu;
/** Marks that turn the direction of what follows: "not present" could be made to read otherwise than it is kept. */
const turns = /[\u202a-\u202e\u2066-\u2069]/gu;

/** One line of text. Breaks and controls become a space, and what turns the direction of letters is left out. */
export const lineSchema = (most: number) =>
  z
    .string({ error: 'must be text' })
    .overwrite((text) => text.replace(controls, ' ').replace(turns, ''))
    .trim()
    .min(1, 'must not be empty')
    .max(most, `must have at most ${String(most)} characters`);

/** The version that the writer last saw; a stale one is refused with both texts. */
export const versionSchema = z
  .int({ error: 'must be the version you last saw, a whole number' })
  .min(0, 'must be the version you last saw, 0 or more');

/** Route parameters. */
export const caseParamsSchema = z.object({ caseId: idSchema });

/** The answer to a change that has nothing else to say. */
export const doneSchema = z.object({ done: z.literal(true) }).meta({ id: 'Done' });

/** A person as others see them. */
export const personRefSchema = z
  .object({ id: idSchema, name: z.string(), specialty: z.string(), centre: z.string() })
  .meta({ id: 'PersonRef' });
export type PersonRef = z.infer<typeof personRefSchema>;
