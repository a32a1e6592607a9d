import { describe, expect, it } from 'vitest';
import { localDay } from './local-day.js';

describe('localDay', () => {
  it.each([
    ['2026-12-31T23:30:00Z', 'UTC', '2026-12-31'],
    ['2026-12-31T23:30:00Z', 'Europe/Berlin', '2027-01-01'],
    ['2027-01-01T03:00:00Z', 'America/New_York', '2026-12-31'],
    ['2026-03-05T12:00:00Z', 'Asia/Bangkok', '2026-03-05'],
  ])('of %s in %s is %s', (moment, zone, day) => {
    expect(localDay(new Date(moment), zone)).toBe(day);
  });
});
