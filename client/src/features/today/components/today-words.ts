import type { TodayItem, TodayKind } from '@weighhouse/shared/contracts/today';
import { capital, counted, numberWord } from '../../../lib/words';

interface Section {
  id: string;
  head: string;
  /** The verb of its buttons. */
  verb: string;
  takes: (item: TodayItem) => boolean;
}

const of = (kind: TodayKind, head: string, verb: string): Section => ({
  id: kind,
  head,
  verb,
  takes: (item) => item.kind === kind,
});
const sealed = (item: TodayItem) => item.sealedRows !== null;

/** The sections of what waits, in the order they are shown; every item belongs to exactly one. */
export const sections: Section[] = [
  {
    id: 'judge-sealed',
    head: 'Judge before discussion',
    verb: 'Judge now',
    takes: (item) => item.kind === 'judge' && sealed(item),
  },
  {
    id: 'judge-live',
    head: 'Judge in a live round',
    verb: 'Judge now',
    takes: (item) => item.kind === 'judge' && !sealed(item),
  },
  of('answer', 'Questions to you', 'Answer'),
  of('review', 'New referrals', 'Review'),
  of('unseal', 'Rounds that can be unsealed', 'Unseal'),
  of('stance', 'Plans that ask for your agreement', 'Agree or dissent'),
  of('approve', 'Summaries to approve', 'Read and approve'),
  of('tell', 'Patients to tell', 'Tell'),
  of('act', 'Actions you agreed to', 'Report result'),
  of('draft', 'Referrals you have begun', 'Go on writing'),
];

/** "Four things wait for you". */
export function todayTitle(count: number): string {
  if (count === 0) return 'Nothing waits for you';
  return count === 1 ? 'One thing waits for you' : `${capital(numberWord(count))} things wait for you`;
}

const day = 86_400_000;

/** "The oldest has waited six days."; null while nothing has waited for a day. */
export function oldestLine(items: readonly TodayItem[], now: string): string | null {
  const oldest = Math.min(...items.map((item) => Date.parse(item.waitsSince)));
  const days = Math.floor((Date.parse(now) - oldest) / day);
  if (!Number.isFinite(days) || days < 1) return null;
  const subject = items.length === 1 ? 'It' : 'The oldest';
  return `${subject} has waited ${days === 1 ? 'one day' : `${numberWord(days)} days`}.`;
}

/** "due 27 Nov, 4 days late"; `due` is a calendar day, `today` too. */
export function dueLine(due: string, today: string, shown: string): string {
  const late = Math.round((Date.parse(today) - Date.parse(due)) / day);
  if (late > 0) return `due ${shown}, ${counted(late, 'day')} late`;
  return late === 0 ? 'due today' : `due ${shown}`;
}
