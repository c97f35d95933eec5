/**
 * The project's own MariaDB: its own data folder, port, users and passwords, on the loopback address only.
 *
 * Everything here is plain JavaScript without dependencies, because it runs on a bare machine, before anything
 * has been installed.
 */
import { setTimeout as sleep } from "node:timers/promises";
import { administer, copyDatabase } from "./administer.mjs";
import { locateDataFolder, prepareDataFolder, removeSocketFolder } from "./data-folder.mjs";
import { ensureMariadb } from "./debian-packages.mjs";
import { PlainError } from "./plain-error.mjs";
import { findFreePort, isPortFree } from "./ports.mjs";
import { readJson, writePrivateJson } from "./private-file.mjs";
import { endProcess, isRunning, markProcess } from "./processes.mjs";
import { launchServer, PortTakenError, stopLeftoverServers } from "./server-process.mjs";
import { createDatabaseAndUsers, databaseUrl, grantApplication, inventUsers } from "./users.mjs";

export { administer, copyDatabase } from "./administer.mjs";
export { appendOnlyTables } from "./append-only-tables.mjs";
export { ensureMariadb, ensureProgram, findProgram } from "./debian-packages.mjs";
export { describeError, PlainError } from "./plain-error.mjs";
export { findFreePort, isPortFree } from "./ports.mjs";
export { readJson, writePrivateJson } from "./private-file.mjs";
export { endProcess, isRunning, markProcess, sendSignal } from "./processes.mjs";
export { runCommand } from "./run-command.mjs";
export { databaseUrl, grantApplication } from "./users.mjs";

/** @typedef {import("./processes.mjs").ProcessMark} ProcessMark */
/** @typedef {import("./users.mjs").DatabaseUsers} DatabaseUsers */
/** @typedef {import("./debian-packages.mjs").Report} Report */

/**
 * What the data folder remembers from one start to the next. Holds passwords: mode 0600.
 *
 * @typedef {{ port: number, users: DatabaseUsers, owner?: ProcessMark, server?: ProcessMark }} Settings
 */

/**
 * A running database.
 *
 * - `port`, `socket`: where it listens; `database`: the name of the product's database; `users`: both users
 * - `migratorUrl`, `applicationUrl`: `mysql://...` addresses for mysql2
 * - `isNew`: the data folder was made by this start
 * - `grantApplication()`: gives the application its rights on all tables there are; call after each migration
 * - `copyDatabase(from, to)`: makes a second database from one, for tests
 * - `administer(sql)`: runs SQL as the administrator
 * - `onUnexpectedEnd(listener)`: called when the server ends without `stop()`
 * - `stop()`: shuts the server down cleanly; safe to call twice
 *
 * @typedef {object} RunningDatabase
 * @property {number} port
 * @property {string} socket
 * @property {string} database
 * @property {DatabaseUsers} users
 * @property {string} migratorUrl
 * @property {string} applicationUrl
 * @property {boolean} isNew
 * @property {ProcessMark} mark
 * @property {(options?: { database?: string, eventTables?: readonly string[] }) => Promise<void>} grantApplication
 * @property {(from: string, to: string) => Promise<void>} copyDatabase
 * @property {(sql: string) => Promise<string[][]>} administer
 * @property {(listener: () => void) => void} onUnexpectedEnd
 * @property {() => Promise<void>} stop
 */

/**
 * Starts the database of one data folder, making the folder when it is missing.
 *
 * Recovers by itself from a killed earlier run: a half-made folder is removed, a server that was left running is
 * shut down, and InnoDB replays what had been committed.
 *
 * @param {object} options
 * @param {string} options.dataDir folder of this database, for instance `.data/demo/db`
 * @param {number} [options.port] default: the port of the last start, or any free one
 * @param {string} [options.database] name, default `emberladder`
 * @param {string} [options.sideDatabases] LIKE pattern of further databases the migrator may create (tests)
 * @param {Report} [options.report]
 * @returns {Promise<RunningDatabase>}
 * @throws {PlainError} when MariaDB cannot be had, another process already serves this folder, or the given port
 * is busy
 */
export async function startDatabase({
  dataDir,
  port,
  database = "emberladder",
  sideDatabases,
  report = () => undefined,
}) {
  const program = await ensureMariadb({ report });
  const folder = locateDataFolder(dataDir);
  const earlier = readSettings(folder.settings);
  if (earlier?.owner !== undefined && earlier.owner.pid !== process.pid && isRunning(earlier.owner)) {
    throw new PlainError(
      `The database in ${folder.root} is already in use by process ${earlier.owner.pid}. Stop that one first.`,
    );
  }
  if (port !== undefined && !(await isPortFree(port))) {
    throw new PlainError(`Port ${port} for the database is in use by another program. Choose another one.`);
  }
  await stopLeftoverServers(folder, { report });
  const { isNew } = await prepareDataFolder(folder, { report });

  const users = earlier?.users ?? inventUsers();
  const started = await launchOnFreePort({
    program,
    folder,
    wanted: port ?? earlier?.port,
    isFixed: port !== undefined,
    report,
  });
  let isStopping = false;
  const stop = async () => {
    isStopping = true;
    await endProcess(started.mark, { patienceMs: 60_000 });
    writePrivateJson(folder.settings, { port: started.port, users });
    removeSocketFolder(folder);
  };
  try {
    const owner = markProcess(process.pid);
    writePrivateJson(folder.settings, { port: started.port, users, owner, server: started.mark });
    await createDatabaseAndUsers({ socket: folder.socket, database, users, sideDatabases });
  } catch (error) {
    await stop();
    throw error;
  }

  return {
    port: started.port,
    socket: folder.socket,
    database,
    users,
    migratorUrl: databaseUrl({ user: users.migrator, port: started.port, database }),
    applicationUrl: databaseUrl({ user: users.application, port: started.port, database }),
    isNew,
    mark: started.mark,
    grantApplication: async (options = {}) =>
      grantApplication({ socket: folder.socket, database, application: users.application, ...options }),
    copyDatabase: async (from, to) => copyDatabase({ socket: folder.socket, from, to }),
    administer: async (sql) => administer({ socket: folder.socket, sql }),
    onUnexpectedEnd: (listener) => {
      started.child.once("exit", () => {
        if (!isStopping) listener();
      });
    },
    stop,
  };
}

/**
 * Starts the server on the wanted port, or on another one when that is busy and nobody asked for it by number.
 *
 * @param {{ program: string, folder: import("./data-folder.mjs").DataFolder, wanted: number | undefined,
 *   isFixed: boolean, report: Report }} request
 */
async function launchOnFreePort({ program, folder, wanted, isFixed, report }) {
  let port = wanted !== undefined && (isFixed || (await isPortFree(wanted))) ? wanted : await findFreePort();
  if (wanted !== undefined && port !== wanted)
    report(`port ${wanted} of the last start is busy, using ${port}`);
  for (let attempt = 1; ; attempt += 1) {
    try {
      return { port, ...(await launchServer({ program, folder, port })) };
    } catch (error) {
      if (!(error instanceof PortTakenError)) throw error;
      if (isFixed || attempt === 5) {
        throw new PlainError(
          `Port ${port} for the database is in use by another program. Choose another one.`,
        );
      }
      await sleep(50);
      port = await findFreePort();
    }
  }
}

/**
 * @param {string} path
 * @returns {Settings | undefined} undefined when there is no file, or one that this version does not understand
 */
function readSettings(path) {
  const value = /** @type {Partial<Settings> | undefined} */ (readJson(path));
  const isUsable =
    typeof value?.port === "number" &&
    typeof value.users?.migrator?.password === "string" &&
    typeof value.users.application?.password === "string";
  return isUsable ? /** @type {Settings} */ (value) : undefined;
}
