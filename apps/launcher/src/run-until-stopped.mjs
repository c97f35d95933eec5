import { describeError } from "../../../db/src/server/server.mjs";
import { createReporter } from "./report.mjs";
import { createShutdown, StartCancelled } from "./shutdown.mjs";

/** @typedef {import("./report.mjs").Reporter} Reporter */
/** @typedef {import("./shutdown.mjs").Shutdown} Shutdown */

/**
 * Runs a launcher until Ctrl-C, SIGTERM, SIGHUP or a failure, and stops everything it had started.
 *
 * Ends the process: code 0 after a stop that was asked for, 1 after a failure.
 *
 * @param {(tools: { shutdown: Shutdown, reporter: Reporter, fail: (error: unknown) => void }) => Promise<void>} start
 * @returns {Promise<void>}
 */
export async function runUntilStopped(start) {
  const reporter = createReporter();
  const shutdown = createShutdown((text) => reporter.line("stop", text));
  /** @param {number} code */
  const finish = async (code) => {
    if (shutdown.hasBegun()) return;
    const hasWork = shutdown.hasWork();
    if (hasWork) reporter.line("stop", "stopping everything that was started");
    await shutdown.run();
    if (hasWork) reporter.line("stop", "stopped; all data is kept");
    process.exit(code);
  };
  /** @param {unknown} error */
  const fail = (error) => {
    if (error instanceof StartCancelled || shutdown.hasBegun()) return;
    process.stderr.write(`\n${describeError(error)}\n\n`);
    void finish(1);
  };
  // npm passes a signal on to a process that the terminal has told already, so a second one says nothing new.
  for (const signal of /** @type {const} */ (["SIGINT", "SIGTERM", "SIGHUP"])) {
    process.on(signal, () => void finish(0));
  }
  try {
    await start({ shutdown, reporter, fail });
  } catch (error) {
    fail(error);
  }
}
