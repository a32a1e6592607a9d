import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { z } from 'zod';
import { capital } from '../lib/words';

/** The id of the control for a path of the contract, so that a fault can link to it. */
export function fieldId(path: string): string {
  return `field-${path.replaceAll(/[^A-Za-z0-9]+/g, '-')}`;
}

/** The faults at a path or below it, as a sentence. */
export function faultOf(faults: readonly FieldFault[] | undefined, path: string): string | null {
  const mine = (faults ?? []).filter(
    ({ path: at }) => at === path || at.startsWith(`${path}.`) || at.startsWith(`${path}[`),
  );
  if (mine.length === 0) return null;
  const messages = [...new Set(mine.map((fault) => fault.message))];
  return capital(`${messages.join('; ')}.`);
}

/** The same check that the server makes, made before sending. */
export function faultsIn(schema: z.ZodType, value: unknown): FieldFault[] {
  const parsed = schema.safeParse(value);
  if (parsed.success) return [];
  return parsed.error.issues.map((issue) => ({
    path: issue.path.map(String).join('.'),
    message: issue.message,
  }));
}
