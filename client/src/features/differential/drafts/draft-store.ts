import type { JudgementDraft, JudgementDraftInput } from '@weighhouse/shared/contracts/judgements';
import type { Saving } from '../../../components/save-state';
import { isApiError } from '../../../lib/api-error';
import type { Draft } from '../typing/draft';

/** A draft with what the server is sent of it: the columns in the order they had while it was typed. */
export interface TypedDraft {
  draft: Draft;
  wire: JudgementDraftInput;
}

/** What the store needs from outside: the server and this browser's memory. */
export interface DraftSurroundings {
  send: (draft: JudgementDraftInput) => Promise<JudgementDraft>;
  /** Remembers in this browser what the server has not acknowledged; null forgets it. */
  remember: (target: string, typed: TypedDraft | null) => void;
  recall: (target: string) => TypedDraft | null;
}

interface Entry extends TypedDraft {
  saving: Saving;
  timer: ReturnType<typeof setTimeout> | undefined;
  sending: Promise<void> | undefined;
}

/** Milliseconds of quiet after which typing goes to the server. */
export const quietBeforeSending = 600;
const pauseBeforeRetry = 5000;

/**
 * What somebody types, for as long as the page is open. It lives beside the query cache, so that no live update,
 * refetch or reconnection can take it away; each change goes to the server as a private draft, and stays remembered
 * in this browser until the server has it.
 */
export class DraftStore {
  #entries = new Map<string, Entry>();
  #listeners = new Set<() => void>();
  #drafts: ReadonlyMap<string, Draft> = new Map();

  constructor(private readonly around: DraftSurroundings) {}

  subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  /** Everything that is typed, by its target; another map after every change. */
  drafts = (): ReadonlyMap<string, Draft> => this.#drafts;

  saving(target: string): Saving {
    return this.#entries.get(target)?.saving ?? clean;
  }

  /** Takes up what was typed before the page was loaded again and never reached the server. */
  recall(targets: readonly string[]): void {
    for (const target of targets) {
      const typed = this.#entries.has(target) ? null : this.around.recall(target);
      if (!typed) continue;
      this.#entries.set(target, {
        ...typed,
        saving: { state: 'typing' },
        timer: undefined,
        sending: undefined,
      });
      this.#later(target, 0);
    }
    this.#tell();
  }

  type(target: string, typed: TypedDraft): void {
    const known = this.#entries.get(target);
    clearTimeout(known?.timer);
    this.#entries.set(target, {
      ...typed,
      saving: { state: 'typing' },
      timer: undefined,
      sending: known?.sending,
    });
    this.around.remember(target, typed);
    this.#later(target, quietBeforeSending);
    this.#tell();
  }

  /** Waits for what is on its way, so that it cannot come back after the judgement was saved. */
  async settle(target: string): Promise<void> {
    clearTimeout(this.#entries.get(target)?.timer);
    await this.#entries.get(target)?.sending;
  }

  /** The draft has been saved as a judgement. */
  forget(target: string): void {
    clearTimeout(this.#entries.get(target)?.timer);
    this.#entries.delete(target);
    this.around.remember(target, null);
    this.#tell();
  }

  /** Sends at once what waits, for instance when the connection is back. */
  sendAll(): void {
    for (const [target, entry] of this.#entries)
      if (entry.saving.state === 'typing' || entry.saving.state === 'failed') this.#later(target, 0);
  }

  #later(target: string, wait: number): void {
    const entry = this.#entries.get(target);
    if (!entry) return;
    clearTimeout(entry.timer);
    entry.timer = setTimeout(() => {
      entry.sending = this.#send(target).finally(() => {
        entry.sending = undefined;
      });
    }, wait);
  }

  async #send(target: string): Promise<void> {
    const entry = this.#entries.get(target);
    if (!entry) return;
    const { draft, wire } = entry;
    const isLatest = () => this.#entries.get(target)?.draft === draft;
    this.#say(target, { state: 'saving' });
    try {
      const kept = await this.around.send(wire);
      if (!isLatest()) return;
      this.around.remember(target, null);
      this.#say(target, { state: 'saved', at: kept.savedAt });
    } catch (error) {
      if (!isLatest()) return;
      const offline = isApiError(error, 'offline');
      this.#say(target, { state: 'failed', offline, error });
      if (offline) this.#later(target, pauseBeforeRetry);
    }
  }

  #say(target: string, saving: Saving): void {
    const entry = this.#entries.get(target);
    if (entry) entry.saving = saving;
    this.#tell();
  }

  #tell(): void {
    this.#drafts = new Map([...this.#entries].map(([target, { draft }]) => [target, draft]));
    for (const listener of this.#listeners) listener();
  }
}

const clean: Saving = { state: 'clean' };
