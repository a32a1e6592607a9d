import { Injectable } from '@nestjs/common';
import { liveEvents } from '@weighhouse/shared/contracts/live';
import type { Hearing } from './hearing.js';
import type { LiveServer, LiveSocket } from './live-socket.js';

const panelRoom = (caseId: string): string => `panel ${caseId}`;
const patientRoom = (caseId: string): string => `patient ${caseId}`;

/** Who has which case open: for each case a room for the panel and one for those who only tell the patient. */
@Injectable()
export class LiveRooms {
  private server: LiveServer | null = null;

  useServer(server: LiveServer): void {
    this.server = server;
  }

  /** Puts a connection where it belongs on a case, or out. */
  async place(socket: LiveSocket, caseId: string, hearing: Hearing): Promise<void> {
    const rooms = { panel: panelRoom(caseId), patient: patientRoom(caseId) };
    for (const [kind, room] of Object.entries(rooms)) {
      if (kind !== hearing && socket.rooms.has(room)) await socket.leave(room);
    }
    if (hearing === null || socket.rooms.has(rooms[hearing]) || !socket.connected) return;
    await socket.join(rooms[hearing]);
  }

  /** How many cases a connection watches. */
  watchedBy(socket: LiveSocket): string[] {
    return [...socket.rooms].flatMap((room) => /^(?:panel|patient) (.+)$/.exec(room)?.[1] ?? []);
  }

  /** The connections that watch a case. */
  watching(caseId: string): LiveSocket[] {
    return [...this.inRoom(panelRoom(caseId)), ...this.inRoom(patientRoom(caseId))];
  }

  /** The connections of one person. */
  ofPerson(personId: string): LiveSocket[] {
    return [...(this.server?.of('/').sockets.values() ?? [])].filter(
      (socket) => socket.data.actor.id === personId,
    );
  }

  /** Tells the panel's room how many of its people have the case open. */
  tellPresent(caseId: string): void {
    const sockets = this.inRoom(panelRoom(caseId));
    const people = new Set(sockets.map((socket) => socket.data.actor.id)).size;
    for (const socket of sockets) socket.emit(liveEvents.present, { caseId, people });
  }

  private inRoom(room: string): LiveSocket[] {
    const space = this.server?.of('/');
    return [...(space?.adapter.rooms.get(room) ?? [])].flatMap((id) => space?.sockets.get(id) ?? []);
  }
}
