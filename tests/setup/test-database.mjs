import { join } from "node:path";
import { applyMigrations } from "@emberladder/db/migrate";
import { startDatabase } from "@emberladder/db/server";

/** @typedef {import("./test-folder.mjs").TestFolder} TestFolder */

/**
 * What a test process needs to know about the database server of its run.
 *
 * @typedef {{ socket: string, port: number, template: string, users: import("@emberladder/db/server").DatabaseUsers
 * }} TestDatabaseFacts
 */

/**
 * Starts the one MariaDB of a test run and migrates its template database, from which every test worker gets a
 * copy.
 *
 * @param {TestFolder} folder where its data goes
 * @returns {Promise<{ facts: TestDatabaseFacts, stop: () => Promise<void> }>}
 */
export async function startTestDatabase(folder) {
  const database = await startDatabase({
    dataDir: join(folder.path, "db"),
    database: "emberladder",
    sideDatabases: "emberladder\\_%",
  });
  try {
    await applyMigrations({ url: database.migratorUrl });
    await database.grantApplication();
  } catch (error) {
    await database.stop();
    throw error;
  }
  const { socket, port, users } = database;
  return { facts: { socket, port, users, template: database.database }, stop: database.stop };
}
