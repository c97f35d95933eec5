import type { DiagnosisDetail } from "@emberladder/contract";
import type { Envelope } from "@emberladder/diagnosis";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { administerTests, workerDatabase } from "../setup/database.ts";
import { makeCompany } from "./support/company.ts";
import { doorAllWell, startRecord } from "./support/record.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

/*
 * Somebody with the database administrator's rights alters a record by hand. The application's own user cannot
 * (see database-away.test.ts), so these run as the administrator. The kinds of alteration are those that an audit
 * trail has to show: changed, removed, inserted, moved, cut off at the end (21 CFR 11.10(e), from memory).
 */
let server: TestServer;
let table: string;
beforeAll(async () => {
  server = await startTestServer();
  table = `${(await workerDatabase()).name}.events`;
});
afterAll(async () => server.close());

/** A record of seven events, stored; `verify` reads it as a supervisor does. */
const keepRecord = async () => {
  const company = await makeCompany(server);
  const technician = await company.clientOf("technician");
  const record = startRecord(company);
  const list: Envelope[] = [
    record.open(),
    ...doorAllWell.map((body) => record.next("door.answered", body)),
    record.next("unit.confirmed", {}),
    record.next("watch.skipped", { why: "told" }),
    record.next("unit-state.set", { power: "off" }),
  ];
  await technician.call("sendBatch", { body: { events: list } });
  const supervisor = await company.clientOf("supervisor");
  const where = (serverSeq: number) =>
    `where diagnosis_id = '${record.diagnosisId}' and server_seq = ${serverSeq}`;
  return {
    where,
    list,
    verify: async () => {
      const params = { diagnosisId: record.diagnosisId };
      const answer = await supervisor.call("readDiagnosis", { params });
      expect(answer.status).toBe(200);
      return answer.json<DiagnosisDetail>();
    },
  };
};

describe("a record altered in the database", () => {
  it("is intact as long as nobody touched it", async () => {
    const { verify, list } = await keepRecord();
    const { verification, events } = await verify();
    expect(verification).toEqual({ intact: true, breaks: [] });
    expect(events).toHaveLength(list.length);
  });

  it("names the first event of whose text one bit was flipped, wherever the bit is", async () => {
    const { where, verify, list } = await keepRecord();
    const [[text = ""] = []] = await administerTests(`select hex(canonical_text) from ${table} ${where(3)};`);
    const bytes = Buffer.from(text, "hex");
    // From a fixed seed, so that a failure can be repeated: Numerical Recipes' generator, from memory.
    let seed = 20_260_112;
    const next = (below: number) => {
      seed = (Math.imul(seed, 1_664_525) + 1_013_904_223) >>> 0;
      return seed % below;
    };
    for (let round = 0; round < 40; round += 1) {
      const altered = Buffer.from(bytes);
      const at = next(bytes.length);
      // The seventh bit stays: the text is ASCII, and the database itself refuses what is no UTF-8.
      altered.writeUInt8(altered.readUInt8(at) ^ (1 << next(7)), at);
      await administerTests(
        `update ${table} set canonical_text = convert(unhex('${altered.toString("hex")}') using utf8mb4) ${where(3)};`,
      );
      const { verification, events } = await verify();
      expect(verification.intact, altered.toString()).toBe(false);
      expect(verification.breaks[0]?.serverSeq, altered.toString()).toBe(3);
      expect(events).toHaveLength(list.length);
    }
    await administerTests(
      `update ${table} set canonical_text = convert(unhex('${text}') using utf8mb4) ${where(3)};`,
    );
    expect((await verify()).verification.intact).toBe(true);
  });

  it("shows a removed event at the place that follows the gap", async () => {
    const { where, verify } = await keepRecord();
    await administerTests(`delete from ${table} ${where(4)};`);
    expect((await verify()).verification.breaks[0]).toMatchObject({ serverSeq: 5 });
  });

  it("misses an event that was cut off at the end", async () => {
    const { where, verify } = await keepRecord();
    await administerTests(`delete from ${table} ${where(7)};`);
    expect((await verify()).verification).toEqual({
      intact: false,
      breaks: [{ serverSeq: 7, reason: "server-order" }],
    });
  });

  it("shows two events that changed places at the first of the two", async () => {
    const { where, verify } = await keepRecord();
    await administerTests(
      [
        `update ${table} set server_seq = 100 ${where(3)};`,
        `update ${table} set server_seq = 3 ${where(5)};`,
        `update ${table} set server_seq = 5 ${where(100)};`,
      ].join("\n"),
    );
    expect((await verify()).verification.breaks[0]).toMatchObject({ serverSeq: 3 });
  });

  it("shows an event that was put in between", async () => {
    const { where, verify } = await keepRecord();
    await administerTests(
      [
        ...[7, 6, 5].map((place) => `update ${table} set server_seq = ${place + 1} ${where(place)};`),
        `insert into ${table}
           select uuid(), company_id, diagnosis_id, device_id, device_seq + 1000000, 5, type, schema_version,
                  canonical_text, hash, prev_hash, chain_hash, actor_id, received_at
           from ${table} ${where(4)};`,
      ].join("\n"),
    );
    expect((await verify()).verification.breaks[0]).toMatchObject({ serverSeq: 5 });
  });

  it.each([
    ["type", "'watch.started'"],
    ["hash", `'${"a".repeat(64)}'`],
    ["chain_hash", `'${"b".repeat(64)}'`],
    ["actor_id", "uuid()"],
    ["received_at", "date_add(received_at, interval 1 hour)"],
    ["device_seq", "device_seq + 1000000"],
  ])("shows a changed %s beside the text at its event", async (column, value) => {
    const { where, verify } = await keepRecord();
    await administerTests(`update ${table} set ${column} = ${value} ${where(2)};`);
    expect((await verify()).verification.breaks[0]).toMatchObject({ serverSeq: 2 });
  });
});
