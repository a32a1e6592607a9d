import { Injectable } from '@nestjs/common';
import type { Urgency } from '@weighhouse/shared/contracts/cases';
import type { TodayItem } from '@weighhouse/shared/contracts/today';
import { CaseDirectory } from '../cases/case-directory.js';
import type { Actor } from '../platform/http/actor.js';
import type { CaseFile, OwnCase } from './own-case.js';
import { questionOf, todayItem } from './today-item.js';

const urgencyWords: Record<Urgency, string> = {
  withinWeek: 'an answer is wanted within a week',
  withinTwoWeeks: 'an answer is wanted within two weeks',
  withinMonth: 'an answer is wanted within a month',
  noFixedTime: 'no fixed time',
};

/** Referrals that wait: one's own to be finished or answered, and for chairs those that nobody has taken. */
@Injectable()
export class WaitingReferrals {
  constructor(private readonly cases: CaseDirectory) {}

  async read(actor: Actor, own: readonly OwnCase[]): Promise<TodayItem[]> {
    const mine = own
      .filter(({ parts }) => parts.includes('referrer'))
      .flatMap(({ file }) => ofReferrer(file));
    const submitted = actor.roles.includes('chair') ? await this.cases.waitingForChair() : [];
    return [...mine, ...submitted.map(toReview)];
  }
}

function ofReferrer(file: CaseFile): TodayItem[] {
  const path = `/cases/${file.id}/edit`;
  const title = questionOf(file);
  if (file.state === 'draft')
    return [
      todayItem(file, {
        kind: 'draft',
        title,
        detail: 'Your draft of a referral',
        path,
        since: file.createdAt,
      }),
    ];
  if (file.state !== 'returned') return [];
  const detail = `Returned with a question: ${file.lastWords ?? ''}`;
  return [
    todayItem(file, { kind: 'answer', title, detail, path, since: file.lastWordsAt ?? file.updatedAt }),
  ];
}

function toReview(file: CaseFile): TodayItem {
  const urgency = file.urgency === null ? '' : `; ${urgencyWords[file.urgency]}`;
  return todayItem(file, {
    kind: 'review',
    title: questionOf(file),
    detail: `Submitted, no chair yet${urgency}`,
    path: `/cases/${file.id}`,
    since: file.submittedAt ?? file.updatedAt,
  });
}
