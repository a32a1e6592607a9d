import { Inject, Injectable } from '@nestjs/common';
import type { TodayItem } from '@weighhouse/shared/contracts/today';
import { CaseDirectory } from '../cases/case-directory.js';
import { Clock } from '../platform/clock/clock.js';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import type { Actor } from '../platform/http/actor.js';
import { type OpenAction, WaitingPlans } from '../plans/waiting-plans.js';
import { type CaseFile, type OwnCase, seesCase } from './own-case.js';
import { dayIn, questionOf, todayItem } from './today-item.js';

/** What plans ask of a person: to agree or dissent, and to act. */
@Injectable()
export class WaitingActions {
  constructor(
    private readonly plans: WaitingPlans,
    private readonly cases: CaseDirectory,
    private readonly clock: Clock,
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
  ) {}

  async read(actor: Actor, own: readonly OwnCase[]): Promise<TodayItem[]> {
    const questions = await this.plans.questionsTo(actor.id);
    const actions = await this.plans.actionsOf(actor.id);
    // Owners keep their actions when they have left the team.
    const files = await this.cases.byIds(actions.map(({ caseId }) => caseId));
    const stances = questions.flatMap(({ caseId, since }) => {
      const file = own.find((one) => one.file.id === caseId && one.parts.includes('contributor'))?.file;
      return file && ['accepted', 'judging'].includes(file.state) ? [toAnswer(file, since)] : [];
    });
    const acts = actions.flatMap((action) => {
      const file = files.get(action.caseId);
      return file ? [this.toDo(file, own, action)] : [];
    });
    return [...stances, ...acts];
  }

  private toDo(file: CaseFile, own: readonly OwnCase[], { what, due, since }: OpenAction): TodayItem {
    const today = dayIn(this.clock.now(), this.configuration.TIME_ZONE);
    const seat = own.find((one) => one.file.id === file.id);
    const asLiaison = seat !== undefined && !seesCase(seat);
    return todayItem(
      file,
      {
        kind: 'act',
        title: asLiaison ? 'An action of the plan is yours' : what,
        detail: seat && mayOpen(seat) ? `Your action: ${questionOf(file)}` : 'Your action',
        path: asLiaison ? `/tell/${file.id}` : `/cases/${file.id}/plan`,
        since,
      },
      { dueOn: due, late: due !== null && due < today },
    );
  }
}

/** Owners keep their actions when the case is withdrawn, and it is open to its referrer alone then. */
const mayOpen = (seat: OwnCase): boolean =>
  seesCase(seat) && (seat.file.state !== 'withdrawn' || seat.parts.includes('referrer'));

const toAnswer = (file: CaseFile, since: Date): TodayItem =>
  todayItem(file, {
    kind: 'stance',
    title: questionOf(file),
    detail: 'The chair asks whether you agree with the plan',
    path: `/cases/${file.id}/plan`,
    since,
  });
