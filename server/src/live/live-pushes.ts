import { Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { OnEvent } from '@nestjs/event-emitter';
import type { Part } from '@weighhouse/shared/contracts/cases';
import { liveEvents } from '@weighhouse/shared/contracts/live';
import { StandingService } from '../differential/pool/standing.service.js';
import { viewOf } from '../differential/view/view-of.js';
import { Clock } from '../platform/clock/clock.js';
import { AccessChangedEvent, CaseChangedEvent } from '../platform/events/case-events.js';
import { type Audience, Audiences } from './audience.js';
import { LiveHandshake } from './handshake.js';
import { type Hearing, hearingOf, hears, hearsStanding, movesStanding } from './hearing.js';
import { InOrder } from './in-order.js';
import { LiveRooms } from './live-rooms.js';
import type { LiveSocket } from './live-socket.js';

const sessionAgeMs = 60_000;

/** Tells open pages what was committed: ids and the revision, and the standing to those who may see it. */
@Injectable()
export class LivePushes implements OnModuleDestroy {
  private readonly log = new Logger('Live');
  private readonly order = new InOrder();
  private closing = false;

  constructor(
    private readonly rooms: LiveRooms,
    private readonly audiences: Audiences,
    private readonly standings: StandingService,
    private readonly handshake: LiveHandshake,
    private readonly clock: Clock,
  ) {}

  onModuleDestroy(): void {
    this.closing = true;
  }

  @OnEvent(CaseChangedEvent.eventName)
  async changed(event: CaseChangedEvent): Promise<void> {
    if (this.closing) return;
    await this.order.run(event.caseId, () => this.push(event));
  }

  /** Throws out whoever is no longer let in, at once. */
  @OnEvent(AccessChangedEvent.eventName)
  async accessChanged({ personId, sessionId, caseId }: AccessChangedEvent): Promise<void> {
    const sockets = this.rooms.ofPerson(personId);
    if (caseId !== null) {
      const audience = await this.audiences.of(caseId);
      for (const socket of sockets) {
        if (this.rooms.watchedBy(socket).includes(caseId)) await this.place(socket, caseId, audience);
      }
      this.rooms.tellPresent(caseId);
      return;
    }
    for (const socket of sockets) {
      if (sessionId === null || socket.data.actor.sessionId === sessionId) socket.disconnect(true);
    }
  }

  private async push({ caseId, revision, what }: CaseChangedEvent): Promise<void> {
    const heard = await this.listening(caseId);
    if (!heard) return;
    const { listening, seeing, sealed } = heard;
    const current = movesStanding(what) && seeing.length > 0 ? await this.standings.current(caseId) : null;
    // The standing first: it moves the screen, the rest makes it fetch.
    if (current)
      for (const { socket } of seeing) socket.emit(liveEvents.standing, { caseId, ...current.standing });
    for (const { socket, hearing } of listening) {
      if (hears(hearing, what, sealed)) socket.emit(liveEvents.changed, { caseId, revision, what });
    }
    if (current?.follows) this.follow(caseId, current.standing.revision);
  }

  /** Sends the rest when it is computed; nothing waits for it, and what is overtaken meanwhile is not sent. */
  private follow(caseId: string, revision: number): void {
    this.standings
      .currentAssessment(caseId)
      .then((current) =>
        this.order.run(caseId, async () => {
          const heard = current?.revision === revision ? await this.listening(caseId) : null;
          if (!current || heard?.revision !== revision) return;
          const { candidateSet, assessments } = current;
          for (const { socket, parts } of heard.seeing) {
            const assessment = assessments[viewOf(parts)];
            socket.emit(liveEvents.assessment, { caseId, revision, candidateSet, assessment });
          }
        }),
      )
      .catch((error: unknown) => {
        if (!this.closing)
          this.log.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
      });
  }

  /** Who has the case open now, what each hears of it, and who of them may see the pool. */
  private async listening(caseId: string) {
    const sockets = this.rooms.watching(caseId);
    const audience = sockets.length > 0 ? await this.audiences.of(caseId) : null;
    if (!audience) return null;
    const listening: { socket: LiveSocket; hearing: Hearing; parts: readonly Part[] }[] = [];
    for (const socket of sockets) {
      if (!(await this.stillIn(socket))) continue;
      const { parts } = audience.subjectFor(socket.data.actor);
      listening.push({ socket, hearing: await this.place(socket, caseId, audience), parts });
    }
    const seeing = listening.filter(({ socket: { data }, hearing }) =>
      hearsStanding(data.actor, audience.subjectFor(data.actor), hearing),
    );
    return { listening, seeing, sealed: audience.sealed, revision: audience.revision };
  }

  private async place(socket: LiveSocket, caseId: string, audience: Audience | null): Promise<Hearing> {
    const { actor } = socket.data;
    const hearing = audience && hearingOf(actor, audience.subjectFor(actor));
    await this.rooms.place(socket, caseId, hearing);
    return hearing;
  }

  /** Sessions also end by time, which nobody announces, so they are looked up again now and then. */
  private async stillIn(socket: LiveSocket): Promise<boolean> {
    const now = this.clock.now().getTime();
    if (now - socket.data.checkedAt < sessionAgeMs) return true;
    const actor = await this.handshake.stillIn(socket.data.actor);
    if (actor) socket.data = { actor, checkedAt: now };
    else socket.disconnect(true);
    return actor !== null;
  }
}
