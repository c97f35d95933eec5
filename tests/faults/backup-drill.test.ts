import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { rebuildProjections } from "@emberladder/api/src/modules/rebuild/rebuild-projections.ts";
import { verifyStoredRecord } from "@emberladder/api/src/modules/diagnoses/verify-stored-record.ts";
import { auditLog, diagnoses, events, noteTexts, openDatabase, people } from "@emberladder/db";
import type { Database } from "@emberladder/db";
import { applyMigrations } from "@emberladder/db/migrate";
import { runCommand, startDatabase } from "@emberladder/db/server";
import type { RunningDatabase } from "@emberladder/db/server";
import { noteHash } from "@emberladder/diagnosis";
import { asc, sql } from "drizzle-orm";
import { afterAll, beforeAll, expect, test } from "vitest";
import { makeCompany } from "../api/support/company.ts";
import { doorAllWell, startRecord } from "../api/support/record.ts";
import { startTestServer } from "../api/support/test-server.ts";
import type { TestServer } from "../api/support/test-server.ts";

/* The drill of docs/operating.md: a dump while the product runs, and a restore into a folder that is empty. */
let folder: string;
let first: RunningDatabase;
let server: TestServer;
const startIn = async (name: string) => {
  const database = await startDatabase({ dataDir: join(folder, name) });
  await applyMigrations({ url: database.migratorUrl });
  await database.grantApplication();
  return database;
};
beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), "emberladder-drill-"));
  first = await startIn("old");
  server = await startTestServer({}, { url: first.applicationUrl });
});
afterAll(async () => {
  await server.close();
  await first.stop();
  rmSync(folder, { recursive: true, force: true });
});

const readAll = async (database: Database) => ({
  diagnoses: await database.select().from(diagnoses).orderBy(asc(diagnoses.id)),
  events: await database.select().from(events).orderBy(asc(events.diagnosisId), asc(events.serverSeq)),
  notes: await database.select().from(noteTexts).orderBy(asc(noteTexts.id)),
  people: await database.select().from(people).orderBy(asc(people.id)),
  audit: await database.select().from(auditLog).orderBy(asc(auditLog.id)),
});

test("a dump that was taken while the product ran comes back whole in an empty folder, and every record verifies", async () => {
  for (let count = 0; count < 3; count += 1) {
    const company = await makeCompany(server);
    const record = startRecord(company);
    const salt = "0123456789abcdef".repeat(2);
    // Letters of several scripts have to come back as they were.
    const text = "Señora Łucja: кот на печи, 猫 🔥";
    const note = { diagnosisId: record.diagnosisId, salt, text, hash: noteHash(salt, text) };
    const answer = await (
      await company.clientOf("technician")
    ).call("sendBatch", {
      body: {
        events: [record.open(), ...doorAllWell.map((body) => record.next("door.answered", body))],
        notes: [note],
      },
    });
    expect(answer.status).toBe(200);
  }
  // The commands of the guide, word for word but for the places.
  const dump = await runCommand("mariadb-dump", [
    "--no-defaults",
    `--socket=${first.socket}`,
    "--single-transaction",
    "--databases",
    "emberladder",
  ]);
  expect([dump.code, dump.stderr]).toEqual([0, ""]);
  const before = await readAll(server.database);
  expect(before.events).toHaveLength(12);

  const second = await startIn("new");
  const restore = await runCommand("mariadb", ["--no-defaults", `--socket=${second.socket}`], {
    input: dump.stdout,
  });
  expect([restore.code, restore.stderr]).toEqual([0, ""]);
  await second.stop();

  // The next start migrates, and gives the application its rights.
  const third = await startIn("new");
  const { database, close } = openDatabase(third.applicationUrl);
  try {
    const after = await readAll(database);
    expect(after).toEqual(before);
    for (const head of after.diagnoses)
      expect(
        verifyStoredRecord(
          after.events.filter(({ diagnosisId }) => diagnosisId === head.id),
          head,
        ),
      ).toEqual([]);
    expect(await rebuildProjections({ database, newId: server.dependencies.newId })).toMatchObject({
      diagnoses: 3,
      diagnosesChanged: 0,
      flagsAdded: 0,
      flagsRemoved: 0,
    });
    // 1142: denied on this table (MariaDB error code reference, from memory).
    const refusal: unknown = await database.execute(sql`delete from events`).catch((error: unknown) => error);
    expect((refusal as { cause?: { errno?: number } }).cause?.errno).toBe(1142);
  } finally {
    await close();
    await third.stop();
  }
});
