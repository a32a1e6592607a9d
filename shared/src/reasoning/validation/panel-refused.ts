/** One thing wrong with an input: where (empty: the whole input) and what. */
export interface Fault {
  path: string;
  message: string;
}

/** Thrown by `assess` for a panel it refuses; `errors` holds every fault found, not only the first. */
export class PanelRefused extends Error {
  override readonly name = 'PanelRefused';

  constructor(readonly errors: readonly Fault[]) {
    super(`panel refused: ${errors.map(({ path, message }) => `${path || 'input'} ${message}`).join('; ')}`);
  }
}
