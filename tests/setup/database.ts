import { administer, copyDatabase, databaseUrl, grantApplication } from "@emberladder/db/server";
import { inject } from "vitest";

/** A database that belongs to one test worker. `url` is the application's, which cannot change the schema. */
export interface WorkerDatabase {
  name: string;
  url: string;
  migratorUrl: string;
}

/**
 * The database of this test worker: a copy of the migrated template, made at the first call and shared by the
 * files that run in the same worker one after the other. A test isolates itself by making its own company.
 *
 * @example const { url } = await workerDatabase();
 */
export async function workerDatabase(): Promise<WorkerDatabase> {
  const { socket, port, users, template } = inject("testDatabase");
  const name = `${template}_worker_${process.env["VITEST_POOL_ID"] ?? "1"}`;
  const [[wanted = "0", present = "0"] = []] = await administer({
    socket,
    sql: `select sum(table_schema = '${template}'), sum(table_schema = '${name}') from information_schema.tables
          where table_schema in ('${template}', '${name}');`,
  });
  if (wanted !== present) {
    await copyDatabase({ socket, from: template, to: name });
    await grantApplication({ socket, database: name, application: users.application });
  }
  return {
    name,
    url: databaseUrl({ user: users.application, port, database: name }),
    migratorUrl: databaseUrl({ user: users.migrator, port, database: name }),
  };
}

/**
 * A database with nothing in it, for tests of migrations and of the first run.
 *
 * @param purpose letters that go into its name
 */
export async function emptyDatabase(purpose: string): Promise<WorkerDatabase> {
  const { socket, port, users, template } = inject("testDatabase");
  const name = `${template}_${purpose}_${process.env["VITEST_POOL_ID"] ?? "1"}`;
  await administer({
    socket,
    sql: `drop database if exists ${name};
          create database ${name} character set utf8mb4 collate utf8mb4_unicode_520_ci;`,
  });
  return {
    name,
    url: databaseUrl({ user: users.application, port, database: name }),
    migratorUrl: databaseUrl({ user: users.migrator, port, database: name }),
  };
}

/** Gives the application its rights on a database whose tables were made after it was copied or emptied. */
export async function grantOn(name: string): Promise<void> {
  const { socket, users } = inject("testDatabase");
  await grantApplication({ socket, database: name, application: users.application });
}

/** Runs SQL as the database's administrator, on any database of this run. Rows come back as text. */
export async function administerTests(sql: string): Promise<string[][]> {
  return administer({ socket: inject("testDatabase").socket, sql });
}
