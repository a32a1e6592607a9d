import { Inject, Injectable } from '@nestjs/common';
import type { Today } from '@weighhouse/shared/contracts/today';
import { CaseDirectory } from '../cases/case-directory.js';
import { TeamReader } from '../cases/team-reader.js';
import { Clock } from '../platform/clock/clock.js';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import type { Actor } from '../platform/http/actor.js';
import { closedThisMonth, nextConference, sitsOn, sitting } from './sitting.js';
import { Waiting } from './waiting.js';

/** What waits for a person, and the cases they sit on. Everything is asked for by the person's own parts. */
@Injectable()
export class TodayService {
  constructor(
    private readonly cases: CaseDirectory,
    private readonly team: TeamReader,
    private readonly waiting: Waiting,
    private readonly clock: Clock,
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
  ) {}

  async read(actor: Actor): Promise<Today> {
    const own = await this.cases.ofPerson(actor.id);
    const now = this.clock.now();
    const files = sitsOn(own);
    return {
      now: now.toISOString(),
      waiting: await this.waiting.read(actor, own),
      cases: sitting(files, await this.team.currentOf(files.map((file) => file.id))),
      closedThisMonth: closedThisMonth(own, now, this.configuration.TIME_ZONE),
      nextConference: nextConference(files, now),
    };
  }
}
