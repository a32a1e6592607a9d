import { z } from 'zod';
import { momentSchema } from './common.js';

export const trailEntrySchema = z
  .object({
    id: z.int(),
    at: momentSchema,
    /** The actor's name; null for the service itself. */
    who: z.string().nullable(),
    /** What was done, a stable word such as case.submitted. */
    action: z.string(),
    /** The same as a sentence. */
    sentence: z.string(),
  })
  .meta({ id: 'TrailEntry' });
export type TrailEntry = z.infer<typeof trailEntrySchema>;
export const trailSchema = z
  .object({ items: z.array(trailEntrySchema), total: z.int() })
  .meta({ id: 'Trail' });
export const trailQuerySchema = z.object({
  page: z.coerce.number().int().min(1).default(1),
  size: z.coerce.number().int().min(1).max(200).default(50),
});
