/** The latest results by key, as promises: who asks while one is being worked out waits for the same one. */
export class KeptPromises<T> {
  private readonly kept = new Map<string, Promise<T>>();

  /** @param most how many are kept; the one unused for longest is forgotten first */
  constructor(private readonly most: number) {}

  of(key: string, make: () => Promise<T>): Promise<T> {
    const known = this.kept.get(key) ?? this.made(key, make);
    // The one used last goes to the end.
    this.kept.delete(key);
    this.kept.set(key, known);
    const oldest = this.kept.keys().next();
    if (this.kept.size > this.most && oldest.done !== true) this.kept.delete(oldest.value);
    return known;
  }

  /** What failed is not kept, so that the next who asks tries again. */
  private made(key: string, make: () => Promise<T>): Promise<T> {
    const making = make();
    making.catch(() => {
      if (this.kept.get(key) === making) this.kept.delete(key);
    });
    return making;
  }
}
