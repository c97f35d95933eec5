import { join } from "node:path";
import { ensureProgram, readJson } from "../../../db/src/server/server.mjs";
import { describeTestProduct, startTestProduct } from "../product.mjs";
import { countAsBroken } from "./outcome.mjs";
import { runSuiteCommand } from "./run-suite-command.mjs";

/**
 * The part of Playwright's JSON report that is counted.
 *
 * @typedef {{ stats: { expected: number, unexpected: number, flaky: number, skipped: number }, errors?: unknown[] }}
 *   PlaywrightReport
 */

/** Journeys in Chromium against the whole product. @type {import("./outcome.mjs").Suite} */
export const browserSuite = {
  name: "e2e",
  run: async ({ root, resultsFolder, folder, shutdown, files }) => {
    const chromium = await ensureProgram({
      program: "chromium",
      packages: ["chromium"],
      purpose: "Chromium, the browser its tests drive",
      report: () => undefined,
    });
    let failure = "";
    const product = await startTestProduct({
      folder,
      shutdown,
      onFailure: (error) => (failure = `\nThe product failed during the tests: ${error.message}\n`),
    });
    const report = join(resultsFolder, "e2e.json");
    const { code, output } = await runSuiteCommand(shutdown, {
      name: "e2e",
      args: [
        join(root, "tests/node_modules/@playwright/test/cli.js"),
        "test",
        ...files,
        "--config=tests/e2e/playwright.config.ts",
        "--reporter=list,json",
      ],
      cwd: root,
      folder,
      env: {
        ...describeTestProduct(product),
        CHROMIUM: chromium,
        PLAYWRIGHT_JSON_OUTPUT_FILE: report,
      },
    });
    const all = `${output}${failure}`;
    const result = /** @type {PlaywrightReport | undefined} */ (readJson(report));
    if (result === undefined) return countAsBroken(all);
    const { expected, unexpected, flaky, skipped } = result.stats;
    // A journey that passes only at the second attempt is a failure that has not been understood.
    const counted = unexpected + flaky;
    return { passed: expected, failed: counted === 0 && code !== 0 ? 1 : counted, skipped, output: all };
  },
};
