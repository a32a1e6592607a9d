import { type ApiError, isApiError } from './api';
import { forget, keep, kept } from './kept';
import type { Saving } from './saving';

/** A text as the server has it. */
export interface Stored<T> {
  version: number;
  value: T;
}

/** What a keeper must know of the kind of text it keeps. */
export interface DraftKind<T> {
  /** Where unsaved text is kept in this browser. */
  keptKey: string;
  /** Reads kept text; null when it is not of this kind. */
  readKept: (kept: unknown) => Stored<T> | null;
  same: (one: T, other: T) => boolean;
  save: (value: T, version: number) => Promise<Stored<T>>;
  /** What a `stale` refusal carries: the text that somebody else saved. */
  readTheirs: (error: ApiError) => Stored<T> | null;
  /** Takes over what the server gave to new parts (their identifiers) without touching what was typed meanwhile. */
  adopt?: (local: T, sent: T, saved: T) => T;
  /** Makes one's own text fit upon somebody else's version. */
  rebase?: (mine: T, theirs: T) => T;
  /** False while a part cannot be sent yet; it then stays in this browser. */
  whole?: (value: T) => boolean;
}

export interface DraftSnapshot<T> {
  value: T;
  version: number;
  saving: Saving;
  /** The last refusal other than `stale`. */
  error: ApiError | null;
  /** Somebody else's text, until one of both is chosen. */
  theirs: Stored<T> | null;
}

const pause = 800;
const retryAfter = 10_000;

/**
 * Saves a text while it is typed, one request at a time, each with the version it was typed upon. Until the server has
 * acknowledged it the text stays in this browser; a stale version stops the saving until a person chose.
 */
export class DraftKeeper<T> {
  private snapshot: DraftSnapshot<T>;
  private acknowledged: T;
  private sending: Promise<void> | null = null;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private readonly listeners = new Set<() => void>();

  constructor(
    private readonly kind: DraftKind<T>,
    stored: Stored<T>,
  ) {
    this.acknowledged = stored.value;
    this.snapshot = { ...stored, saving: { state: 'clean' }, error: null, theirs: null };
    const left = kind.readKept(kept(kind.keptKey));
    if (!left || kind.same(left.value, stored.value)) return;
    this.snapshot.value = left.value;
    const stale = left.version !== stored.version;
    this.snapshot.saving = stale ? { state: 'stale', current: stored } : { state: 'typing' };
    this.snapshot.theirs = stale ? stored : null;
  }

  readonly subscribe = (listener: () => void) => {
    this.listeners.add(listener);
    return () => {
      this.listeners.delete(listener);
    };
  };
  readonly read = () => this.snapshot;

  /** Begins to save; the function returned sends what is left and ends. */
  start(): () => void {
    const again = () => {
      if (this.dirty()) void this.send();
    };
    globalThis.addEventListener('online', again);
    if (this.dirty()) this.plan(pause);
    return () => {
      globalThis.removeEventListener('online', again);
      clearTimeout(this.timer);
      if (this.dirty()) void this.send();
    };
  }

  change(value: T): void {
    const { theirs, saving } = this.snapshot;
    this.put({ value, error: null, saving: theirs ? saving : { state: 'typing' } });
    this.keepHere();
    if (!theirs) this.plan(pause);
  }

  /** What the server has now; taken over unless something here is unsaved. */
  offer(stored: Stored<T>): void {
    if (stored.version <= this.snapshot.version || this.dirty() || this.sending) return;
    this.acknowledged = stored.value;
    this.put({ ...stored, saving: { state: 'clean' }, error: null, theirs: null });
  }

  /** Saves everything now. Resolves to false when something is left unsaved. */
  async flush(): Promise<boolean> {
    clearTimeout(this.timer);
    while (this.sending || this.dirty()) {
      await this.send();
      if (this.snapshot.theirs || this.snapshot.error) return false;
    }
    return this.kind.whole?.(this.snapshot.value) ?? true;
  }

  keepMine(): void {
    const { theirs, value } = this.snapshot;
    if (!theirs) return;
    this.acknowledged = theirs.value;
    const mine = this.kind.rebase?.(value, theirs.value) ?? value;
    this.put({ value: mine, version: theirs.version, theirs: null, saving: { state: 'typing' } });
    this.keepHere();
    void this.send();
  }

  takeTheirs(): void {
    const { theirs } = this.snapshot;
    if (!theirs) return;
    this.acknowledged = theirs.value;
    forget(this.kind.keptKey);
    this.put({ ...theirs, theirs: null, error: null, saving: { state: 'clean' } });
  }

  private dirty(): boolean {
    return !this.snapshot.theirs && !this.kind.same(this.snapshot.value, this.acknowledged);
  }

  private send(): Promise<void> {
    clearTimeout(this.timer);
    this.sending ??= this.sendOnce().finally(() => {
      this.sending = null;
    });
    return this.sending;
  }

  private async sendOnce(): Promise<void> {
    const { value: sent, version } = this.snapshot;
    this.put({ saving: { state: 'saving' }, error: null });
    try {
      this.acknowledge(sent, await this.kind.save(sent, version));
    } catch (error) {
      this.refuse(error);
    }
  }

  private acknowledge(sent: T, saved: Stored<T>): void {
    const adopt = this.kind.adopt ?? ((local: T) => local);
    this.acknowledged = adopt(sent, sent, saved.value);
    const value = adopt(this.snapshot.value, sent, saved.value);
    const more = !this.kind.same(value, this.acknowledged);
    const at = new Date().toISOString();
    this.put({ value, version: saved.version, saving: more ? { state: 'typing' } : { state: 'saved', at } });
    if (more || this.kind.whole?.(value) === false) this.keepHere();
    else forget(this.kind.keptKey);
    if (more) this.plan(pause);
  }

  private refuse(error: unknown): void {
    if (!isApiError(error)) throw error;
    const theirs = error.id === 'stale' ? this.kind.readTheirs(error) : null;
    // An acknowledgement that got lost on the way comes back as one's own text.
    if (theirs && this.kind.same(theirs.value, this.snapshot.value)) {
      this.acknowledge(this.snapshot.value, theirs);
      return;
    }
    // A review moved the version and left the text: there is nothing to choose.
    if (theirs && this.kind.same(theirs.value, this.acknowledged)) {
      this.put({ version: theirs.version, saving: { state: 'typing' } });
      this.plan(0);
      return;
    }
    this.keepHere();
    if (theirs) this.put({ saving: { state: 'stale', current: theirs }, theirs });
    else this.put({ saving: { state: 'failed', offline: error.status === 0, error }, error });
    if (error.status === 0 || error.status >= 500) this.plan(retryAfter);
  }

  private plan(wait: number): void {
    clearTimeout(this.timer);
    this.timer = setTimeout(() => void this.send(), wait);
  }

  private keepHere(): void {
    keep(this.kind.keptKey, { version: this.snapshot.version, value: this.snapshot.value });
  }

  private put(part: Partial<DraftSnapshot<T>>): void {
    this.snapshot = { ...this.snapshot, ...part };
    for (const tell of this.listeners) tell();
  }
}
