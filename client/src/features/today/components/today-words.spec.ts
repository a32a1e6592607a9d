import { type TodayItem, todayKindSchema } from '@weighhouse/shared/contracts/today';
import { describe, expect, it } from 'vitest';
import { dueLine, oldestLine, sections, todayTitle } from './today-words';

const waiting = (since: string) => ({ waitsSince: since }) as TodayItem;

describe('today', () => {
  it('has exactly one section for everything that can wait', () => {
    for (const kind of todayKindSchema.options)
      for (const sealedRows of [null, 0, 9]) {
        const item = { kind, sealedRows } as TodayItem;
        expect(sections.filter((section) => section.takes(item))).toHaveLength(1);
      }
  });

  it('says what is so', () => {
    expect(todayTitle(0)).toBe('Nothing waits for you');
    expect(todayTitle(1)).toBe('One thing waits for you');
    expect(todayTitle(4)).toBe('Four things wait for you');
    expect(todayTitle(14)).toBe('14 things wait for you');
  });

  it('tells how long the oldest has waited, from one day on', () => {
    const now = '2026-12-07T10:00:00Z';
    expect(oldestLine([waiting('2026-12-01T09:00:00Z'), waiting('2026-12-05T09:00:00Z')], now)).toBe(
      'The oldest has waited six days.',
    );
    expect(oldestLine([waiting('2026-12-06T09:00:00Z')], now)).toBe('It has waited one day.');
    expect(oldestLine([waiting('2026-12-07T09:00:00Z')], now)).toBeNull();
    expect(oldestLine([], now)).toBeNull();
  });

  it('counts lateness in calendar days', () => {
    expect(dueLine('2026-11-27', '2026-12-01', '27 Nov')).toBe('due 27 Nov, 4 days late');
    expect(dueLine('2026-12-01', '2026-12-01', '1 Dec')).toBe('due today');
    expect(dueLine('2026-12-03', '2026-12-01', '3 Dec')).toBe('due 3 Dec');
  });
});
