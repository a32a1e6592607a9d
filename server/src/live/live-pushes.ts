import { Injectable } from '@nestjs/common';
import { OnEvent } from '@nestjs/event-emitter';
import { liveEvents } from '@weighhouse/shared/contracts/live';
import { StandingService } from '../differential/pool/standing.service.js';
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
export class LivePushes {
  private readonly order = new InOrder();

  constructor(
    private readonly rooms: LiveRooms,
    private readonly audiences: Audiences,
    private readonly standings: StandingService,
    private readonly handshake: LiveHandshake,
    private readonly clock: Clock,
  ) {}

  @OnEvent(CaseChangedEvent.eventName)
  changed(event: CaseChangedEvent): Promise<void> {
    return this.order.run(event.caseId, () => this.push(event));
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
    const sockets = this.rooms.watching(caseId);
    if (sockets.length === 0) return;
    const audience = await this.audiences.of(caseId);
    if (!audience) return;
    const listening: { socket: LiveSocket; hearing: Hearing }[] = [];
    for (const socket of sockets) {
      if (!(await this.stillIn(socket))) continue;
      listening.push({ socket, hearing: await this.place(socket, caseId, audience) });
    }
    const seeing = listening.filter(({ socket: { data }, hearing }) =>
      hearsStanding(data.actor, audience.subjectFor(data.actor), hearing),
    );
    if (movesStanding(what) && seeing.length > 0) {
      const standing = await this.standings.current(caseId);
      // The standing first: it moves the screen, the rest makes it fetch.
      if (standing)
        for (const { socket } of seeing) socket.emit(liveEvents.standing, { caseId, ...standing });
    }
    for (const { socket, hearing } of listening) {
      if (hears(hearing, what, audience.sealed)) socket.emit(liveEvents.changed, { caseId, revision, what });
    }
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
