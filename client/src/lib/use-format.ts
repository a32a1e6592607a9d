import { createContext, use, useMemo } from 'react';
import { type Format, formatIn } from './format';

/** The signed-in person's time zone; set by the shell. */
export const TimeZoneContext = createContext('UTC');

/** Dates and times as this person reads them. */
export function useFormat(): Format {
  const timeZone = use(TimeZoneContext);
  return useMemo(() => formatIn(timeZone), [timeZone]);
}
