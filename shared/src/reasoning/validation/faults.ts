import type { Fault } from './panel-refused.js';

/** Collects faults while a panel is read, so that one reading names all of them. */
export class Faults {
  readonly found: Fault[] = [];

  add(path: string, message: string): void {
    this.found.push({ path, message });
  }
}

/** A key as a step of a path: `.f1`, or `["any text"]` where a dot would be ambiguous. */
export function pathStep(key: string): string {
  return /^[\w-]+$/.test(key) ? `.${key}` : `[${JSON.stringify(key)}]`;
}
