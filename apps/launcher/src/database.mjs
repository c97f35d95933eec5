import { join } from "node:path";
import { startDatabase } from "../../../db/src/server/server.mjs";

/** @typedef {import("../../../db/src/server/server.mjs").RunningDatabase} RunningDatabase */
/** @typedef {import("./report.mjs").Reporter} Reporter */
/** @typedef {import("./shutdown.mjs").Shutdown} Shutdown */

/**
 * Starts the product's database and arranges that it is stopped last.
 *
 * @param {{ dataDir: string, shutdown: Shutdown, reporter: Reporter }} options
 * @returns {Promise<RunningDatabase>}
 */
export async function openDatabase({ dataDir, shutdown, reporter }) {
  return reporter.step("database", async (say) => {
    const database = await shutdown.starting(
      startDatabase({ dataDir: join(dataDir, "db"), report: say }).then((started) => {
        shutdown.add("the database", started.stop);
        return started;
      }),
    );
    shutdown.check();
    return { value: database, note: `MariaDB on 127.0.0.1:${database.port}` };
  });
}

/**
 * Brings the database to the newest schema and gives the application its rights. Needs the dependencies.
 *
 * @param {RunningDatabase} database
 * @param {{ shutdown: Shutdown, reporter: Reporter }} options
 * @returns {Promise<void>}
 */
export async function migrateDatabase(database, { shutdown, reporter }) {
  await reporter.step("migrations", async (say) => {
    // Loaded only now: it needs the database driver, which is not there before the dependencies are installed.
    const { applyMigrations } = await import("../../../db/src/migrate/migrate.mjs");
    const { applied, total } = await shutdown.starting(
      applyMigrations({ url: database.migratorUrl, report: say }),
    );
    await database.grantApplication();
    shutdown.check();
    return {
      value: undefined,
      note: applied === 0 ? "none new" : `${applied} of ${total} statements applied`,
    };
  });
}

/**
 * Tells whether the database holds no company yet.
 *
 * @param {RunningDatabase} database
 * @returns {Promise<boolean>}
 */
export async function isEmpty(database) {
  const rows = await database.administer(`select exists (select 1 from \`${database.database}\`.companies)`);
  return rows[0]?.[0] === "0";
}
