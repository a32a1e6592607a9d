import { Injectable } from '@nestjs/common';
import type { TodayItem } from '@weighhouse/shared/contracts/today';
import { type TeamEntry, TeamReader } from '../cases/team-reader.js';
import { type HandInFact, RoundReader } from '../differential/rounds/round-reader.js';
import { DifferentialService } from '../differential/view/differential.service.js';
import { Clock } from '../platform/clock/clock.js';
import type { Actor } from '../platform/http/actor.js';
import { isSealed, type OwnCase } from './own-case.js';
import { questionOf, todayItem } from './today-item.js';
import { roundWords } from './round-words.js';

/** Two who are in are enough once the deadline is past. */
const fewestAfterDeadline = 2;

interface OpenRound {
  openedAt: Date;
  deadline: Date | null;
  handIns: HandInFact[];
  team: TeamEntry[];
}

/** Open rounds: to judge for contributors, to unseal for the chair. */
@Injectable()
export class WaitingRounds {
  constructor(
    private readonly rounds: RoundReader,
    private readonly team: TeamReader,
    private readonly differentials: DifferentialService,
    private readonly clock: Clock,
  ) {}

  async read(actor: Actor, own: readonly OwnCase[]): Promise<TodayItem[]> {
    const judging = own.filter(({ file }) => file.state === 'judging' && file.roundOpen);
    const items: TodayItem[] = [];
    for (const one of judging) {
      const round = await this.openRound(one);
      if (!round) continue;
      if (one.parts.includes('contributor') && !round.handIns.some(({ personId }) => personId === actor.id))
        items.push(await this.toJudge(actor, one, round));
      if (one.parts.includes('chair') && isSealed(one.file)) items.push(...this.toUnseal(one, round));
    }
    return items;
  }

  private async openRound({ file }: OwnCase): Promise<OpenRound | null> {
    const round = await this.rounds.openOf(file.id);
    if (!round) return null;
    const { openedAt, deadline } = round;
    return {
      openedAt,
      deadline,
      handIns: await this.rounds.handIns([round]),
      team: await this.team.current(file.id),
    };
  }

  private async toJudge(actor: Actor, { file }: OwnCase, round: OpenRound): Promise<TodayItem> {
    return todayItem(
      file,
      {
        kind: 'judge',
        title: questionOf(file),
        detail: roundWords(file, round.team),
        path: `/cases/${file.id}/differential`,
        since: round.openedAt,
      },
      {
        dueOn: round.deadline?.toISOString() ?? null,
        late: round.deadline !== null && round.deadline.getTime() < this.clock.now().getTime(),
        sealedRows: isSealed(file) ? await this.rowsLeft(actor, file.id) : null,
      },
    );
  }

  /** How many findings one has not judged yet. */
  private async rowsLeft(actor: Actor, caseId: string): Promise<number> {
    const { findings, mine } = await this.differentials.read(actor, caseId);
    const judged = new Set(mine?.findings.map(({ findingId }) => findingId));
    return findings.filter(({ id, enteredInError }) => enteredInError === null && !judged.has(id)).length;
  }

  private toUnseal({ file }: OwnCase, { deadline, handIns, team }: OpenRound): TodayItem[] {
    const contributors = new Set(
      team.filter(({ part }) => part === 'contributor').map(({ personId }) => personId),
    );
    const counting = handIns.filter(({ personId }) => contributors.has(personId));
    const quorumIn = counting[file.quorum - 1]?.handedInAt;
    const isPast = deadline !== null && deadline.getTime() <= this.clock.now().getTime();
    const since = quorumIn ?? (isPast && counting.length >= fewestAfterDeadline ? deadline : null);
    if (since === null) return [];
    const why = quorumIn ? 'The quorum is in' : 'The deadline is past';
    const path = `/cases/${file.id}/differential`;
    const detail = `${why}: ${roundWords(file, team)}`;
    return [todayItem(file, { kind: 'unseal', title: questionOf(file), detail, path, since })];
  }
}
