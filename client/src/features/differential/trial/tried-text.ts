import { numberText, parseOutOf100 } from '../typing/parse-number';

/**
 * The text of a field whose number is tried. What was typed stays as typed while it says the same number, or none
 * yet; when the number is changed elsewhere (the change is taken back in the list), the field follows.
 * @param current out of 100; null is blank
 */
export function triedText(typed: string | undefined, current: number | null): string {
  const shown = current === null ? '' : numberText(current);
  if (typed === undefined) return shown;
  const read = parseOutOf100(typed);
  if (read.kind === 'fault') return typed;
  return (read.kind === 'blank' ? null : read.value) === current ? typed : shown;
}
