import { describe, expect, it } from 'vitest';
import { formatIn } from './format';

const now = () => new Date('2026-12-01T09:00:00Z');

describe('formatIn', () => {
  const helsinki = formatIn('Europe/Helsinki', now);

  it('shows moments on the clock of the time zone, with the year only when it is another one', () => {
    expect(helsinki.moment('2026-12-10T12:00:00Z')).toBe('Thu 10 Dec, 14:00');
    expect(helsinki.longMoment('2026-12-10T12:00:00Z')).toBe('Thursday 10 December, 14:00');
    expect(helsinki.day('2025-12-31T23:30:00Z')).toBe('1 Jan');
    expect(helsinki.day('2025-12-31T10:30:00Z')).toBe('31 Dec 2025');
  });

  it('shows calendar days as they are written, in any time zone', () => {
    expect(formatIn('Pacific/Auckland', now).date('2026-03-01')).toBe('1 Mar 2026');
    expect(formatIn('America/Los_Angeles', now).date('2026-03-01')).toBe('1 Mar 2026');
  });

  it('brings a field back to the same moment, on both sides of a change of the clocks', () => {
    const zone = formatIn('Europe/Berlin', now);
    for (const moment of ['2026-03-29T00:30:00.000Z', '2026-03-29T01:30:00.000Z', '2026-07-01T12:00:00.000Z'])
      expect(zone.fromField(zone.toField(moment))).toBe(moment);
    expect(zone.toField('2026-07-01T12:00:00.000Z')).toBe('2026-07-01T14:00');
  });

  it('refuses half a date', () => {
    expect(helsinki.fromField('2026-12-10')).toBeNull();
    expect(helsinki.fromField('2026-13-10T10:00')).toBeNull();
    expect(helsinki.fromField('')).toBeNull();
  });

  it('names today by the clock there', () => {
    expect(formatIn('Pacific/Auckland', () => new Date('2026-12-01T13:00:00Z')).today()).toBe('2026-12-02');
  });
});
