import { setTimeout as sleep } from "node:timers/promises";
import { afterAll, beforeAll, expect, test } from "vitest";
import { makeCompany } from "../api/support/company.ts";
import { workerDatabase } from "../setup/database.ts";
import { bundleServer, prepareApiProcess } from "../support/api-process.ts";
import type { ApiProcess, ServerBundle } from "../support/api-process.ts";
import { expectWhole } from "./support/expect-whole.ts";
import { takePhone } from "./support/phone.ts";
import { seededRandom } from "./support/seeded-random.ts";

const KILLS = 20;
/** A batch takes some ten milliseconds, so that the kill falls anywhere in the first few. */
const LONGEST_LIFE_MS = 120;

let bundle: ServerBundle;
let api: ApiProcess;
beforeAll(async () => {
  bundle = await bundleServer();
  api = await prepareApiProcess(bundle, (await workerDatabase()).url, { RATE_LIMIT_SCALE: "1000" });
  await api.start();
});
afterAll(async () => {
  await api.close();
  await bundle.remove();
});

test("the API killed twenty times in the middle of batches loses and doubles nothing", async () => {
  const random = seededRandom(20_260_112);
  const company = await makeCompany(api);
  const phones = await Promise.all([
    takePhone(company, "technician", 12_000),
    takePhone(company, "senior", 12_000),
  ]);
  let unsettled = 0;
  for (let round = 0; round < KILLS; round += 1) {
    const before = phones.map(({ outbox }) => outbox());
    const runs = phones.map(async (phone) => phone.run());
    await sleep(random() * LONGEST_LIFE_MS);
    await api.kill();
    for (const phone of phones) phone.stop();
    await Promise.all(runs);
    for (const phone of phones) await expectWhole(api.database, phone);
    unsettled += phones.filter(
      (phone, index) => phone.outbox() > 0 && phone.outbox() <= (before[index] ?? 0),
    ).length;
    await api.start();
  }
  // Every kill found both phones in the middle of their work.
  expect(unsettled).toBe(2 * KILLS);
  expect(phones.every(({ acknowledged }) => acknowledged.size > 0)).toBe(true);
}, 300_000);

test("after the kills the rest is sent, and the server has all of it", async () => {
  const company = await makeCompany(api);
  const phone = await takePhone(company, "technician", 240);
  const run = phone.run();
  await sleep(30);
  await api.kill();
  await api.start();
  await run;
  expect(phone.outbox()).toBe(0);
  expect(phone.acknowledged.size).toBe(phone.made.length);
  await expectWhole(api.database, phone);
});
