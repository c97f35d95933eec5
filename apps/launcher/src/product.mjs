import { existsSync, mkdirSync } from "node:fs";
import { join } from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { findFreePort, PlainError } from "../../../db/src/server/server.mjs";
import { buildServer, buildWeb } from "./build.mjs";
import { keepRunning, runToEnd } from "./children.mjs";
import { isEmpty, migrateDatabase, openDatabase } from "./database.mjs";
import { installDependencies } from "./dependencies.mjs";
import { keepDemoSecrets } from "./environment.mjs";
import { takeLaunchLock } from "./launch-lock.mjs";
import { root } from "./paths.mjs";
import { describeEnvironment, describeProgram } from "./programs.mjs";
import { readAccounts } from "./welcome.mjs";

/** @typedef {import("./environment.mjs").Settings} Settings */
/** @typedef {import("./programs.mjs").Flavour} Flavour */
/** @typedef {import("./report.mjs").Reporter} Reporter */
/** @typedef {import("./shutdown.mjs").Shutdown} Shutdown */
/** @typedef {import("../../../db/src/server/server.mjs").RunningDatabase} RunningDatabase */

/**
 * The running product.
 *
 * @typedef {{ apiOrigin: string, accounts: import("./welcome.mjs").DemoAccount[], database: RunningDatabase,
 *   mailDir: string, environment: NodeJS.ProcessEnv }} Product
 */

const readyPatienceMs = 60_000;

/**
 * Starts the whole product: dependencies, database, schema, builds, demo data, mail server, API and worker.
 * Whatever it starts is added to `shutdown` at once, so a stop in the middle leaves nothing behind.
 *
 * @param {{ settings: Settings, flavour: Flavour, apiPort: number, shutdown: Shutdown, reporter: Reporter,
 *   onFailure: (error: PlainError) => void }} options `onFailure` is called when a part ends for good while running
 * @returns {Promise<Product>} once the API says that it is ready
 * @throws {PlainError | import("./shutdown.mjs").StartCancelled}
 */
export async function startProduct({ settings, flavour, apiPort, shutdown, reporter, onFailure }) {
  const { dataDir, mode } = settings;
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
  const lock = await takeLaunchLock({
    dataDir,
    port: settings.port,
    report: (text) => reporter.line("launcher", text),
  });
  shutdown.add("the launch lock", async () => lock.release());

  const database = await openDatabaseAndBuild({ dataDir, flavour, shutdown, reporter });
  database.onUnexpectedEnd(() => onFailure(new PlainError("The database server ended by itself.")));
  await migrateDatabase(database, { shutdown, reporter });

  const smtpPort = mode === "demo" ? await findFreePort() : undefined;
  const environment = describeEnvironment({
    settings,
    flavour,
    apiPort,
    databaseUrl: database.applicationUrl,
    smtpUrl: settings.smtpUrl ?? `smtp://127.0.0.1:${smtpPort}`,
    smtpPort,
    secrets: mode === "demo" ? keepDemoSecrets(dataDir) : settings.secrets,
  });
  /** @param {Parameters<typeof describeProgram>[0]} name */
  const program = (name) => describeProgram(name, { flavour, settings, env: environment });
  /** @param {Parameters<typeof describeProgram>[0]} name */
  const launch = (name) => {
    shutdown.check();
    const child = keepRunning(program(name), {
      onStart: lock.noteChild,
      report: (text) => reporter.line(name, text),
      onGivenUp: onFailure,
    });
    shutdown.add(name, child.stop);
  };

  // The seed writes accounts.json last, so that a seed that was killed is run again.
  if (mode === "demo" && (!existsSync(join(dataDir, "accounts.json")) || (await isEmpty(database)))) {
    await reporter.step("demo data", async () => {
      await runToEnd(program("seed"), shutdown);
      return { value: undefined, note: "invented companies, people and calls" };
    });
  }
  if (mode === "demo") launch("mail-server");
  // Stopped in reverse: the API takes no more work, then the worker finishes, then mail and database go.
  launch("worker");
  launch("api");
  const apiOrigin = `http://127.0.0.1:${apiPort}`;
  await reporter.step("server", async () => {
    await waitUntilReady(apiOrigin, shutdown);
    return { value: undefined, note: "ready" };
  });
  return {
    apiOrigin,
    accounts: readAccounts(dataDir),
    database,
    mailDir: join(dataDir, "mail"),
    environment,
  };
}

/**
 * The database comes up while the dependencies are installed and the builds run: neither needs the other.
 *
 * @param {{ dataDir: string, flavour: Flavour, shutdown: Shutdown, reporter: Reporter }} options
 * @returns {Promise<RunningDatabase>}
 */
async function openDatabaseAndBuild({ dataDir, flavour, shutdown, reporter }) {
  const prepare = async () => {
    await reporter.step("dependencies", async (say) => {
      const outcome = await installDependencies({ root, shutdown, say });
      return { value: undefined, note: outcome };
    });
    if (flavour === "built") await buildAll({ shutdown, reporter });
  };
  const [database] = await Promise.all([openDatabase({ dataDir, shutdown, reporter }), prepare()]);
  return database;
}

/**
 * Builds client and server, each only when its sources have changed.
 *
 * @param {{ shutdown: Shutdown, reporter: Reporter }} options
 * @returns {Promise<void>}
 */
export async function buildAll({ shutdown, reporter }) {
  await Promise.all([
    reporter.step("web client", async () => ({ value: undefined, note: await buildWeb(shutdown) })),
    reporter.step("api", async () => ({ value: undefined, note: await buildServer(shutdown) })),
  ]);
}

/**
 * @param {string} origin
 * @param {Shutdown} shutdown
 */
async function waitUntilReady(origin, shutdown) {
  const deadline = Date.now() + readyPatienceMs;
  while (!(await isReady(origin))) {
    shutdown.check();
    if (Date.now() > deadline) {
      throw new PlainError(
        `The server did not become ready within ${readyPatienceMs / 1000} seconds. Its log says why.`,
      );
    }
    await sleep(60);
  }
}

/** @param {string} origin */
async function isReady(origin) {
  try {
    const answer = await fetch(`${origin}/health/ready`, { signal: AbortSignal.timeout(2_000) });
    return answer.ok;
  } catch {
    return false;
  }
}
