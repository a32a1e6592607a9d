import type { JudgementDraft, JudgementDraftInput } from '@weighhouse/shared/contracts/judgements';
import type { Saving } from '../../../components/save-state';
import { isApiError } from '../../../lib/api-error';
import type { Draft } from '../typing/draft';

/** What the store needs from outside: the server, this browser's memory and a timer. */
export interface DraftSurroundings {
  send: (draft: JudgementDraftInput) => Promise<JudgementDraft>;
  wire: (target: string, draft: Draft) => JudgementDraftInput;
  /** Remembers in this browser what the server has not acknowledged; null forgets it. */
  remember: (target: string, draft: Draft | null) => void;
  recall: (target: string) => Draft | null;
}

interface Entry {
  draft: Draft;
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
  #version = 0;

  constructor(private readonly around: DraftSurroundings) {}

  subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  /** What was typed here, or before the page was loaded again and never acknowledged; null where nothing was. */
  draft(target: string): Draft | null {
    const entry = this.#entries.get(target);
    if (entry) return entry.draft;
    const recalled = this.around.recall(target);
    if (!recalled) return null;
    this.#entries.set(target, { draft: recalled, saving: { state: 'typing' }, timer: undefined, sending: undefined });
    this.#later(target, 0);
    return recalled;
  }

  saving(target: string): Saving {
    return this.#entries.get(target)?.saving ?? clean;
  }

  /** Rises with every change, for whoever watches all of it. */
  version(): number {
    return this.#version;
  }

  /** The targets that were typed in on this page. */
  targets(): string[] {
    return [...this.#entries.keys()];
  }

  type(target: string, draft: Draft): void {
    const entry = this.#entries.get(target);
    clearTimeout(entry?.timer);
    this.#entries.set(target, { draft, saving: { state: 'typing' }, timer: undefined, sending: entry?.sending });
    this.around.remember(target, draft);
    this.#later(target, quietBeforeSending);
    this.#tell();
  }

  /** Waits for what is on its way and forgets the draft: it has been saved as a judgement, or thrown away. */
  async settle(target: string): Promise<void> {
    clearTimeout(this.#entries.get(target)?.timer);
    await this.#entries.get(target)?.sending;
  }

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
    const { draft } = entry;
    this.#say(target, { state: 'saving' });
    try {
      const kept = await this.around.send(this.around.wire(target, draft));
      if (this.#entries.get(target)?.draft !== draft) return;
      this.around.remember(target, null);
      this.#say(target, { state: 'saved', at: kept.savedAt });
    } catch (error) {
      if (this.#entries.get(target)?.draft !== draft) return;
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
    this.#version += 1;
    for (const listener of this.#listeners) listener();
  }
}

const clean: Saving = { state: 'clean' };
