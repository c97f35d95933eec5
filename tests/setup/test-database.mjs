import { join } from "node:path";
import { applyMigrations } from "@emberladder/db/migrate";
import { startDatabase } from "@emberladder/db/server";
import { makeTestFolder } from "./test-folder.mjs";

/**
 * What a test process needs to know about the database server of its run.
 *
 * @typedef {{ socket: string, port: number, template: string, users: import("@emberladder/db/server").DatabaseUsers,
 *   folder: string }} TestDatabaseFacts
 */

/**
 * Starts the one MariaDB of a test run in a temporary folder and migrates its template database, from which every
 * test worker gets a copy.
 *
 * @returns {Promise<{ facts: TestDatabaseFacts, stop: () => Promise<void> }>} `stop` also removes the folder
 */
export async function startTestDatabase() {
  const folder = await makeTestFolder();
  try {
    const database = await startDatabase({
      dataDir: join(folder.path, "db"),
      database: "emberladder",
      sideDatabases: "emberladder\\_%",
    });
    const stop = async () => {
      await database.stop();
      folder.remove();
    };
    try {
      await applyMigrations({ url: database.migratorUrl });
      await database.grantApplication();
    } catch (error) {
      await stop();
      throw error;
    }
    const { socket, port, users } = database;
    return { facts: { socket, port, users, template: database.database, folder: folder.path }, stop };
  } catch (error) {
    folder.remove();
    throw error;
  }
}
