import type { Socket } from 'socket.io-client';

/** Whether live changes arrive. Before the first connection has failed it counts as connected. */
export type LiveState = 'connected' | 'reconnecting';

/** Milliseconds before a server that refused the connection is asked again. */
const refusedPause = 10_000;
/** Milliseconds before a connection that nobody answers is given up and tried anew. */
const connectTimeout = 8_000;

type Handler = (payload: unknown) => void;

/**
 * One socket for the whole page, opened as soon as somebody is signed in: through it a page hears at once that its
 * session has ended. The code of the client library is loaded then, too. Every (re)connection calls `onConnect`, where the watchers join again and refetch.
 */
class LiveConnection {
  #socket: Socket | null = null;
  #opening: Promise<Socket> | null = null;
  #state: LiveState = 'connected';
  #stateListeners = new Set<() => void>();
  #handlers = new Map<string, Set<Handler>>();
  #connectHandlers = new Set<() => void>();
  #lastBeat = 0;
  #beating = false;

  /** Opens the connection where there is none; true when it stands already, else `onConnect` tells. */
  async whenConnected(): Promise<boolean> {
    return (await this.#connect()).connected;
  }

  async emit(event: string, payload: unknown): Promise<unknown> {
    const socket = await this.#connect();
    if (!socket.connected) return undefined;
    return socket
      .timeout(5_000)
      .emitWithAck(event, payload)
      .catch(() => undefined);
  }

  on(event: string, handler: Handler): () => void {
    const handlers = this.#handlers.get(event) ?? new Set<Handler>();
    this.#handlers.set(event, handlers.add(handler));
    return () => {
      handlers.delete(handler);
    };
  }

  onConnect(handler: () => void): () => void {
    this.#connectHandlers.add(handler);
    return () => {
      this.#connectHandlers.delete(handler);
    };
  }

  /** Tries at once where the connection is down: after signing in again, or when the network is back. */
  connectAgain(): void {
    if (this.#socket?.connected === false) this.#socket.connect();
  }

  /** Signing out ends the connection: the next person opens their own. */
  close(): void {
    this.#socket?.disconnect();
    this.#socket = null;
    this.#opening = null;
    this.#setState('connected');
  }

  readonly state = (): LiveState => this.#state;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#stateListeners.add(listener);
    return () => {
      this.#stateListeners.delete(listener);
    };
  };

  #connect(): Promise<Socket> {
    this.#opening ??= import('socket.io-client').then(({ io }) => {
      const socket = io({ path: '/live', transports: ['websocket', 'polling'], timeout: connectTimeout });
      socket.on('connect', () => {
        this.#setState('connected');
        for (const handler of this.#connectHandlers) handler();
      });
      const lost = () => {
        this.#setState('reconnecting');
        // The library gives up for good on a server that closed or refused; a session that ended may be begun again.
        if (!socket.active) setTimeout(() => this.#socket === socket && this.connectAgain(), refusedPause);
      };
      socket.on('disconnect', lost);
      socket.on('connect_error', lost);
      socket.onAny((event: string, payload: unknown) => {
        for (const handler of this.#handlers.get(event) ?? []) handler(payload);
      });
      this.#socket = socket;
      this.#watchSleep();
      return socket;
    });
    return this.#opening;
  }

  /** A laptop that slept keeps a dead socket for most of a minute: notice the gap and connect anew at once. */
  #watchSleep(): void {
    const beat = () => {
      const slept = Date.now() - this.#lastBeat > 30_000;
      this.#lastBeat = Date.now();
      if (slept) this.#socket?.disconnect().connect();
    };
    if (this.#beating) return;
    this.#beating = true;
    this.#lastBeat = Date.now();
    setInterval(beat, 5_000);
    window.addEventListener('online', () => {
      this.connectAgain();
    });
  }

  #setState(state: LiveState): void {
    if (state === this.#state) return;
    this.#state = state;
    for (const listener of this.#stateListeners) listener();
  }
}

export const liveConnection = new LiveConnection();
