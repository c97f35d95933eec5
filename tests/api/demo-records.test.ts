import { seedDemoRecords } from "@emberladder/api/src/dev/seed-demo-records.ts";
import { createSessionKeeper } from "@emberladder/api/src/modules/auth/sessions.ts";
import type { DiagnosisDetail, DiagnosisSummary } from "@emberladder/contract";
import { diagnoses, events } from "@emberladder/db";
import { applyMigrations } from "@emberladder/db/migrate";
import { demoId, demoRecords, seedDemo } from "@emberladder/db/seed";
import { asc } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { emptyDatabase, grantOn } from "../setup/database.ts";
import { createClient } from "./support/client.ts";
import type { TestClient } from "./support/client.ts";
import { startPost, tokenIn } from "./support/mail.ts";
import type { TestPost } from "./support/mail.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

let server: TestServer;
let post: TestPost;
beforeAll(async () => {
  const empty = await emptyDatabase("demo");
  await applyMigrations({ url: empty.migratorUrl });
  await grantOn(empty.name);
  server = await startTestServer({}, empty);
  post = await startPost(server);
});
afterAll(async () => {
  await post.close();
  await server.close();
});

const clientOf = async (email: string, role: "supervisor" | "technician"): Promise<TestClient> => {
  const { cookie } = await createSessionKeeper(server.dependencies).begin({
    personId: demoId("person", email),
    role,
    deviceId: null,
    twoStepPassed: true,
    now: new Date(),
  });
  return createClient(server, cookie.split(";")[0]);
};
const everything = async () => ({
  heads: await server.database.select().from(diagnoses).orderBy(asc(diagnoses.id)),
  events: await server.database.select().from(events).orderBy(asc(events.deviceId), asc(events.deviceSeq)),
});

describe("the demo's past", () => {
  it("is left out where the demo itself was never filled", async () => {
    await seedDemoRecords(server.dependencies);
    expect((await everything()).heads).toEqual([]);
  });

  it("is three reference calls without a flag and one that waits for a supervisor", async () => {
    const { environment, database, random } = server.dependencies;
    await seedDemo({ database, sessionSecret: environment.sessionSecret, now: new Date(), random });
    await seedDemoRecords(server.dependencies);
    const maud = await clientOf("maud@tamarackpike.example", "supervisor");
    const agnes = await clientOf("agnes@bluestemheat.example", "supervisor");
    const lists = await Promise.all(
      [maud, agnes].map(async (client) =>
        (await client.call("listDiagnoses")).json<{ items: DiagnosisSummary[] }>(),
      ),
    );
    const short = lists
      .flatMap(({ items }) => items)
      .map(({ outcome, flags, waitsForRelease, isDemo, openedAt }) => ({
        day: openedAt.slice(0, 10),
        outcome,
        isFlagged: flags > 0,
        waitsForRelease,
        isDemo,
      }))
      .toSorted((a, b) => a.day.localeCompare(b.day));
    const fine = { isFlagged: false, waitsForRelease: false, isDemo: true };
    expect(short).toEqual([
      { day: "2026-01-12", outcome: "fixed", ...fine },
      { day: "2026-01-22", outcome: "shut-off", ...fine },
      { day: "2026-01-28", outcome: "fixed", ...fine },
      { day: "2026-02-03", outcome: "fixed", isFlagged: true, waitsForRelease: true, isDemo: true },
    ]);
  });

  it("verifies, counts each phone without a gap, and says which rule was broken", async () => {
    const maud = await clientOf("maud@tamarackpike.example", "supervisor");
    const { items } = (await maud.call("listDiagnoses")).json<{ items: DiagnosisSummary[] }>();
    for (const { id, waitsForRelease } of items) {
      const detail = (
        await maud.call("readDiagnosis", { params: { diagnosisId: id } })
      ).json<DiagnosisDetail>();
      expect(detail.verification).toEqual({ intact: true, breaks: [] });
      expect([...new Set(detail.flagList.map(({ rule }) => rule))]).toEqual(
        waitsForRelease ? ["too-few-lights"] : [],
      );
    }
    const rows = (await everything()).events;
    const phones = new Set(rows.map(({ deviceId }) => deviceId));
    expect(phones.size).toBe(2);
    for (const phone of phones) {
      const numbers = rows.filter(({ deviceId }) => deviceId === phone).map(({ deviceSeq }) => deviceSeq);
      expect(numbers).toEqual(numbers.map((_number, index) => index + 1));
    }
  });

  it("shows the unit that was shut off, and gives units a history", async () => {
    const ibby = await clientOf("ibby@tamarackpike.example", "technician");
    const units = demoRecords().filter(({ companyId }) => companyId === demoId("company", "tamarack-pike"));
    for (const { unitId, reference, slug } of units) {
      const unit = (await ibby.call("readUnit", { params: { unitId } })).json<{
        openShutOff: { diagnosisId: string } | null;
        history: { id: string }[];
      }>();
      expect(unit.history.map(({ id }) => id)).toEqual([demoId("diagnosis", slug)]);
      expect(unit.openShutOff?.diagnosisId).toBe(
        reference.outcome === "shut-off" ? demoId("diagnosis", slug) : undefined,
      );
    }
  });

  it("mails the three reports, marked as an invented example, and holds the flagged one back", async () => {
    await post.workOff();
    for (const { reference, slug, unitId } of demoRecords().filter((record) => record.slug.length === 3)) {
      const [message] = await post.messagesTo(reference.job.customer.email);
      const token = tokenIn(message?.text ?? "", "r");
      const report = await createClient(server).call("readReport", { params: { token } });
      expect([slug, unitId, report.status]).toEqual([slug, unitId, 200]);
      expect(report.json()).toMatchObject({ isDemo: true, hasPdf: true });
    }
    expect(await post.messagesTo("bram@vantongeren.example")).toEqual([]);
  });

  it("made again changes nothing, also when it has to look at every record", async () => {
    const before = await everything();
    await seedDemoRecords(server.dependencies);
    await server.database.update(diagnoses).set({ wantsReport: false });
    await seedDemoRecords(server.dependencies);
    const after = await everything();
    expect(after.events).toEqual(before.events);
    expect(after.heads.map(({ wantsReport: _w, ...row }) => row)).toEqual(
      before.heads.map(({ wantsReport: _w, ...row }) => row),
    );
  });
});
