/** Runs what belongs to one key one after the other, in the order in which it was asked for. */
export class InOrder {
  private readonly last = new Map<string, Promise<void>>();

  /** @returns when this task is done; a task that failed does not hold up the next */
  run(key: string, task: () => Promise<void>): Promise<void> {
    const before = this.last.get(key) ?? Promise.resolve();
    const running = before.catch(() => undefined).then(task);
    this.last.set(key, running);
    const forget = () => {
      if (this.last.get(key) === running) this.last.delete(key);
    };
    running.then(forget, forget);
    return running;
  }
}
