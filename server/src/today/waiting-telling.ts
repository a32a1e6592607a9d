import { Injectable } from '@nestjs/common';
import type { TellList } from '@weighhouse/shared/contracts/summaries';
import type { TodayItem } from '@weighhouse/shared/contracts/today';
import type { Actor } from '../platform/http/actor.js';
import { TellListService } from '../summaries/tell-list.service.js';
import { WaitingSummaries } from '../summaries/waiting-summaries.js';
import type { OwnCase } from './own-case.js';
import { questionOf, todayItem } from './today-item.js';

/** Summaries: to write and to tell for the liaison, to approve for the chair. */
@Injectable()
export class WaitingTelling {
  constructor(
    private readonly telling: TellListService,
    private readonly summaries: WaitingSummaries,
  ) {}

  async read(actor: Actor, own: readonly OwnCase[]): Promise<TodayItem[]> {
    const { items } = await this.telling.list(actor);
    const chaired = new Map(
      own.filter(({ parts }) => parts.includes('chair')).map(({ file }) => [file.id, file]),
    );
    const waiting = await this.summaries.toApprove([...chaired.keys()]);
    const toApprove = waiting.flatMap(({ caseId, since }) => {
      const file = chaired.get(caseId);
      if (!file || !['concluded', 'outcomeKnown'].includes(file.state)) return [];
      const detail = 'The summary for the patient waits for your approval';
      const path = `/cases/${file.id}/summary`;
      return [todayItem(file, { kind: 'approve', title: questionOf(file), detail, path, since })];
    });
    return [...items.flatMap(toTell), ...toApprove];
  }
}

/** For a liaison never a clinical word: a number and how far it is. */
function toTell({ caseId, number, state, hasPlan, since, attempts }: TellList['items'][number]): TodayItem[] {
  if (!hasPlan || (state !== 'draft' && state !== 'approved')) return [];
  const tries = attempts === 0 ? 'no contact yet' : `contacts so far: ${String(attempts)}`;
  const said =
    state === 'approved'
      ? { title: 'Tell the patient', detail: `The summary is approved; ${tries}` }
      : { title: 'Write the summary', detail: 'A plan is signed and is to be told in plain words' };
  const file = { id: caseId, number };
  return [todayItem(file, { kind: 'tell', ...said, path: `/tell/${caseId}`, since: new Date(since) })];
}
