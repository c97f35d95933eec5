import { claimNextJob, enqueueJob } from "@emberladder/api/src/modules/jobs/repository.ts";
import { MOST_ATTEMPTS, pauseAfter } from "@emberladder/api/src/modules/jobs/retry-policy.ts";
import { runNextJob } from "@emberladder/api/src/modules/jobs/run-next-job.ts";
import { jobs } from "@emberladder/db";
import { eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { afterAll, beforeEach, beforeAll, describe, expect, it } from "vitest";
import { makeCompany } from "./support/company.ts";
import type { TestCompany } from "./support/company.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

let server: TestServer;
let company: TestCompany;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(async () => server.close());
beforeEach(async () => {
  company = await makeCompany(server);
  // Jobs that other files of this worker left behind.
  await server.database.update(jobs).set({ state: "cancelled" });
});

const failing = {
  send: async () => Promise.reject(Object.assign(new Error("secret"), { code: "ECONNREFUSED" })),
  close: () => undefined,
};
const enqueue = async (payload: Record<string, string>) => {
  const id = uuidv7();
  await enqueueJob(server.database, {
    id,
    companyId: company.id,
    kind: "mail.send",
    payload,
    now: new Date(server.dependencies.clock()),
  });
  return id;
};
const read = async (id: string) => (await server.database.select().from(jobs).where(eq(jobs.id, id)))[0];
const resetMail = () => enqueue({ template: "reset", personId: company.people.technician.id });

describe("a job", () => {
  it("that fails is tried again after a growing pause, then waits for a supervisor, who can start it again", async () => {
    const id = await resetMail();
    const pauses: number[] = [];
    for (let attempt = 1; attempt <= MOST_ATTEMPTS; attempt += 1) {
      expect(await runNextJob({ ...server.dependencies, mailer: failing })).toBe(true);
      const job = await read(id);
      const pause = (job?.runAfter.getTime() ?? 0) - server.dependencies.clock();
      pauses.push(pause);
      server.moveClock(Math.max(0, pause) + 1);
    }
    expect(pauses.slice(1, -1).every((pause, index) => pause > (pauses[index] ?? 0))).toBe(true);
    expect(await read(id)).toMatchObject({
      state: "dead",
      attempts: MOST_ATTEMPTS,
      lastError: "The mail server could not be reached (ECONNREFUSED).",
    });
    expect(await runNextJob({ ...server.dependencies, mailer: failing })).toBe(false);
    const supervisor = await company.clientOf("supervisor");
    const dead = (await supervisor.call("listJobs", { query: { state: "dead" } })).json<{
      items: { id: string }[];
    }>();
    expect(dead.items.map((job) => job.id)).toEqual([id]);
    await supervisor.call("retryJob", { params: { jobId: id } });
    const sent: unknown[] = [];
    const mailer = { send: async (message: unknown) => void sent.push(message), close: () => undefined };
    await runNextJob({ ...server.dependencies, mailer });
    expect(await read(id)).toMatchObject({ state: "done", progress: 100, lastError: null });
    expect(sent).toHaveLength(1);
  });

  it("is claimed by one of many workers", async () => {
    const ids = [await resetMail(), await resetMail(), await resetMail()];
    const now = new Date(server.dependencies.clock() + 1);
    const claims = await Promise.all(
      Array.from({ length: 6 }, async () => claimNextJob(server.database, now, 1000)),
    );
    const claimed = claims.flatMap((job) => job?.id ?? []);
    expect(new Set(claimed).size).toBe(claimed.length);
    expect(claimed.every((id) => ids.includes(id))).toBe(true);
  });

  it("whose worker died is taken over once its lease has run out, and not before", async () => {
    const id = await resetMail();
    const at = (ms: number) => new Date(server.dependencies.clock() + ms);
    expect((await claimNextJob(server.database, at(1), 60_000))?.id).toBe(id);
    expect(await claimNextJob(server.database, at(59_000), 60_000)).toBeUndefined();
    expect((await claimNextJob(server.database, at(62_000), 60_000))?.id).toBe(id);
  });

  it("of an unknown kind is dead at once, with words for the supervisor", async () => {
    const id = await resetMail();
    await server.database.update(jobs).set({ kind: "from.the-future" }).where(eq(jobs.id, id));
    await runNextJob({ ...server.dependencies, mailer: failing });
    expect(await read(id)).toMatchObject({
      state: "dead",
      lastError: "This version does not know this kind of work.",
    });
  });

  it("cancelled while it waits is not run", async () => {
    const id = await resetMail();
    const supervisor = await company.clientOf("supervisor");
    expect((await supervisor.call("cancelJob", { params: { jobId: id } })).json()).toMatchObject({
      state: "cancelled",
    });
    expect(await runNextJob({ ...server.dependencies, mailer: failing })).toBe(false);
    expect((await supervisor.call("cancelJob", { params: { jobId: id } })).code).toBe("wrong-state");
  });
});

describe("the pause before the next attempt", () => {
  it("doubles twice each time, never passes ten minutes, and varies by at most a quarter", () => {
    const pauses = [1, 2, 3, 4, 5, 6].map((attempts) => pauseAfter(attempts, () => 0));
    expect(pauses).toEqual([2000, 8000, 32_000, 128_000, 512_000, 600_000]);
    expect(pauseAfter(1, () => 1)).toBe(1500);
  });
});
