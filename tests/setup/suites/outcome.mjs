/**
 * What a suite came to. `output` is what there is to read when something failed.
 *
 * @typedef {{ passed: number, failed: number, skipped: number, output: string }} Outcome
 */

/**
 * A suite: a name and what runs it.
 *
 * @typedef {{ name: string, run: (context: SuiteContext) => Promise<Outcome> }} Suite
 *
 * What every suite may use: the repository's folder, a folder for its result files, the run's own folder, the way to end what it
 * started, environment variables that tell of the database, and parts of file names to keep to (none: all).
 *
 * @typedef {{ root: string, resultsFolder: string, folder: import("../test-folder.mjs").TestFolder,
 *   shutdown: import("../../../apps/launcher/src/shutdown.mjs").Shutdown,
 *   databaseEnv: Record<string, string>, files: string[] }} SuiteContext
 */

/**
 * Counts a command that either holds or does not as one test.
 *
 * @param {{ code: number, output: string }} result
 * @returns {Outcome}
 */
export function countAsOne({ code, output }) {
  return { passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1, skipped: 0, output };
}

/**
 * A suite that ended without telling its results counts as one failed test.
 *
 * @param {string} output
 * @returns {Outcome}
 */
export function countAsBroken(output) {
  return { passed: 0, failed: 1, skipped: 0, output };
}
