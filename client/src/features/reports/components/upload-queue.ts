/** One file on its way. */
export interface Upload {
  id: number;
  file: File;
  state: 'waiting' | 'sending' | 'failed';
  /** The share that is sent, 0 to 1. */
  sent: number;
  /** Why it failed, with the way out. */
  fault: string | null;
  /** Sending it again can help. */
  retry: boolean;
}

interface Options {
  send: (file: File, onProgress: (share: number) => void, signal: AbortSignal) => Promise<unknown>;
  /** What is wrong with a file before it is sent. */
  check: (file: File) => string | null;
  /** Why it failed, and whether sending it again can help. */
  faultOf: (error: unknown, file: File) => { fault: string; retry: boolean };
  onDone: () => void;
  /** How many are sent at once. */
  atOnce?: number;
}

/** Sends files a few at a time; each can be cancelled and sent again. What is done leaves the queue. */
export class UploadQueue {
  #options: Required<Options>;
  #uploads: readonly Upload[] = [];
  #aborts = new Map<number, AbortController>();
  #listeners = new Set<() => void>();
  #next = 1;

  constructor(options: Options) {
    this.#options = { atOnce: 2, ...options };
  }

  readonly uploads = (): readonly Upload[] => this.#uploads;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => {
      this.#listeners.delete(listener);
    };
  };

  add(files: readonly File[]): void {
    const added = files.map((file): Upload => {
      const fault = this.#options.check(file);
      const id = this.#next++;
      return { id, file, state: fault === null ? 'waiting' : 'failed', sent: 0, fault, retry: false };
    });
    this.#set([...this.#uploads, ...added]);
    this.#start();
  }

  /** Stops a file on its way, or takes a failed one off the list. */
  cancel(id: number): void {
    this.#aborts.get(id)?.abort();
    this.#set(this.#uploads.filter((upload) => upload.id !== id));
    this.#start();
  }

  retry(id: number): void {
    this.#change(id, { state: 'waiting', sent: 0, fault: null });
    this.#start();
  }

  #start(): void {
    const sending = this.#uploads.filter((upload) => upload.state === 'sending').length;
    const free = Math.max(0, this.#options.atOnce - sending);
    for (const upload of this.#uploads.filter((one) => one.state === 'waiting').slice(0, free))
      void this.#send(upload);
  }

  async #send({ id, file }: Upload): Promise<void> {
    const abort = new AbortController();
    this.#aborts.set(id, abort);
    this.#change(id, { state: 'sending' });
    try {
      await this.#options.send(file, (sent) => this.#change(id, { sent }), abort.signal);
      this.#set(this.#uploads.filter((upload) => upload.id !== id));
      this.#options.onDone();
    } catch (error) {
      // A cancelled one is off the list already, so this changes nothing for it.
      this.#change(id, { state: 'failed', ...this.#options.faultOf(error, file) });
    } finally {
      this.#aborts.delete(id);
      this.#start();
    }
  }

  #change(id: number, change: Partial<Upload>): void {
    this.#set(this.#uploads.map((upload) => (upload.id === id ? { ...upload, ...change } : upload)));
  }

  #set(uploads: readonly Upload[]): void {
    this.#uploads = uploads;
    for (const listener of this.#listeners) listener();
  }
}
