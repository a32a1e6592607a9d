import { StandardSchemaValidationPipe } from '@nestjs/common';
import { invalid } from '../errors/refusal.js';

/** A path as people read it in a form: outOf100[2], actions[0].due. */
export function fieldPath(path: readonly (PropertyKey | { key: PropertyKey })[] | undefined): string {
  return (path ?? []).reduce<string>((text, part) => {
    const key = typeof part === 'object' ? part.key : part;
    if (typeof key === 'number') return `${text}[${String(key)}]`;
    return text === '' ? String(key) : `${text}.${String(key)}`;
  }, '');
}

/** Validates every declared input by its schema and answers all faults at once, with field paths. */
export const validationPipe = (): StandardSchemaValidationPipe =>
  new StandardSchemaValidationPipe({
    exceptionFactory: (issues) =>
      invalid(issues.map((issue) => ({ path: fieldPath(issue.path), message: issue.message }))),
  });
