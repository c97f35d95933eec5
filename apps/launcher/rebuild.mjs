/**
 * `npm run rebuild`: works out again, from the events, everything that is kept beside them. Takes the database of
 * the running product, or starts it and stops it again.
 */
import { join } from "node:path";
import {
  databaseUrl,
  describeError,
  isRunning,
  PlainError,
  readJson,
  startDatabase,
} from "../../db/src/server/server.mjs";
import { runToEnd } from "./src/children.mjs";
import { readSettings } from "./src/environment.mjs";
import { root } from "./src/paths.mjs";
import { createShutdown } from "./src/shutdown.mjs";

/** @typedef {import("../../db/src/server/server.mjs").ProcessMark} ProcessMark */
/** @typedef {import("../../db/src/server/server.mjs").DatabaseUsers} DatabaseUsers */

const shutdown = createShutdown((text) => process.stderr.write(`${text}\n`));
for (const signal of /** @type {const} */ (["SIGINT", "SIGTERM", "SIGHUP"]))
  process.on(signal, () => void shutdown.run().then(() => process.exit(1)));
try {
  const { dataDir } = readSettings(process.env);
  await runToEnd(
    {
      name: "The rebuild",
      args: ["--import", "tsx", join(root, "apps/api/src/rebuild.ts")],
      cwd: join(root, "apps/api"),
      env: { ...process.env, DATABASE_URL: await findDatabase(join(dataDir, "db")) },
      logFile: undefined,
    },
    shutdown,
  );
} catch (error) {
  process.stderr.write(`${describeError(error)}\n`);
  process.exitCode = 1;
} finally {
  await shutdown.run();
}

/**
 * @param {string} folder of the database
 * @returns {Promise<string>} the application's address of it
 * @throws {PlainError} when nothing was ever kept there
 */
async function findDatabase(folder) {
  const kept = /** @type {{ port: number, users: DatabaseUsers, server?: ProcessMark } | undefined} */ (
    readJson(join(folder, "server.json"))
  );
  if (kept === undefined) throw new PlainError(`There is no database in ${folder}. Run npm start first.`);
  if (kept.server !== undefined && isRunning(kept.server))
    return databaseUrl({ user: kept.users.application, port: kept.port, database: "emberladder" });
  const database = await startDatabase({ dataDir: folder });
  shutdown.add("the database", database.stop);
  return database.applicationUrl;
}
