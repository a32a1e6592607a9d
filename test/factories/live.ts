import { setTimeout as wait } from 'node:timers/promises';
import { liveEvents } from '@weighhouse/shared/contracts/live';
import { io, type Socket } from 'socket.io-client';
import type { RunningApp } from '../setup/app.js';
import { testPassword, type TestPerson } from './people.js';

export interface Heard {
  event: string;
  payload: Record<string, unknown>;
}

/** A page that listens: everything it heard, in order. */
export interface Listener {
  socket: Socket;
  heard: Heard[];
  /** What was heard of one kind. */
  of(event: string): Record<string, unknown>[];
  watch(caseId: string): Promise<unknown>;
  /** Waits until something of this kind has been heard that fits. */
  until(
    event: string,
    fits?: (payload: Record<string, unknown>) => boolean,
  ): Promise<Record<string, unknown>>;
}

/** Signs in as another browser does. @returns the cookie to send */
export async function cookieOf(running: RunningApp, person: TestPerson): Promise<string> {
  const answer = await fetch(`${running.url}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: person.email, password: testPassword }),
  });
  const cookie = answer.headers.getSetCookie()[0]?.split(';')[0];
  if (cookie === undefined) throw new Error(`${person.email} could not sign in`);
  return cookie;
}

const open = new Set<Socket>();

export function closeListeners(): void {
  for (const socket of open) socket.disconnect();
  open.clear();
}

/** Connects with headers as given; does not wait. */
export function connect(running: RunningApp, headers: Record<string, string>): Listener {
  const socket = io(running.url, {
    path: '/live',
    transports: ['websocket'],
    extraHeaders: headers,
    forceNew: true,
    reconnectionDelay: 20,
    reconnectionDelayMax: 50,
  });
  open.add(socket);
  const heard: Heard[] = [];
  socket.onAny((event: string, payload: Record<string, unknown>) => {
    heard.push({ event, payload });
  });
  const of = (event: string) => heard.filter((one) => one.event === event).map((one) => one.payload);
  return {
    socket,
    heard,
    of,
    watch: (caseId) => socket.timeout(15_000).emitWithAck(liveEvents.watch, { caseId }) as Promise<unknown>,
    until: async (event, fits = () => true) => {
      const began = Date.now();
      while (Date.now() - began < 15_000) {
        const found = of(event).find(fits);
        if (found) return found;
        await wait(5);
      }
      throw new Error(`${event} was not heard; heard were ${JSON.stringify(heard)}`);
    },
  };
}

/** A signed-in page that has the case open. */
export async function listen(running: RunningApp, person: TestPerson, caseId: string): Promise<Listener> {
  const listener = connect(running, { cookie: await cookieOf(running, person) });
  await new Promise<void>((resolve, reject) => {
    listener.socket.once('connect', resolve);
    listener.socket.once('connect_error', reject);
  });
  await listener.watch(caseId);
  return listener;
}

/** Long enough for a push that should not come to have come. */
export const quietly = (): Promise<unknown> => wait(250);
