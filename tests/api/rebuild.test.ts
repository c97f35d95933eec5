import { rebuildProjections } from "@emberladder/api/src/modules/rebuild/rebuild-projections.ts";
import { calls, diagnoses, eventFlags, events } from "@emberladder/db";
import { applyMigrations } from "@emberladder/db/migrate";
import { arrivalOf, inventNote, recordOf, sealRecord } from "@emberladder/db/seed";
import { asc, eq } from "drizzle-orm";
import { v5 as uuidv5, v7 as uuidv7 } from "uuid";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { emptyDatabase, grantOn } from "../setup/database.ts";
import { readFamilyCalls } from "../support/reference-calls.ts";
import { twinsOf } from "../support/twins.ts";
import type { Twin } from "../support/twins.ts";
import { makeCompany } from "./support/company.ts";
import { startRecord } from "./support/record.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

let server: TestServer;
beforeAll(async () => {
  const empty = await emptyDatabase("rebuild");
  await applyMigrations({ url: empty.migratorUrl });
  await grantOn(empty.name);
  server = await startTestServer({}, empty);
  await fill();
});
afterAll(async () => server.close());

/** Every reference call and every twin, and records of another kind: half open, unknown steps, a trainee's. */
async function fill(): Promise<void> {
  for (const call of readFamilyCalls()) {
    const plain: Pick<Twin, "make"> = { make: (steps) => [...steps] };
    const whens = [undefined, ...twinsOf(call, String).map(({ when }) => when)];
    for (const when of whens) {
      const company = await makeCompany(server);
      const client = await company.clientOf("technician");
      const diagnosisId = uuidv7();
      const eventId = (index: number) => uuidv5(String(index), diagnosisId);
      const steps = recordOf(call, {
        callId: company.callId,
        unitId: company.unitId,
        tree: null,
        eventId,
        noteRef: (text) => inventNote(diagnosisId, text).hash,
      });
      const twin = twinsOf(call, eventId).find((one) => one.when === when) ?? plain;
      const sealed = sealRecord(twin.make(steps), {
        diagnosisId,
        device: { id: company.people.technician.deviceId, firstSeq: 1 },
        start: arrivalOf(call),
        eventId,
      });
      await client.call("sendBatch", { body: { events: sealed.slice(0, 9) } });
      await client.call("sendBatch", { body: { events: sealed.slice(9) } });
      if (when === whens.at(-1))
        await (
          await company.clientOf("supervisor")
        ).call("releaseDiagnosis", { params: { diagnosisId }, body: { comment: "Fine." } });
    }
  }
  const company = await makeCompany(server);
  const trainee = await company.clientOf("trainee");
  const record = startRecord(company, { deviceId: company.people.trainee.deviceId });
  await trainee.call("sendBatch", {
    body: {
      events: [
        record.open({ tree: { id: uuidv7(), version: 1, hash: "a".repeat(64) } }),
        record.next("future.happened", {}),
        record.next("watch.skipped", { why: "told" }, { serverOffsetMs: 3_600_000 }),
      ],
    },
  });
}

const rebuild = async () => rebuildProjections(server.dependencies);
const readAll = async () => ({
  diagnoses: await server.database.select().from(diagnoses).orderBy(asc(diagnoses.id)),
  flags: await server.database.select().from(eventFlags).orderBy(asc(eventFlags.id)),
  calls: await server.database.select().from(calls).orderBy(asc(calls.id)),
  events: await server.database.select().from(events).orderBy(asc(events.id)),
});
type All = Awaited<ReturnType<typeof readAll>>;
/** Flags by what they say; a flag that was made again is another row. */
const saidBy = ({ flags }: All) =>
  flags.map(({ id: _id, ...said }) => JSON.stringify(said)).toSorted((a, b) => a.localeCompare(b));

describe("rebuilding the projections from the events", () => {
  it("changes nothing where nothing is wrong", async () => {
    const before = await readAll();
    expect(before.diagnoses.length).toBeGreaterThan(25);
    expect(before.flags.length).toBeGreaterThan(25);
    const summary = await rebuild();
    expect(summary).toEqual({
      diagnoses: before.diagnoses.length,
      diagnosesChanged: 0,
      flagsAdded: 0,
      flagsRemoved: 0,
      callsMoved: 0,
      unreadable: [],
    });
    expect(await readAll()).toEqual(before);
  });

  it("brings back what was lost and removes what does not belong", async () => {
    const before = await readAll();
    const { database } = server;
    await database.update(diagnoses).set({
      status: "open",
      outcome: null,
      lastStage: "steady",
      closedAt: null,
      flags: 7,
      wantsReport: false,
      openedAt: new Date(0),
      lastEventAt: new Date(0),
    });
    await database.update(calls).set({ status: "open", doneAt: null });
    const [stray] = before.flags.filter(({ rule }) => rule !== "recorded-by-trainee");
    if (!stray) throw new Error("There are flags.");
    await database.delete(eventFlags).where(eq(eventFlags.rule, "stop-open"));
    await database.insert(eventFlags).values({ ...stray, id: uuidv7(), rule: "never-said" });
    const summary = await rebuild();
    expect(summary.diagnosesChanged).toBe(before.diagnoses.length);
    expect(summary.flagsRemoved).toBe(1);
    expect(summary.flagsAdded).toBeGreaterThan(0);
    const after = await readAll();
    expect(after.diagnoses).toEqual(before.diagnoses);
    expect(after.calls).toEqual(before.calls);
    expect(saidBy(after)).toEqual(saidBy(before));
    expect(await rebuild()).toMatchObject({ diagnosesChanged: 0, flagsAdded: 0, flagsRemoved: 0 });
  });

  it("leaves a call alone that was cancelled meanwhile", async () => {
    await server.database.update(calls).set({ status: "cancelled" });
    expect((await rebuild()).callsMoved).toBe(0);
  });
});
