import type { TodayItem, TodayKind } from '@weighhouse/shared/contracts/today';
import { capital, counted, numberWord } from '../../../lib/words';

/** Each kind of waiting thing: its section's head and the verb of its button. In the order they are shown. */
export const kinds: { kind: TodayKind; head: string; verb: string }[] = [
  { kind: 'judge', head: 'Judge before discussion', verb: 'Judge now' },
  { kind: 'answer', head: 'Questions to you', verb: 'Answer' },
  { kind: 'review', head: 'New referrals', verb: 'Review' },
  { kind: 'unseal', head: 'Rounds that can be unsealed', verb: 'Unseal' },
  { kind: 'stance', head: 'Plans that ask for your agreement', verb: 'Agree or dissent' },
  { kind: 'approve', head: 'Summaries to approve', verb: 'Read and approve' },
  { kind: 'tell', head: 'Patients to tell', verb: 'Tell' },
  { kind: 'act', head: 'Actions you agreed to', verb: 'Report result' },
  { kind: 'draft', head: 'Referrals you have begun', verb: 'Go on writing' },
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
