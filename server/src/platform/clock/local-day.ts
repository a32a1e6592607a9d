/**
 * The calendar day of a moment in a time zone of the IANA database.
 * @returns YYYY-MM-DD
 * @example localDay(new Date('2026-12-31T23:30:00Z'), 'Europe/Berlin') is 2027-01-01
 */
export function localDay(moment: Date, timeZone: string): string {
  const format = new Intl.DateTimeFormat('en', {
    timeZone,
    calendar: 'gregory',
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  });
  const parts = new Map(format.formatToParts(moment).map((part) => [part.type, part.value]));
  return [parts.get('year'), parts.get('month'), parts.get('day')].join('-');
}
