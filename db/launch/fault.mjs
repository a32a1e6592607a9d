/**
 * Something a person has to put right before the product can start. Its message is printed as it is,
 * without a stack, so it says what is wrong and what to type.
 */
export class LaunchFault extends Error {
  /** @param {string} message */
  constructor(message) {
    super(message);
    this.name = 'LaunchFault';
  }
}

/** Thrown out of a start-up that was asked to stop half way. */
export class Stopped extends Error {
  constructor() {
    super('Stopped while starting');
    this.name = 'Stopped';
  }
}

/**
 * What to print for an error: the bare message of a fault, the stack of anything unforeseen.
 *
 * @param {unknown} error
 * @returns {string}
 */
export function describeError(error) {
  if (error instanceof LaunchFault) return error.message;
  if (error instanceof Error) return error.stack ?? error.message;
  return String(error);
}
