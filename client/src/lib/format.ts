/**
 * Dates and times for people, in one place and in one time zone: the person's own. Moments are ISO 8601 in UTC, days
 * are YYYY-MM-DD and belong to no time zone.
 */
type Parts = Record<'weekday' | 'day' | 'month' | 'year' | 'hour' | 'minute', string>;

const cache = new Map<string, Intl.DateTimeFormat>();

function partsOf(moment: Date, timeZone: string): Parts {
  let format = cache.get(timeZone);
  if (!format) {
    format = new Intl.DateTimeFormat('en-GB', {
      timeZone,
      weekday: 'long',
      day: 'numeric',
      month: 'long',
      year: 'numeric',
      hour: '2-digit',
      minute: '2-digit',
      hourCycle: 'h23',
    });
    cache.set(timeZone, format);
  }
  const entries = format.formatToParts(moment).map((part) => [part.type, part.value] as const);
  return Object.fromEntries(entries) as Parts;
}

const short = (word: string) => word.slice(0, 3);

function withYear(parts: Parts, today: Date, timeZone: string): string {
  const text = `${parts.day} ${short(parts.month)}`;
  return partsOf(today, timeZone).year === parts.year ? text : `${text} ${parts.year}`;
}

export interface Format {
  timeZone: string;
  /** "10 Dec", with the year when it is not this one. */
  day: (moment: string) => string;
  /** "Thu 10 Dec". */
  weekday: (moment: string) => string;
  /** "Thu 10 Dec, 14:00". */
  moment: (moment: string) => string;
  /** "Thursday 10 December, 14:00". */
  longMoment: (moment: string) => string;
  /** "14:02". */
  time: (moment: string) => string;
  /** A calendar day, YYYY-MM-DD, as "10 Dec 2026". */
  date: (day: string) => string;
  /** For a datetime-local field. */
  toField: (moment: string) => string;
  /** From a datetime-local field; null when it is not a date. */
  fromField: (text: string) => string | null;
  /** Today's calendar day, YYYY-MM-DD. */
  today: () => string;
}

/** The formats of one time zone. `now` is there for tests. */
export function formatIn(timeZone: string, now: () => Date = () => new Date()): Format {
  const at = (moment: string) => partsOf(new Date(moment), timeZone);
  const format: Format = {
    timeZone,
    day: (moment) => withYear(at(moment), now(), timeZone),
    weekday: (moment) => `${short(at(moment).weekday)} ${format.day(moment)}`,
    moment: (moment) => `${format.weekday(moment)}, ${format.time(moment)}`,
    longMoment: (moment) => {
      const parts = at(moment);
      return `${parts.weekday} ${parts.day} ${parts.month}, ${parts.hour}:${parts.minute}`;
    },
    time: (moment) => `${at(moment).hour}:${at(moment).minute}`,
    date: (day) => {
      const parts = partsOf(new Date(`${day}T12:00:00Z`), 'UTC');
      return `${parts.day} ${short(parts.month)} ${parts.year}`;
    },
    toField: (moment) => fieldText(new Date(moment), timeZone),
    fromField: (text) => fromFieldText(text, timeZone),
    today: () => fieldText(now(), timeZone).slice(0, 10),
  };
  return format;
}

function fieldText(moment: Date, timeZone: string): string {
  // The clock there, read as if it were UTC, is the moment shifted by that zone's offset.
  return new Date(clockThere(moment, timeZone)).toISOString().slice(0, 16);
}

function clockThere(moment: Date, timeZone: string): number {
  const parts = new Intl.DateTimeFormat('en-CA', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).formatToParts(moment);
  const part = (type: string) => Number(parts.find((one) => one.type === type)?.value);
  return Date.UTC(part('year'), part('month') - 1, part('day'), part('hour'), part('minute'));
}

function fromFieldText(text: string, timeZone: string): string | null {
  const wanted = Date.parse(`${text}:00Z`);
  if (!/^\d{4}-\d\d-\d\dT\d\d:\d\d$/.test(text) || Number.isNaN(wanted)) return null;
  // Twice, because the offset of the first guess may be the one from before a change of the clocks.
  let guess = wanted;
  for (let turn = 0; turn < 2; turn += 1) guess += wanted - clockThere(new Date(guess), timeZone);
  return new Date(guess).toISOString();
}
