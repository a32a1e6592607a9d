import type { Format } from '../../../lib/format';

/** A calendar day as the ledger's narrow lines show it: without the year where it is this one. */
export function dayWords(format: Pick<Format, 'date' | 'today'>): (day: string) => string {
  const thisYear = ` ${format.today().slice(0, 4)}`;
  return (day) => {
    const words = format.date(day);
    return words.endsWith(thisYear) ? words.slice(0, -thisYear.length) : words;
  };
}
