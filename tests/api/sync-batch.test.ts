import { auditLog, diagnoses, eventFlags, events } from "@emberladder/db";
import type { Verdicts } from "@emberladder/contract";
import { MAX_BATCH_EVENTS } from "@emberladder/contract";
import { canonicalText, noteHash, seal, verifyRecord } from "@emberladder/diagnosis";
import type { Envelope, StoredEvent } from "@emberladder/diagnosis";
import { asc, eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { TestClient } from "./support/client.ts";
import { makeCompany } from "./support/company.ts";
import type { TestCompany } from "./support/company.ts";
import { doorAllWell, startRecord } from "./support/record.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

let server: TestServer;
let company: TestCompany;
let technician: TestClient;
beforeAll(async () => {
  server = await startTestServer();
  company = await makeCompany(server);
  technician = await company.clientOf("technician");
});
afterAll(async () => server.close());

const send = async (list: unknown[], client = technician, more: Record<string, unknown> = {}) => {
  const answer = await client.call("sendBatch", { body: { events: list, ...more } });
  expect(answer.status).toBe(200);
  return answer.json<Verdicts>();
};
const ids = (list: readonly { id: string | null }[]) => list.map(({ id }) => id);
const codes = (verdicts: Verdicts) => verdicts.rejected.map(({ code }) => code);
const stored = async (diagnosisId: string) =>
  server.database
    .select()
    .from(events)
    .where(eq(events.diagnosisId, diagnosisId))
    .orderBy(asc(events.serverSeq));

// SEC-12: order, repetition and rules of a record.
describe("a batch of events", () => {
  it("is accepted in order with places from 1 without a gap, and its text stored as it was hashed", async () => {
    const record = startRecord(company);
    const list = [record.open(), ...doorAllWell.map((body) => record.next("door.answered", body))];
    const verdicts = await send(list);
    expect(verdicts.accepted).toEqual(list.map(({ id }, index) => ({ id, serverSeq: index + 1 })));
    expect(verdicts.rejected).toEqual([]);
    expect(verdicts.heads).toEqual({ [record.diagnosisId]: 4 });
    const rows = await stored(record.diagnosisId);
    expect(rows.map(({ canonicalText: text }) => text)).toEqual(
      list.map(({ hash: _hash, ...rest }) => canonicalText(rest)),
    );
    expect(rows.every(({ actorId }) => actorId === company.people.technician.id)).toBe(true);
  });

  it("opens the diagnosis on its call, which is then under way", async () => {
    const own = await makeCompany(server);
    const client = await own.clientOf("technician");
    const record = startRecord(own);
    await send([record.open()], client);
    const call = (await client.call("readCall", { params: { callId: own.callId } })).json<{
      status: string;
      openDiagnosisId: string;
    }>();
    expect(call).toMatchObject({ status: "under-way", openDiagnosisId: record.diagnosisId });
  });

  it("sent again is duplicate for all of it and changes nothing", async () => {
    const record = startRecord(company);
    const list = [record.open(), record.next("watch.skipped", { why: "told" })];
    await send(list);
    const before = await stored(record.diagnosisId);
    const again = await send(list);
    expect(again.duplicate).toEqual(list.map(({ id }, index) => ({ id, serverSeq: index + 1 })));
    expect(again.accepted).toEqual([]);
    expect(await stored(record.diagnosisId)).toEqual(before);
  });

  it("that overlaps an earlier one takes only what is new", async () => {
    const record = startRecord(company);
    const list = [record.open(), ...doorAllWell.map((body) => record.next("door.answered", body))];
    await send(list.slice(0, 3));
    const verdicts = await send(list.slice(1));
    expect(ids(verdicts.duplicate)).toEqual(ids(list.slice(1, 3)));
    expect(ids(verdicts.accepted)).toEqual(ids(list.slice(3)));
  });

  it("with an event twice in it accepts it once", async () => {
    const record = startRecord(company);
    const open = record.open();
    const verdicts = await send([open, open]);
    expect([ids(verdicts.accepted), ids(verdicts.duplicate)]).toEqual([[open.id], [open.id]]);
  });

  it("refuses an id that was received with another content, and never overwrites it", async () => {
    const record = startRecord(company);
    const open = record.open();
    await send([open]);
    const { hash: _hash, ...rest } = open;
    const other = seal({ ...rest, appBuild: "altered" });
    const verdicts = await send([other]);
    expect(verdicts.rejected).toMatchObject([{ id: open.id, code: "conflict", retryable: false }]);
    expect((await stored(record.diagnosisId)).map(({ hash }) => hash)).toEqual([open.hash]);
  });

  it("refuses a device number that another event has, and does not call it a duplicate", async () => {
    const record = startRecord(company);
    const open = record.open();
    await send([open]);
    const clash = record.next("watch.skipped", { why: "told" }, { deviceSeq: open.deviceSeq });
    const verdicts = await send([clash]);
    expect(codes(verdicts)).toEqual(["seq-conflict"]);
    expect(verdicts.duplicate).toEqual([]);
    // Also where the number was used in another diagnosis of the same device.
    const elsewhere = startRecord(company);
    const opened = elsewhere.open();
    const second = elsewhere.next("watch.skipped", { why: "told" });
    await send([opened, second]);
    const third = startRecord(company);
    const { hash: _hash, ...rest } = third.open();
    expect(codes(await send([seal({ ...rest, deviceSeq: second.deviceSeq })]))).toEqual(["seq-conflict"]);
  });

  it("stops at the first refused event of a diagnosis and takes what comes before it", async () => {
    const record = startRecord(company);
    const [open, one, two] = [
      record.open(),
      record.next("watch.skipped", { why: "told" }),
      record.next("unit-state.set", { power: "off" }),
    ];
    const verdicts = await send([open, { ...one, hash: "0".repeat(64) }, two]);
    expect(ids(verdicts.accepted)).toEqual([open.id]);
    expect(verdicts.rejected.map(({ id, code, retryable }) => ({ id, code, retryable }))).toEqual([
      { id: one.id, code: "wrong-hash", retryable: false },
      { id: two.id, code: "after-refused", retryable: true },
    ]);
  });

  it("holds back only the diagnosis of a refused event", async () => {
    const [bad, good] = [startRecord(company), startRecord(company)];
    const opened = good.open();
    const second = good.next("watch.skipped", { why: "told" });
    const verdicts = await send([opened, { ...bad.open(), hash: "f".repeat(64) }, second]);
    expect(ids(verdicts.accepted)).toEqual([opened.id, second.id]);
    expect(codes(verdicts)).toEqual(["wrong-hash"]);
  });

  it("refuses an event whose link does not continue the device's last one", async () => {
    const record = startRecord(company);
    const open = record.open();
    await send([open]);
    record.goOnFrom(undefined);
    const verdicts = await send([record.next("watch.skipped", { why: "told" })]);
    expect(codes(verdicts)).toEqual(["broken-link"]);
  });

  it("names what is malformed, by itself and without a fault of the server", async () => {
    const record = startRecord(company);
    const open = record.open();
    const { hash: _hash, ...rest } = open;
    const wrong: unknown[] = [
      null,
      7,
      "text",
      [],
      {},
      { ...open, extra: 1 },
      { ...open, occurredAt: 1.5 },
      { ...open, type: "Not a type" },
      seal({ ...rest, body: { ...rest.body, callId: "not an id" } }),
      seal({ ...rest, body: { ...rest.body, surprise: true } }),
    ];
    const verdicts = await send(wrong);
    expect(verdicts.accepted).toEqual([]);
    expect(verdicts.rejected.map(({ index }) => index)).toEqual(wrong.map((_event, index) => index));
    expect(new Set(codes(verdicts))).toEqual(new Set(["malformed", "after-refused"]));
    expect(await stored(record.diagnosisId)).toEqual([]);
  });

  it("refuses numbers that JSON cannot carry and keys that reach a prototype", async () => {
    const record = startRecord(company);
    const open = record.open();
    const text = JSON.stringify({ events: [open] });
    const headers = { "content-type": "application/json" };
    const huge = await technician.send("/api/sync/batch", {
      method: "POST",
      headers,
      body: text.replace('"tree":null', '"tree":1e309'),
    });
    expect(codes(huge.json<Verdicts>())).toEqual(["malformed"]);
    for (const key of ["__proto__", "constructor", "prototype"]) {
      const answer = await technician.send("/api/sync/batch", {
        method: "POST",
        headers,
        body: text.replace('"tree":null', `"tree":null,"${key}":{"isAdmin":true}`),
      });
      expect([key, answer.status, answer.code]).toEqual([key, 400, "malformed-body"]);
    }
  });

  it("keeps a type and a version that this build does not know, and flags them", async () => {
    const record = startRecord(company);
    const list = [
      record.open(),
      record.next("future.happened", { any: ["thing", 1] }),
      record.next("watch.skipped", { newer: true }, { schemaVersion: 900 }),
    ];
    const verdicts = await send(list);
    expect(ids(verdicts.accepted)).toEqual(ids(list));
    expect(verdicts.flags.map(({ rule }) => rule)).toEqual(["unknown-step", "unknown-step"]);
  });

  it("accepts an event that is against a rule of the trade, and flags it", async () => {
    const record = startRecord(company);
    const list = [
      record.open(),
      record.next("diagnosis.closed", {
        outcome: "fixed",
        left: { inService: true, gas: "open", power: "on" },
      }),
    ];
    const verdicts = await send(list);
    expect(ids(verdicts.accepted)).toEqual(ids(list));
    expect(verdicts.flags.map(({ rule }) => rule)).toContain("not-concluded");
    const [row] = await server.database.select().from(diagnoses).where(eq(diagnoses.id, record.diagnosisId));
    expect(row).toMatchObject({ status: "closed", outcome: "fixed", flags: verdicts.flags.length });
    const flags = await server.database
      .select()
      .from(eventFlags)
      .where(eq(eventFlags.diagnosisId, record.diagnosisId));
    expect(flags).toHaveLength(verdicts.flags.length);
  });

  it("flags a clock that is off by more than five minutes and never refuses it", async () => {
    const record = startRecord(company);
    const { hash: _hash, ...open } = record.open();
    const nineHours = seal({
      ...open,
      serverOffsetMs: -9 * 3_600_000,
      occurredAt: open.occurredAt + 9 * 3_600_000,
    });
    const verdicts = await send([nineHours]);
    expect(ids(verdicts.accepted)).toEqual([nineHours.id]);
    expect(verdicts.flags).toMatchObject([{ rule: "clock-off", params: { minutes: -540 } }]);
  });

  it("keeps both streams of two devices on one diagnosis, and flags the second", async () => {
    const first = startRecord(company);
    const open = first.open();
    await send([open]);
    const senior = await company.clientOf("senior");
    const second = startRecord(company, {
      deviceId: company.people.senior.deviceId,
      diagnosisId: first.diagnosisId,
    });
    const theirs = second.next("unit-state.set", { power: "off" });
    const verdicts = await send([theirs], senior);
    expect(ids(verdicts.accepted)).toEqual([theirs.id]);
    expect(verdicts.flags.map(({ rule }) => rule)).toContain("second-device");
    const mine = first.next("watch.skipped", { why: "told" });
    expect((await send([mine])).accepted).toEqual([{ id: mine.id, serverSeq: 3 }]);
    const detail = (
      await technician.call("readDiagnosis", { params: { diagnosisId: first.diagnosisId } })
    ).json<{
      events: StoredEvent[];
      verification: { intact: boolean };
    }>();
    expect(detail.verification.intact).toBe(true);
    expect(verifyRecord(detail.events)).toEqual([]);
  });

  it("marks a trainee's record for a supervisor to look at", async () => {
    const trainee = await company.clientOf("trainee");
    const record = startRecord(company, { deviceId: company.people.trainee.deviceId });
    const verdicts = await send([record.open()], trainee);
    expect(verdicts.flags.map(({ rule }) => rule)).toEqual(["recorded-by-trainee"]);
  });

  it("refuses events of a device that is another person's, and takes them once it is registered", async () => {
    const record = startRecord(company, { deviceId: company.people.senior.deviceId });
    expect((await send([record.open()])).rejected).toMatchObject([
      { code: "unknown-device", retryable: true },
    ]);
    const fresh = uuidv7();
    const later = startRecord(company, { deviceId: fresh });
    const open = later.open();
    expect(codes(await send([open]))).toEqual(["unknown-device"]);
    await technician.call("registerDevice", { body: { id: fresh, name: "New phone" } });
    expect(ids((await send([open])).accepted)).toEqual([open.id]);
  });

  it("refuses everything from a revoked device", async () => {
    const own = await makeCompany(server);
    const record = startRecord(own);
    await send([record.open()], await own.clientOf("technician"));
    const supervisor = await own.clientOf("supervisor");
    await supervisor.call("revokeDevice", { params: { deviceId: own.people.technician.deviceId } });
    const again = await own.clientOf("technician");
    // The new session is bound to another device; the revoked one's events stay on the phone.
    await again.call("registerDevice", { body: { id: own.people.technician.deviceId, name: "Found phone" } });
    expect(codes(await send([record.next("watch.skipped", { why: "told" })], again))).toEqual([
      "unknown-device",
    ]);
  });
});

describe("another company's diagnosis", () => {
  it("can neither be added to nor read, and nobody learns that it exists", async () => {
    const other = await makeCompany(server);
    const record = startRecord(other);
    await send([record.open()], await other.clientOf("technician"));
    const stranger = startRecord(company, { diagnosisId: record.diagnosisId });
    const verdicts = await send([stranger.open()]);
    expect(codes(verdicts)).toEqual(["unknown-diagnosis"]);
    expect(verdicts.heads).toEqual({});
    expect(await stored(record.diagnosisId)).toHaveLength(1);
    const params = { diagnosisId: record.diagnosisId };
    expect((await technician.call("readDiagnosis", { params })).status).toBe(404);
    const pulled = await technician.call("pullEvents", { body: { heads: { [record.diagnosisId]: 0 } } });
    expect(pulled.json()).toMatchObject({ events: [], unknown: [record.diagnosisId] });
  });

  it("cannot be opened on another company's call or unit", async () => {
    const other = await makeCompany(server);
    for (const override of [{ callId: other.callId }, { unitId: other.unitId }]) {
      const record = startRecord(company);
      expect(codes(await send([record.open(override)]))).toEqual(["not-opened"]);
      expect(await stored(record.diagnosisId)).toEqual([]);
    }
  });
});

describe("limits of a batch", () => {
  it("refuse more than a hundred events and take a hundred", async () => {
    const record = startRecord(company);
    const list: Envelope[] = [record.open()];
    while (list.length < MAX_BATCH_EVENTS) list.push(record.next("unit-state.set", { power: "on" }));
    expect((await send(list)).accepted).toHaveLength(100);
    const answer = await technician.call("sendBatch", { body: { events: [...list, list[0]] } });
    expect([answer.status, answer.code]).toEqual([400, "invalid-input"]);
  });

  it("refuse more than 256 kB and change nothing", async () => {
    const record = startRecord(company);
    const open = record.open();
    const answer = await technician.call("sendBatch", {
      body: { events: [open], notes: [], padding: "x".repeat(256 * 1024) },
    });
    expect([answer.status, answer.code]).toEqual([413, "too-large"]);
    expect(await stored(record.diagnosisId)).toEqual([]);
  });

  it("refuse a body that was cut short", async () => {
    const answer = await technician.send("/api/sync/batch", {
      method: "POST",
      headers: { "content-type": "application/json" },
      body: JSON.stringify({ events: [startRecord(company).open()] }).slice(0, 200),
    });
    expect([answer.status, answer.code]).toEqual([400, "malformed-body"]);
  });
});

// SEC-12: locking.
describe("batches side by side", () => {
  it("of one diagnosis give each event one place without a gap", async () => {
    const record = startRecord(company);
    await send([record.open()]);
    const clients = await Promise.all(
      (["senior", "supervisor", "trainee"] as const).map(async (role) => ({
        client: await company.clientOf(role),
        record: startRecord(company, {
          deviceId: company.people[role].deviceId,
          diagnosisId: record.diagnosisId,
        }),
      })),
    );
    const streams = clients.map((side) => ({
      ...side,
      list: Array.from({ length: 6 }, () => side.record.next("unit-state.set", { power: "off" })),
    }));
    await Promise.all(
      streams.map(async ({ client, list }) => {
        for (const event of list) expect(ids((await send([event], client)).accepted)).toEqual([event.id]);
      }),
    );
    const rows = await stored(record.diagnosisId);
    expect(rows.map(({ serverSeq }) => serverSeq)).toEqual(
      Array.from({ length: 19 }, (_none, index) => index + 1),
    );
  });

  it("with the same events from two senders store each once", async () => {
    const record = startRecord(company);
    const list = [record.open(), record.next("watch.skipped", { why: "told" })];
    const [one, two] = await Promise.all([send(list), send(list)]);
    expect(new Set([...ids(one.accepted), ...ids(two.accepted)])).toEqual(new Set(ids(list)));
    expect(one.accepted.length + two.accepted.length).toBe(2);
    expect(await stored(record.diagnosisId)).toHaveLength(2);
  });
});

describe("free texts", () => {
  const makeNote = (diagnosisId: string, text: string) => {
    const salt = uuidv7().replaceAll("-", "");
    return { diagnosisId, salt, text, hash: noteHash(salt, text) };
  };

  it("are kept beside the events, and one whose hash or diagnosis does not fit is refused", async () => {
    const record = startRecord(company);
    const other = startRecord(await makeCompany(server));
    const good = makeNote(record.diagnosisId, "Wet boots by the furnace.");
    const wrong = { ...makeNote(record.diagnosisId, "Some text"), text: "Another text" };
    const foreign = makeNote(other.diagnosisId, "Nobody's");
    const verdicts = await send([record.open()], technician, { notes: [good, wrong, foreign] });
    expect(verdicts.keptNotes).toEqual([good.hash]);
    expect(verdicts.rejectedNotes).toEqual([wrong.hash, foreign.hash]);
  });

  it("can be erased by a supervisor with a reason, stay erased, and the record still verifies", async () => {
    const record = startRecord(company);
    const note = makeNote(record.diagnosisId, "The neighbour's phone number.");
    const list = [record.open(), record.next("stop.raised", { rule: "stop-gas-smell", noteRef: note.hash })];
    await send(list, technician, { notes: [note] });
    const supervisor = await company.clientOf("supervisor");
    const params = { diagnosisId: record.diagnosisId, hash: note.hash };
    expect((await technician.call("eraseNote", { params, body: { reason: "Personal" } })).status).toBe(403);
    const erased = await supervisor.call("eraseNote", {
      params,
      body: { reason: "Personal data of a third person" },
    });
    expect(erased.json()).toMatchObject({
      text: null,
      erased: { reason: "Personal data of a third person" },
    });
    expect((await supervisor.call("eraseNote", { params, body: { reason: "Again" } })).code).toBe(
      "wrong-state",
    );
    await send([], technician, { notes: [note] });
    const detail = (
      await supervisor.call("readDiagnosis", { params: { diagnosisId: record.diagnosisId } })
    ).json<{
      notes: { text: string | null }[];
      verification: { intact: boolean };
    }>();
    expect(detail.notes.map(({ text }) => text)).toEqual([null]);
    expect(detail.verification.intact).toBe(true);
    const audit = await server.database.select().from(auditLog).where(eq(auditLog.companyId, company.id));
    expect(audit.some(({ action }) => action === "note.erased")).toBe(true);
  });
});

describe("pulling", () => {
  it("gives the events after the heads a client has, as they were sent", async () => {
    const record = startRecord(company);
    const list = [record.open(), ...doorAllWell.map((body) => record.next("door.answered", body))];
    await send(list);
    const pull = async (head: number) =>
      (await technician.call("pullEvents", { body: { heads: { [record.diagnosisId]: head } } })).json<{
        events: StoredEvent[];
        more: boolean;
      }>();
    const all = await pull(0);
    expect(verifyRecord(all.events)).toEqual([]);
    expect(all.events).toMatchObject(list);
    expect(ids((await pull(3)).events)).toEqual([list[3]?.id]);
    expect((await pull(4)).events).toEqual([]);
  });

  it("shows an altered, missing or swapped event as a break at its place", async () => {
    const record = startRecord(company);
    await send([record.open(), ...doorAllWell.map((body) => record.next("door.answered", body))]);
    const { events: list } = (
      await technician.call("pullEvents", { body: { heads: { [record.diagnosisId]: 0 } } })
    ).json<{ events: StoredEvent[] }>();
    const [one, two, three, four] = list as [StoredEvent, StoredEvent, StoredEvent, StoredEvent];
    expect(verifyRecord([one, { ...two, occurredAt: two.occurredAt + 1 }, three, four])[0]).toEqual({
      serverSeq: 2,
      reason: "hash",
    });
    expect(verifyRecord([one, three, four])[0]?.serverSeq).toBe(3);
    expect(verifyRecord([one, three, two, four]).map(({ serverSeq }) => serverSeq)).toContain(3);
    expect(verifyRecord([one, { ...two, actorId: uuidv7() }, three, four])[0]).toEqual({
      serverSeq: 2,
      reason: "server-chain",
    });
  });
});
