import type { TodayItem } from '@weighhouse/shared/contracts/today';
import type { CaseFile } from './own-case.js';

type Said = Pick<TodayItem, 'kind' | 'title' | 'detail' | 'path'> & { since: Date };

/** Something that waits for a person, without what only some kinds have. */
export function todayItem(
  file: Pick<CaseFile, 'id' | 'number'>,
  { since, ...said }: Said,
  more: Partial<Pick<TodayItem, 'dueOn' | 'late' | 'sealedRows'>> = {},
): TodayItem {
  return {
    ...said,
    caseId: file.id,
    number: file.number,
    waitsSince: since.toISOString(),
    dueOn: null,
    late: false,
    sealedRows: null,
    ...more,
  };
}

/** The calendar day of a moment, YYYY-MM-DD, where the service's dates are shown. */
export const dayIn = (moment: Date, timeZone: string): string =>
  new Intl.DateTimeFormat('en-CA', { timeZone, year: 'numeric', month: '2-digit', day: '2-digit' }).format(
    moment,
  );

/** What a referral is called before its question is written. */
export const questionOf = (file: Pick<CaseFile, 'question'>): string =>
  file.question === '' ? 'A referral without a question yet' : file.question;
