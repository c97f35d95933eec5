import { jobs, reportLinks, reports } from "@emberladder/db";
import { eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { createClient } from "./support/client.ts";
import { makeCompany } from "./support/company.ts";
import { startPost, tokenIn } from "./support/mail.ts";
import type { TestPost } from "./support/mail.ts";
import { startRecord } from "./support/record.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

let server: TestServer;
let post: TestPost;
beforeAll(async () => {
  server = await startTestServer();
  post = await startPost(server);
});
afterAll(async () => {
  await post.close();
  await server.close();
});

/** A closing that is against the rules: nothing was concluded, repaired or proven. */
const closeWithFlags = async () => {
  const company = await makeCompany(server);
  const technician = await company.clientOf("technician");
  const record = startRecord(company);
  const answer = await technician.call("sendBatch", {
    body: {
      events: [
        record.open(),
        record.next("diagnosis.closed", {
          outcome: "fixed",
          left: { inService: true, gas: "open", power: "on" },
        }),
        record.next("report.requested", { to: "customer" }),
      ],
    },
  });
  expect(answer.json<{ accepted: unknown[] }>().accepted).toHaveLength(3);
  await post.workOff();
  return {
    company,
    params: { diagnosisId: record.diagnosisId },
    address: `customer-${company.id.slice(-12)}@home.example`,
  };
};

describe("a flagged closing", () => {
  it("waits for a supervisor, and nothing is mailed before", async () => {
    const { company, params, address } = await closeWithFlags();
    const supervisor = await company.clientOf("supervisor");
    const list = (
      await supervisor.call("listDiagnoses", { query: { flagged: "yes", status: "closed" } })
    ).json<{
      items: { id: string; waitsForRelease: boolean; flags: number }[];
    }>();
    expect(list.items).toMatchObject([{ id: params.diagnosisId, waitsForRelease: true }]);
    expect(await post.messagesTo(address)).toEqual([]);
  });

  it("released mails a link that opens the report and its PDF without an account", async () => {
    const { company, params, address } = await closeWithFlags();
    const supervisor = await company.clientOf("supervisor");
    const released = await supervisor.call("releaseDiagnosis", {
      params,
      body: { comment: "Spoke to the technician." },
    });
    expect(released.json()).toMatchObject({ waitsForRelease: false });
    expect((await supervisor.call("releaseDiagnosis", { params, body: { comment: "Again" } })).code).toBe(
      "wrong-state",
    );
    await post.workOff();
    const [message] = await post.messagesTo(address);
    expect(message?.subject).toBe("[Demo] Your furnace: what was found and done");
    const token = tokenIn(message?.text ?? "", "r");
    const customer = createClient(server);
    const report = await customer.call("readReport", { params: { token } });
    expect(report.json()).toMatchObject({ customerFirstName: "Odalys", hasPdf: true, isDemo: true });
    expect(report.text).not.toMatch(/Surname|555-0101|home\.example/);
    const pdf = await customer.call("readReportPdf", { params: { token } });
    expect([pdf.status, pdf.headers.get("content-type")]).toEqual([200, "application/pdf"]);
    // Every PDF begins so (ISO 32000-1, 7.5.2).
    expect(pdf.text.startsWith("%PDF-1.")).toBe(true);
  });

  it("keeps of its link only a hash, and the link ends after ninety days", async () => {
    const { company, params, address } = await closeWithFlags();
    await (
      await company.clientOf("supervisor")
    ).call("releaseDiagnosis", { params, body: { comment: "Fine." } });
    await post.workOff();
    const token = tokenIn((await post.messagesTo(address))[0]?.text ?? "", "r");
    const rows = JSON.stringify([
      await server.database.select().from(reportLinks),
      await server.database.select().from(reports),
      await server.database.select().from(jobs).where(eq(jobs.companyId, company.id)),
    ]);
    expect(rows).not.toContain(token);
    server.moveClock(90 * 86_400_000 + 1000);
    expect((await createClient(server).call("readReport", { params: { token } })).code).toBe("link-expired");
  });
});

describe("the demo's inbox", () => {
  it("shows what was sent, as text that runs nothing", async () => {
    const { company, params } = await closeWithFlags();
    await (
      await company.clientOf("supervisor")
    ).call("releaseDiagnosis", { params, body: { comment: "Fine." } });
    await post.workOff();
    const visitor = createClient(server);
    const inbox = await visitor.call("readMailBox");
    const id = /\/dev\/mail\/([0-9a-z-]+)/.exec(inbox.text)?.[1] ?? "";
    const message = await visitor.call("readMailMessage", { params: { messageId: id } });
    expect(message.text).toContain("The link is private");
    expect(inbox.text + message.text).not.toMatch(/<script/i);
  });

  it("is not there in mode live", async () => {
    const { emptyDatabase, grantOn } = await import("../setup/database.ts");
    const { applyMigrations } = await import("@emberladder/db/migrate");
    const empty = await emptyDatabase("live");
    await applyMigrations({ url: empty.migratorUrl });
    await grantOn(empty.name);
    const live = await startTestServer(
      { EMBERLADDER_MODE: "live", PUBLIC_ORIGIN: "https://heat.example", SMTP_URL: "smtps://mail.example" },
      empty,
    );
    expect((await createClient(live).send("/dev/mail")).status).toBe(404);
    await live.close();
  });
});
