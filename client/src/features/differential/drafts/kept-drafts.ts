import { exposureSchema, judgementDraftInputSchema } from '@weighhouse/shared/contracts/judgements';
import { z } from 'zod';
import { forget, keep, kept } from '../../../lib/kept';
import type { TypedDraft } from './draft-store';

const keptSchema = z.object({
  draft: z.object({
    candidateSet: z.int(),
    exposure: exposureSchema.nullable(),
    cells: z.array(z.tuple([z.string(), z.array(z.string())])),
    reason: z.string(),
    base: z.int(),
  }),
  wire: judgementDraftInputSchema,
});

/** The place of a draft in this browser's memory; the person's own, so that nobody else finds it there. */
const keyOf = (personId: string, caseId: string, target: string) => `draft.${personId}.${caseId}.${target}`;

export function rememberDraft(
  personId: string,
  caseId: string,
  target: string,
  typed: TypedDraft | null,
): void {
  const key = keyOf(personId, caseId, target);
  if (typed) keep(key, { wire: typed.wire, draft: { ...typed.draft, cells: [...typed.draft.cells] } });
  else forget(key);
}

export function recallDraft(personId: string, caseId: string, target: string): TypedDraft | null {
  const read = keptSchema.safeParse(kept(keyOf(personId, caseId, target)));
  if (!read.success) return null;
  const { draft, wire } = read.data;
  return { wire, draft: { ...draft, cells: new Map(draft.cells) } };
}
