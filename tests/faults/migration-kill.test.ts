import { spawn } from "node:child_process";
import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { applyMigrations, migrationsFolder } from "@emberladder/db/migrate";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { administerTests, emptyDatabase, type WorkerDatabase } from "../setup/database.ts";

const fixture = fileURLToPath(new URL("migration-fixture", import.meta.url));
const victim = fileURLToPath(new URL("migration-victim.mjs", import.meta.url));

/** Runs a migration that kills itself; the code is 0 when there was nothing left to die of. */
async function migrateAndDie(
  database: WorkerDatabase,
  folder: string,
  phase: string,
  count: number,
): Promise<string> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [victim, database.migratorUrl, folder, phase, String(count)], {
      stdio: ["ignore", "ignore", "inherit"],
    });
    child.once("close", (code, signal) => resolve(signal ?? `code ${code}`));
  });
}

/** Everything information_schema knows about the shape of a database, and the rows of the fixture. */
async function describeDatabase(name: string): Promise<string[][]> {
  const own = "table_schema = database() and table_name not like 'migration%'";
  return administerTests(`
    use ${name};
    select table_name, table_collation, engine from information_schema.tables where ${own} order by 1;
    select table_name, column_name, ordinal_position, column_default, is_nullable, column_type, collation_name, extra
      from information_schema.columns where ${own} order by 1, 3;
    select table_name, index_name, non_unique, seq_in_index, column_name
      from information_schema.statistics where ${own} order by 1, 2, 4;
    select table_name, constraint_name, constraint_type
      from information_schema.table_constraints where ${own} order by 1, 2;
    select table_name, constraint_name, column_name, referenced_table_name, referenced_column_name
      from information_schema.key_column_usage where ${own} order by 1, 2, ordinal_position;
    select table_name, constraint_name, check_clause from information_schema.check_constraints
      where constraint_schema = database() order by 1, 2;
    select file, position, hash, finished_at is not null from migration_statement order by 1, 2;
  `);
}

async function migrateInOneGo(folder: string): Promise<{ shape: string[][]; total: number }> {
  const database = await emptyDatabase("whole");
  const { total, applied } = await applyMigrations({ url: database.migratorUrl, folder });
  expect(applied).toBe(total);
  const shape = await describeDatabase(database.name);
  expect(shape.length).toBeGreaterThan(20);
  return { shape, total };
}

describe("a migration killed in the middle", () => {
  test.each(["started", "executed", "finished"])(
    "at every statement, when it is %s, resumes to the same schema as in one go",
    async (phase) => {
      const { shape, total } = await migrateInOneGo(fixture);
      for (let statement = 1; statement <= total; statement += 1) {
        const database = await emptyDatabase("killed");
        expect(await migrateAndDie(database, fixture, phase, statement)).toBe("SIGKILL");
        await applyMigrations({ url: database.migratorUrl, folder: fixture });
        expect(await describeDatabase(database.name), `killed at statement ${statement}`).toEqual(shape);
        expect(await administerTests(`select name from ${database.name}.sites`)).toEqual([["Roof 1 east"]]);
      }
    },
  );

  test("of the product, killed after each statement in turn, resumes each time and ends at the same schema", async () => {
    const { shape, total } = await migrateInOneGo(migrationsFolder);
    const database = await emptyDatabase("product");
    // The statement that was run and not recorded is repeated by the next run, which dies after the one behind it.
    expect(await migrateAndDie(database, migrationsFolder, "executed", 1)).toBe("SIGKILL");
    for (let statement = 2; statement <= total; statement += 1) {
      expect(await migrateAndDie(database, migrationsFolder, "executed", 2), `statement ${statement}`).toBe(
        "SIGKILL",
      );
    }
    expect(await migrateAndDie(database, migrationsFolder, "executed", 2)).toBe("code 0");
    expect(await describeDatabase(database.name)).toEqual(shape);
  });
});

describe("a migration that must not go on", () => {
  let folder: string;
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), "emberladder-migrations-"));
    cpSync(fixture, folder, { recursive: true });
  });
  afterEach(() => rmSync(folder, { recursive: true, force: true }));

  const change = (file: string, from: string, to: string) =>
    writeFileSync(join(folder, file), readFileSync(join(folder, file), "utf8").replace(from, to));

  test("refuses a statement that was changed after it had been applied, and changes nothing", async () => {
    const database = await emptyDatabase("changed");
    await applyMigrations({ url: database.migratorUrl, folder });
    const before = await describeDatabase(database.name);
    change("0000_first.sql", "varchar(80)", "varchar(90)");
    writeFileSync(join(folder, "0002_third.sql"), "create table later (id int primary key);");
    await expect(applyMigrations({ url: database.migratorUrl, folder })).rejects.toThrow(
      "statement 1 of 0000_first.sql was changed after it had been applied",
    );
    expect(await describeDatabase(database.name)).toEqual(before);
  });

  test("refuses a database that is newer than the program", async () => {
    const database = await emptyDatabase("newer");
    await applyMigrations({ url: database.migratorUrl, folder });
    rmSync(join(folder, "0001_second.sql"));
    await expect(applyMigrations({ url: database.migratorUrl, folder })).rejects.toThrow(
      "this version of Emberladder does not know",
    );
  });

  test("names the statement that failed, and goes on from there once it is put right", async () => {
    const database = await emptyDatabase("wrong");
    change("0000_first.sql", "REFERENCES `sites`", "REFERENCES `roofs`");
    await expect(applyMigrations({ url: database.migratorUrl, folder })).rejects.toThrow(
      /^Statement 3 of 0000_first\.sql did not succeed: /,
    );
    change("0000_first.sql", "REFERENCES `roofs`", "REFERENCES `sites`");
    const result = await applyMigrations({ url: database.migratorUrl, folder });
    expect(result.applied).toBe(result.total - 2);
  });

  test("does not take a table that somebody made by hand for its own", async () => {
    const database = await emptyDatabase("by_hand");
    await administerTests(`create table ${database.name}.units (id int primary key)`);
    for (let attempt = 1; attempt <= 2; attempt += 1) {
      await expect(applyMigrations({ url: database.migratorUrl, folder })).rejects.toThrow(
        "Statement 2 of 0000_first.sql did not succeed",
      );
    }
  });
});

describe("two migrations at the same time", () => {
  test("one waits for the other, and each statement is applied once", async () => {
    const database = await emptyDatabase("both");
    const results = await Promise.all(
      [1, 2, 3].map(async () => applyMigrations({ url: database.migratorUrl, folder: fixture })),
    );
    const total = results[0]?.total ?? 0;
    expect(results.map((result) => result.applied).toSorted((a, b) => a - b)).toEqual([0, 0, total]);
  });

  test("gives up with a plain message when the other does not end, and takes over when its lease has run out", async () => {
    const database = await emptyDatabase("lease");
    await applyMigrations({ url: database.migratorUrl, folder: fixture });
    const hold = async (seconds: number) =>
      administerTests(`update ${database.name}.migration_lease
        set holder = 'other-machine 1 boot/1 x', expires_at = utc_timestamp(3) + interval ${seconds} second`);
    await hold(60);
    await expect(
      applyMigrations({ url: database.migratorUrl, folder: fixture, waitSeconds: 0.3 }),
    ).rejects.toThrow("Another process is migrating this database (other-machine");
    await hold(-1);
    await expect(applyMigrations({ url: database.migratorUrl, folder: fixture })).resolves.toMatchObject({
      applied: 0,
    });
  });
});
