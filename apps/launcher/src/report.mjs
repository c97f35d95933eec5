/**
 * Prints progress for the person at the terminal: one line for each thing that happens, with the seconds since
 * the start.
 *
 * - `line(name, text)` prints one line
 * - `step(name, action)` runs something and prints how it ended and how long it took
 *
 * @typedef {{ line: (name: string, text: string) => void,
 *   step: <T>(name: string, action: (say: (text: string) => void) => Promise<{ value: T, note: string }>) => Promise<T>
 * }} Reporter
 */

/**
 * Makes a {@link Reporter}.
 *
 * @param {(text: string) => void} [write] where a line goes, default the standard output
 * @returns {Reporter}
 */
export function createReporter(write = (text) => void process.stdout.write(`${text}\n`)) {
  const begin = performance.now();
  /** @type {Reporter["line"]} */
  const line = (name, text) =>
    write(`${formatSeconds(performance.now() - begin)}  ${name.padEnd(13)}${text}`);
  return {
    line,
    step: async (name, action) => {
      const stepBegin = performance.now();
      const { value, note } = await action((text) => line(name, text));
      line(name, `${note} (${formatSeconds(performance.now() - stepBegin).trim()})`);
      return value;
    },
  };
}

/** A reporter that prints nothing. @type {Reporter} */
export const silentReporter = createReporter(() => undefined);

/**
 * @param {number} milliseconds
 * @returns {string} such as `  1.2 s`
 */
export function formatSeconds(milliseconds) {
  return `${(milliseconds / 1000).toFixed(1).padStart(5)} s`;
}
