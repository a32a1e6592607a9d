import { Injectable } from '@nestjs/common';
import type { TodayItem } from '@weighhouse/shared/contracts/today';
import type { Actor } from '../platform/http/actor.js';
import type { OwnCase } from './own-case.js';
import { WaitingActions } from './waiting-actions.js';
import { WaitingReferrals } from './waiting-referrals.js';
import { WaitingRounds } from './waiting-rounds.js';
import { WaitingTelling } from './waiting-telling.js';

/** Everything that waits for a person. */
@Injectable()
export class Waiting {
  constructor(
    private readonly referrals: WaitingReferrals,
    private readonly rounds: WaitingRounds,
    private readonly actions: WaitingActions,
    private readonly telling: WaitingTelling,
  ) {}

  /** @returns what has waited longest first */
  async read(actor: Actor, own: readonly OwnCase[]): Promise<TodayItem[]> {
    const items = [
      ...(await this.referrals.read(actor, own)),
      ...(await this.rounds.read(actor, own)),
      ...(await this.actions.read(actor, own)),
      ...(await this.telling.read(actor, own)),
    ];
    return items.sort((one, other) => one.waitsSince.localeCompare(other.waitsSince));
  }
}
