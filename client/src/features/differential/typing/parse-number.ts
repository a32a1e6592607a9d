/** What somebody typed where a number out of 100 is asked for. */
export type TypedNumber =
  { kind: 'blank' } | { kind: 'number'; value: number } | { kind: 'fault'; message: string };

/** The bounds and the one decimal are those of the contract (judgements.ts): 0 and 100 would be a veto. */
const lowest = 0.1;
const highest = 99.9;

/**
 * Reads a number out of 100 as people type it: "12", "12.5", "12,5", with spaces or a percent sign around it.
 * Anything that cannot be saved is a fault with the way out, never silently another number.
 */
export function parseOutOf100(text: string): TypedNumber {
  const typed = text.trim().replace(/\s*%$/, '').replace(',', '.');
  if (typed === '') return { kind: 'blank' };
  if (!/^\d{1,3}(\.\d*)?$|^\.\d+$/.test(typed))
    return { kind: 'fault', message: 'must be a number out of 100, such as 12 or 12.5' };
  const value = Number(typed);
  if (value < lowest) return { kind: 'fault', message: 'must be 0.1 or more: nothing is impossible' };
  if (value > highest) return { kind: 'fault', message: 'must be 99.9 or less: nothing is certain' };
  if (!isTenths(value)) return { kind: 'fault', message: 'must have at most one decimal' };
  return { kind: 'number', value };
}

function isTenths(value: number): boolean {
  return Math.abs(value * 10 - Math.round(value * 10)) < 1e-9;
}

/** A saved number as the field shows it. */
export function numberText(value: number): string {
  return String(Math.round(value * 10) / 10);
}
