import { spawn } from "node:child_process";
import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import net from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import {
  findFreePort,
  isRunning,
  startDatabase,
  type ProcessMark,
  type RunningDatabase,
} from "@emberladder/db/server";
import { createConnection, type RowDataPacket } from "mysql2/promise";
import { afterEach, beforeEach, describe, expect, test } from "vitest";

const victim = fileURLToPath(new URL("database-victim.mjs", import.meta.url));

let folder: string;
let running: RunningDatabase[];
let said: string[];

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "emberladder-server-"));
  running = [];
  said = [];
});
afterEach(async () => {
  for (const database of running) await database.stop();
  rmSync(folder, { recursive: true, force: true });
});

async function start(options: { port?: number; dataDir?: string } = {}): Promise<RunningDatabase> {
  const database = await startDatabase({ dataDir: folder, report: (line) => said.push(line), ...options });
  running.push(database);
  return database;
}

async function ask(url: string, sql: string): Promise<RowDataPacket[]> {
  const connection = await createConnection(url);
  try {
    const [rows] = await connection.query<RowDataPacket[]>(sql);
    return rows;
  } finally {
    await connection.end();
  }
}

async function refusal(url: string, sql: string): Promise<number | undefined> {
  return ask(url, sql).then(
    () => undefined,
    (error: unknown) => (error as { errno?: number }).errno,
  );
}

// SEC-22 and SEC-24: generated passwords, rights, no administrator over the network.
describe("the database server", () => {
  test("keeps data, port and passwords over a restart, and its settings are readable by nobody else", async () => {
    const first = await start();
    expect(first.isNew).toBe(true);
    await ask(first.migratorUrl, "create table readings (id int primary key)");
    await ask(first.migratorUrl, "insert into readings values (41)");
    await first.stop();
    const second = await start();
    expect(second.isNew).toBe(false);
    expect(second.migratorUrl).toBe(first.migratorUrl);
    expect(await ask(second.migratorUrl, "select id from readings")).toEqual([{ id: 41 }]);
    expect(statSync(join(folder, "server.json")).mode & 0o777).toBe(0o600);
  });

  test("commits to the disk, counts in UTC and compares without regard to case or accent", async () => {
    const { migratorUrl } = await start();
    const rows = await ask(
      migratorUrl,
      `select @@innodb_flush_log_at_trx_commit as flush, @@global.time_zone as zone, @@bind_address as address,
              @@collation_database as collation`,
    );
    expect(rows).toEqual([
      { flush: 1, zone: "+00:00", address: "127.0.0.1", collation: "utf8mb4_unicode_520_ci" },
    ]);
  });

  test("lets the application read and add events, change ordinary rows, and nothing else", async () => {
    const database = await start();
    await ask(database.migratorUrl, "create table events (id int primary key)");
    await ask(database.migratorUrl, "create table calls (id int primary key)");
    await ask(database.migratorUrl, "create table migration_statement (id int primary key)");
    await database.grantApplication();
    const url = database.applicationUrl;
    for (const sql of [
      "insert into events values (1)",
      "select * from events",
      "insert into calls values (1)",
      "update calls set id = 2",
      "delete from calls",
      "select * from migration_statement",
    ]) {
      expect(await refusal(url, sql), sql).toBeUndefined();
    }
    // 1142: command denied on this table; 1044: denied on this database. MariaDB error code reference, from memory.
    for (const sql of [
      "update events set id = 2",
      "delete from events",
      "truncate table events",
      "drop table calls",
      "alter table calls add x int",
      "create table more (id int)",
      "insert into migration_statement values (1)",
    ]) {
      expect(await refusal(url, sql), sql).toBe(1142);
    }
    expect(await refusal(url, "create database other")).toBe(1044);
  });

  test("takes a right away that the application should not have", async () => {
    const database = await start();
    await ask(database.migratorUrl, "create table events (id int primary key)");
    await database.administer(
      "grant update, delete on emberladder.events to 'emberladder_application'@'127.0.0.1'",
    );
    expect(await refusal(database.applicationUrl, "delete from events")).toBeUndefined();
    await database.grantApplication();
    expect(await refusal(database.applicationUrl, "delete from events")).toBe(1142);
  });

  test("has no administrator over the network", async () => {
    const { port } = await start();
    // 1130: host is not allowed; 1045: access denied; 1698: access denied, for a socket account.
    expect([1045, 1130, 1698]).toContain(await refusal(`mysql://root@127.0.0.1:${port}/mysql`, "select 1"));
  });
});

describe("a start after a killed run", () => {
  test("stops the server that was left behind and finds every acknowledged row", async () => {
    const mark = await new Promise<ProcessMark>((resolve) => {
      const child = spawn(process.execPath, [victim, folder], { stdio: "inherit" });
      child.once("close", () =>
        resolve(
          (JSON.parse(readFileSync(join(folder, "server.json"), "utf8")) as { server: ProcessMark }).server,
        ),
      );
    });
    expect(isRunning(mark)).toBe(true);
    const database = await start();
    expect(isRunning(mark)).toBe(false);
    expect(said.join()).toContain("an earlier, killed run left behind");
    expect(await ask(database.migratorUrl, "select count(*) as n from readings")).toEqual([{ n: 200 }]);
  });

  test("removes a folder that was never finished", async () => {
    mkdirSync(join(folder, "tables.unfinished/mysql"), { recursive: true });
    await start();
    expect(existsSync(join(folder, "tables.unfinished"))).toBe(false);
    expect(said.join()).toContain("half-made data folder");
  });

  test("leaves a folder alone that is not empty and not a database", async () => {
    mkdirSync(join(folder, "tables"));
    writeFileSync(join(folder, "tables/ibdata1"), "somebody's data");
    await expect(start()).rejects.toThrow("Nothing in it was changed");
    expect(readFileSync(join(folder, "tables/ibdata1"), "utf8")).toBe("somebody's data");
  });

  test("makes new passwords when the settings were lost, and keeps the data", async () => {
    const first = await start();
    await ask(first.migratorUrl, "create table readings (id int primary key)");
    await first.stop();
    writeFileSync(join(folder, "server.json"), "{ half a fi");
    const second = await start();
    expect(second.migratorUrl).not.toBe(first.migratorUrl);
    expect(await ask(second.migratorUrl, "select * from readings")).toEqual([]);
  });
});

describe("a start that meets somebody else", () => {
  test("takes another port when the one of the last start is busy", async () => {
    const first = await start();
    await first.stop();
    const intruder = net.createServer().listen(first.port, "127.0.0.1");
    try {
      const second = await start();
      expect(second.port).not.toBe(first.port);
      expect(said.join()).toContain(`port ${first.port} of the last start is busy`);
    } finally {
      intruder.close();
    }
  });

  test("says so when a port it was told to use is busy", async () => {
    const port = await findFreePort();
    const intruder = net.createServer().listen(port, "127.0.0.1");
    try {
      await expect(start({ port })).rejects.toThrow(`Port ${port} for the database is in use`);
    } finally {
      intruder.close();
    }
  });

  test("refuses a folder that another running process serves", async () => {
    const database = await start();
    const settings = join(folder, "server.json");
    const content = JSON.parse(readFileSync(settings, "utf8")) as { owner: ProcessMark };
    const parent = process.ppid;
    const { markProcess } = await import("@emberladder/db/server");
    writeFileSync(settings, JSON.stringify({ ...content, owner: markProcess(parent) }));
    await expect(startDatabase({ dataDir: folder })).rejects.toThrow(`already in use by process ${parent}`);
    expect(isRunning(database.mark)).toBe(true);
  });

  test("works in a folder whose path is too long for a socket", async () => {
    const dataDir = join(folder, "a".repeat(120));
    const database = await start({ dataDir });
    expect(Buffer.byteLength(database.socket)).toBeLessThan(108);
    expect(await ask(database.migratorUrl, "select 1 as one")).toEqual([{ one: 1 }]);
  });
});
