import { exposureSchema } from '@weighhouse/shared/contracts/judgements';
import { z } from 'zod';
import { forget, keep, kept } from '../../../lib/kept';
import type { Draft } from '../typing/draft';

const keptSchema = z.object({
  candidateSet: z.int(),
  exposure: exposureSchema.nullable(),
  cells: z.array(z.tuple([z.string(), z.array(z.string())])),
  reason: z.string(),
  base: z.int(),
});

/** The place of a draft in this browser's memory; the person's own, so that nobody else finds it there. */
const keyOf = (personId: string, caseId: string, target: string) => `draft.${personId}.${caseId}.${target}`;

export function rememberDraft(personId: string, caseId: string, target: string, draft: Draft | null): void {
  const key = keyOf(personId, caseId, target);
  if (draft) keep(key, { ...draft, cells: [...draft.cells] });
  else forget(key);
}

export function recallDraft(personId: string, caseId: string, target: string): Draft | null {
  const read = keptSchema.safeParse(kept(keyOf(personId, caseId, target)));
  return read.success ? { ...read.data, cells: new Map(read.data.cells) } : null;
}
