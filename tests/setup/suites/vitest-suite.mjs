import { join } from "node:path";
import { readJson } from "../../../db/src/server/server.mjs";
import { countAsBroken } from "./outcome.mjs";
import { runSuiteCommand } from "./run-suite-command.mjs";

/**
 * The parts of Vitest's JSON report that are counted.
 *
 * @typedef {{ success: boolean, numPassedTests: number, numFailedTests: number, numPendingTests: number,
 *   testResults: { status: string, assertionResults: { status: string }[] }[] }} VitestReport
 */

/**
 * A suite of Vitest projects.
 *
 * @param {string} name
 * @param {string[]} projects names in tests/vitest.config.ts
 * @returns {import("./outcome.mjs").Suite}
 */
export function defineVitestSuite(name, projects) {
  return {
    name,
    run: async ({ root, resultsFolder, folder, shutdown, databaseEnv, files }) => {
      const report = join(resultsFolder, `${name}.json`);
      const { output } = await runSuiteCommand(shutdown, {
        name,
        args: [
          join(root, "tests/node_modules/vitest/vitest.mjs"),
          "run",
          "--config=tests/vitest.config.ts",
          ...files,
          ...projects.map((project) => `--project=${project}`),
          "--reporter=default",
          "--reporter=json",
          `--outputFile.json=${report}`,
        ],
        cwd: root,
        folder,
        env: databaseEnv,
      });
      return readOutcome(/** @type {VitestReport | undefined} */ (readJson(report)), output);
    },
  };
}

/**
 * A file that could not be loaded has no tests to fail, so it counts as one; and so does a run that fails for
 * another reason, such as an error outside any test.
 *
 * @param {VitestReport | undefined} report
 * @param {string} output
 * @returns {import("./outcome.mjs").Outcome}
 */
function readOutcome(report, output) {
  if (report === undefined) return countAsBroken(output);
  const brokenFiles = report.testResults.filter(
    ({ status, assertionResults }) =>
      status === "failed" && !assertionResults.some((assertion) => assertion.status === "failed"),
  ).length;
  const counted = report.numFailedTests + brokenFiles;
  return {
    passed: report.numPassedTests,
    failed: counted === 0 && !report.success ? 1 : counted,
    skipped: report.numPendingTests,
    output,
  };
}
