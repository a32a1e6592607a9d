import type {
  CaseAssessment,
  CaseChanged,
  CasePresent,
  CaseStanding,
  liveEvents,
} from '@weighhouse/shared/contracts/live';
import type { Server, Socket } from 'socket.io';
import type { Actor } from '../platform/http/actor.js';

/** Everything that is ever pushed. */
export interface Pushed {
  [liveEvents.changed]: (event: CaseChanged) => void;
  [liveEvents.standing]: (event: CaseStanding) => void;
  [liveEvents.assessment]: (event: CaseAssessment) => void;
  [liveEvents.present]: (event: CasePresent) => void;
  exception: (body: unknown) => void;
}

/** What a connection knows of its person; set by the handshake, before anything else can happen. */
export interface SocketData {
  actor: Actor;
  /** When the session was last looked up. */
  checkedAt: number;
}

type Received = Record<string, (...parts: unknown[]) => void>;
export type LiveServer = Server<Received, Pushed, Record<string, never>, SocketData>;
export type LiveSocket = Socket<Received, Pushed, Record<string, never>, SocketData>;
