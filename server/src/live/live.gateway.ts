import { UseFilters } from '@nestjs/common';
import {
  ConnectedSocket,
  MessageBody,
  type OnGatewayConnection,
  type OnGatewayInit,
  SubscribeMessage,
  WebSocketGateway,
} from '@nestjs/websockets';
import { liveEvents, watchSchema } from '@weighhouse/shared/contracts/live';
import { Clock } from '../platform/clock/clock.js';
import { notFound, Refusal } from '../platform/errors/refusal.js';
import { Access } from '../platform/http/access.decorator.js';
import { Audiences } from './audience.js';
import { LiveHandshake } from './handshake.js';
import { hearingOf } from './hearing.js';
import { LiveErrorsFilter } from './live-errors.filter.js';
import { LiveRooms } from './live-rooms.js';
import type { LiveServer, LiveSocket } from './live-socket.js';

const mostCases = 40;

/** Live changes at /live. Nothing is taken in here but which case somebody looks at. */
@WebSocketGateway({ path: '/live', serveClient: false, maxHttpBufferSize: 10_000 })
@UseFilters(LiveErrorsFilter)
// The handshake has decided who it is; what they may watch is decided by the message's first line.
@Access('public')
export class LiveGateway implements OnGatewayInit<LiveServer>, OnGatewayConnection<LiveSocket> {
  constructor(
    private readonly handshake: LiveHandshake,
    private readonly audiences: Audiences,
    private readonly rooms: LiveRooms,
    private readonly clock: Clock,
  ) {}

  afterInit(server: LiveServer): void {
    this.rooms.useServer(server);
    server.use((socket, next) => {
      this.handshake
        .admit(socket.request)
        .then((actor) => {
          socket.data = { actor, checkedAt: this.clock.now().getTime() };
          next();
        })
        .catch((error: unknown) => {
          next(connectError(error));
        });
    });
  }

  handleConnection(socket: LiveSocket): void {
    socket.on('disconnecting', () => {
      const cases = this.rooms.watchedBy(socket);
      // A moment later it is in no room any more.
      setImmediate(() => {
        for (const caseId of cases) this.rooms.tellPresent(caseId);
      });
    });
  }

  /** Joins a case's room. @returns the revision from which on changes are heard */
  @SubscribeMessage(liveEvents.watch)
  async watch(
    @ConnectedSocket() socket: LiveSocket,
    @MessageBody({ schema: watchSchema }) { caseId }: { caseId: string },
  ): Promise<{ caseId: string; revision: number }> {
    const before = await this.audiences.of(caseId);
    const hearing = before && hearingOf(socket.data.actor, before.subjectFor(socket.data.actor));
    if (!before || hearing === null) throw notFound();
    if (this.rooms.watchedBy(socket).length >= mostCases)
      throw new Refusal('too-many', 'Too many cases are open on this page.');
    await this.rooms.place(socket, caseId, hearing);
    this.rooms.tellPresent(caseId);
    return { caseId, revision: before.revision };
  }

  @SubscribeMessage(liveEvents.unwatch)
  async unwatch(
    @ConnectedSocket() socket: LiveSocket,
    @MessageBody({ schema: watchSchema }) { caseId }: { caseId: string },
  ): Promise<{ caseId: string }> {
    await this.rooms.place(socket, caseId, null);
    this.rooms.tellPresent(caseId);
    return { caseId };
  }
}

/** What the other side hears as `connect_error`: the id as its message, and the whole body beside it. */
function connectError(error: unknown): Error {
  if (error instanceof Refusal) return Object.assign(new Error(error.id), { data: error.getResponse() });
  return new Error('failed');
}
