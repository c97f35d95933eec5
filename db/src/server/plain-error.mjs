/**
 * An error whose message is meant for the person at the terminal: what happened, what was kept, what to do.
 * Whoever prints it leaves the stack trace out.
 */
export class PlainError extends Error {
  /** @param {string} message one or more full sentences */
  constructor(message) {
    super(message);
    this.name = "PlainError";
  }
}

/**
 * Turns anything thrown into text for a terminal.
 *
 * @param {unknown} error
 * @returns {string} the message of a {@link PlainError}; for an unforeseen error its stack, which is what a
 * developer needs
 */
export function describeError(error) {
  if (error instanceof PlainError) return error.message;
  if (error instanceof Error) return error.stack ?? error.message;
  return String(error);
}
