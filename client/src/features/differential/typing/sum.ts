import { counted } from '../../../lib/words';
import { numberText, parseOutOf100 } from './parse-number';

/** How far shares that must sum to 100 have come. Counted in tenths, so that 33.3 + 33.3 + 33.4 is 100. */
export interface Shares {
  /** One entry for each text, null where it is blank or not a number. */
  values: (number | null)[];
  faults: { index: number; message: string }[];
  blanks: number;
  /** 100 less what was given so far; below zero where it is too much. */
  rest: number;
  complete: boolean;
}

export function readShares(texts: readonly string[]): Shares {
  const typed = texts.map(parseOutOf100);
  const values = typed.map((one) => (one.kind === 'number' ? one.value : null));
  const faults = typed.flatMap((one, index) =>
    one.kind === 'fault' ? [{ index, message: one.message }] : [],
  );
  const tenths = values.reduce<number>((sum, value) => sum + Math.round((value ?? 0) * 10), 0);
  const blanks = typed.filter((one) => one.kind === 'blank').length;
  const rest = (1000 - tenths) / 10;
  return { values, faults, blanks, rest, complete: blanks === 0 && faults.length === 0 && rest === 0 };
}

/** The rest while typing, in words. */
export function restWords({ rest, blanks }: Pick<Shares, 'rest' | 'blanks'>): string {
  if (rest < 0) return `${numberText(-rest)} too many: the shares must sum to 100`;
  const empty = blanks === 0 ? '' : `, ${counted(blanks, 'share')} still blank`;
  if (rest === 0) return blanks === 0 ? 'All 100 are given' : `Nothing left of 100${empty}`;
  return `${numberText(rest)} of 100 left${empty}`;
}
