import type { LeftOut } from './left-out';

export interface Pointing {
  left: LeftOut;
  /** Held by a button until it is let go; otherwise it lasts as long as the pointing. */
  held: boolean;
}

/**
 * What somebody points at at the moment. Kept beside React's state, so that pointing at a row draws the standing anew
 * and not the ledger.
 */
export class WithoutStore {
  #pointing: Pointing | null = null;
  readonly #listeners = new Set<() => void>();

  readonly subscribe = (listener: () => void) => {
    this.#listeners.add(listener);
    return () => {
      this.#listeners.delete(listener);
    };
  };

  readonly pointing = () => this.#pointing;

  /** Pointing moved to something, or to nothing; what is held stays. */
  pointAt(left: LeftOut | null): void {
    const now = this.#pointing;
    if (now?.held) return;
    if (now?.left.kind === left?.kind && now?.left.id === left?.id) return;
    this.#set(left && { left, held: false });
  }

  hold(left: LeftOut): void {
    this.#set({ left, held: true });
  }

  /** @returns whether there was anything to end */
  end(): boolean {
    if (!this.#pointing) return false;
    this.#set(null);
    return true;
  }

  #set(pointing: Pointing | null): void {
    this.#pointing = pointing;
    for (const listener of this.#listeners) listener();
  }
}
