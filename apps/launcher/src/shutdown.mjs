import { describeError } from "../../../db/src/server/server.mjs";

/** Thrown out of a start that was told to stop before it was finished. */
export class StartCancelled extends Error {}

/**
 * Everything that has to be ended when the product stops, whenever that is.
 *
 * - `add(name, stop)`: remembers how to end something; ends run in reverse order. Added after the stop has begun,
 *   it is ended at once.
 * - `starting(promise)`: remembers something half started, so that the stop waits to learn how to end it
 * - `check()`: throws {@link StartCancelled} when the stop has begun
 * - `run()`: ends everything; every caller gets the same promise
 * - `hasBegun()`, `hasWork()`: whether the stop has begun, whether there is anything to end
 *
 * @typedef {object} Shutdown
 * @property {(name: string, stop: () => Promise<void>) => void} add
 * @property {<T>(promise: Promise<T>) => Promise<T>} starting
 * @property {() => void} check
 * @property {() => Promise<void>} run
 * @property {() => boolean} hasBegun
 * @property {() => boolean} hasWork
 */

/**
 * Makes a {@link Shutdown}.
 *
 * @param {(text: string) => void} report told what could not be ended, in words
 * @returns {Shutdown}
 */
export function createShutdown(report) {
  /** @type {{ name: string, stop: () => Promise<void> }[]} */
  const entries = [];
  /** @type {Set<Promise<unknown>>} */
  const pending = new Set();
  /** @type {Promise<void> | undefined} */
  let ending;

  /** @param {{ name: string, stop: () => Promise<void> }} entry */
  const end = async ({ name, stop }) => {
    try {
      await stop();
    } catch (error) {
      report(`could not stop ${name}: ${describeError(error)}`);
    }
  };
  const endAll = async () => {
    while (entries.length > 0 || pending.size > 0) {
      const entry = entries.pop();
      if (entry === undefined) await Promise.allSettled(pending);
      else await end(entry);
    }
  };

  return {
    add: (name, stop) => void entries.push({ name, stop }),
    starting: async (promise) => {
      pending.add(promise);
      try {
        return await promise;
      } finally {
        pending.delete(promise);
      }
    },
    check: () => {
      if (ending !== undefined) throw new StartCancelled("The start was cancelled.");
    },
    run: async () => (ending ??= endAll()),
    hasBegun: () => ending !== undefined,
    hasWork: () => entries.length > 0 || pending.size > 0,
  };
}
