/**
 * `npm test`: brings up what the tests need, runs every suite, and ends with `N passed, N failed`.
 *
 * `npm test -- --only unit,api` runs some of them, `npm test -- --only e2e door` one file.
 */
import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { installDependencies } from "../apps/launcher/src/dependencies.mjs";
import { createReporter } from "../apps/launcher/src/report.mjs";
import { createShutdown, StartCancelled } from "../apps/launcher/src/shutdown.mjs";
import { describeError } from "../db/src/server/server.mjs";
import { countAsBroken } from "./setup/suites/outcome.mjs";
import { chooseSuites } from "./setup/suites/plan.mjs";

/** @typedef {import("./setup/suites/outcome.mjs").Outcome} Outcome */
/** @typedef {import("./setup/suites/outcome.mjs").Suite} Suite */
/** @typedef {import("./setup/suites/outcome.mjs").SuiteContext} SuiteContext */

const root = fileURLToPath(new URL("..", import.meta.url));
const reporter = createReporter();
const shutdown = createShutdown((text) => reporter.line("stop", text));
const total = { passed: 0, failed: 0 };

for (const signal of /** @type {const} */ (["SIGINT", "SIGTERM", "SIGHUP"])) {
  process.on(signal, () => {
    if (!shutdown.hasBegun()) void shutdown.run().then(() => process.exit(1));
  });
}

try {
  const { stages, needsDatabase, files } = chooseSuites(process.argv.slice(2));
  await reporter.step("dependencies", async (say) => ({
    value: undefined,
    note: await installDependencies({ root, shutdown, say }),
  }));
  const resultsFolder = join(root, ".cache/test-results");
  mkdirSync(resultsFolder, { recursive: true });
  const { makeTestFolder } = await import("./setup/test-folder.mjs");
  const folder = await makeTestFolder();
  shutdown.add("the test folder", folder.remove);
  const databaseEnv = needsDatabase ? await openTestDatabase(folder) : {};
  for (const lanes of stages) {
    await Promise.all(
      lanes.map(async (lane) => runLane(lane, { root, resultsFolder, folder, shutdown, databaseEnv, files })),
    );
  }
} catch (error) {
  if (!(error instanceof StartCancelled)) {
    process.stderr.write(`\n${describeError(error)}\n\n`);
    total.failed += 1;
  }
} finally {
  await shutdown.run();
}
process.stdout.write(`${total.passed} passed, ${total.failed} failed\n`);
process.exit(total.failed === 0 && total.passed > 0 ? 0 : 1);

/**
 * Runs suites one after the other.
 *
 * @param {Suite[]} lane
 * @param {SuiteContext} context
 */
async function runLane(lane, context) {
  for (const suite of lane) {
    shutdown.check();
    await reporter.step(suite.name, async () => {
      const outcome = await runSuite(suite, context);
      total.passed += outcome.passed;
      total.failed += outcome.failed;
      if (outcome.failed > 0)
        process.stdout.write(`\n--- ${suite.name} ---\n${outcome.output.trim()}\n---\n\n`);
      return { value: undefined, note: describeOutcome(outcome) };
    });
  }
}

/**
 * @param {Suite} suite
 * @param {SuiteContext} context
 * @returns {Promise<Outcome>}
 */
async function runSuite(suite, context) {
  try {
    const loaded = await suite.run(context);
    shutdown.check();
    return loaded;
  } catch (error) {
    if (error instanceof StartCancelled) throw error;
    return countAsBroken(describeError(error));
  }
}

/** @param {Outcome} outcome */
function describeOutcome({ passed, failed, skipped }) {
  if (passed + failed + skipped === 0) return "NO TESTS in this suite";
  return `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} SKIPPED` : ""}`;
}

/**
 * @param {import("./setup/test-folder.mjs").TestFolder} folder
 * @returns {Promise<Record<string, string>>}
 */
async function openTestDatabase(folder) {
  return reporter.step("database", async () => {
    const { startTestDatabase } = await import("./setup/test-database.mjs");
    const { facts } = await shutdown.starting(
      startTestDatabase(folder).then((started) => {
        shutdown.add("the test database", started.stop);
        return started;
      }),
    );
    shutdown.check();
    return {
      value: { EMBERLADDER_TEST_DATABASE: JSON.stringify(facts) },
      note: `one MariaDB on 127.0.0.1:${facts.port}, template migrated`,
    };
  });
}
