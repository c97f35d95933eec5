import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { applyMigrations } from "@emberladder/db/migrate";
import { sendSignal, startDatabase } from "@emberladder/db/server";
import type { RunningDatabase } from "@emberladder/db/server";
import { afterAll, beforeAll, expect, test } from "vitest";
import { makeCompany } from "../api/support/company.ts";
import { startTestServer } from "../api/support/test-server.ts";
import type { TestServer } from "../api/support/test-server.ts";
import { expectWhole } from "./support/expect-whole.ts";
import { takePhone } from "./support/phone.ts";
import { seededRandom } from "./support/seeded-random.ts";

const KILLS = 5;

let folder: string;
let running: RunningDatabase;
let server: TestServer;
const startAgain = async () => {
  running = await startDatabase({ dataDir: folder });
};
beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), "emberladder-kill-"));
  await startAgain();
  await applyMigrations({ url: running.migratorUrl });
  await running.grantApplication();
  server = await startTestServer({ RATE_LIMIT_SCALE: "1000" }, { url: running.applicationUrl });
});
afterAll(async () => {
  await server.close();
  await running.stop();
  rmSync(folder, { recursive: true, force: true });
});

test("MariaDB killed and started again in the middle of batches loses nothing that was acknowledged", async () => {
  const random = seededRandom(20_260_122);
  const company = await makeCompany(server);
  const phones = await Promise.all([
    takePhone(company, "technician", 6000),
    takePhone(company, "senior", 6000),
  ]);
  const runs = phones.map(async (phone) => phone.run());
  for (let round = 0; round < KILLS; round += 1) {
    await sleep(100 + random() * 200);
    const ended = new Promise<void>((resolve) => running.onUnexpectedEnd(resolve));
    sendSignal(running.mark.pid, "SIGKILL");
    await ended;
    const known = phones.map(({ refusals }) => refusals.length);
    await expect
      .poll(() => phones.every(({ refusals }, index) => refusals.length > (known[index] ?? 0)), {
        timeout: 15_000,
      })
      .toBe(true);
    await startAgain();
    const acknowledged = phones.map((phone) => phone.acknowledged.size);
    // The same API process goes on by itself.
    await expect
      .poll(() => phones.every((phone, index) => phone.acknowledged.size > (acknowledged[index] ?? 0)), {
        timeout: 15_000,
      })
      .toBe(true);
  }
  for (const phone of phones) phone.stop();
  await Promise.all(runs);
  expect(server.logged.filter((line) => line.includes('"fault"'))).toEqual([]);
  for (const phone of phones) {
    await expectWhole(server.database, phone);
    // While it was away every request was asked to come back, and no other refusal was ever given.
    const kinds = new Set(phone.refusals.map(({ status, code }) => `${status} ${code}`));
    expect([...kinds]).toEqual(["503 database-away"]);
    expect(phone.refusals.every(({ retryAfter }) => Number(retryAfter) > 0)).toBe(true);
  }
}, 180_000);
