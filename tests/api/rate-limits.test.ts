import { createRateLimiter } from "@emberladder/api/src/http/rate-limiter.ts";
import { RATE_LIMITS } from "@emberladder/contract";
import { v7 as uuidv7 } from "uuid";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { makeCompany } from "./support/company.ts";
import { createClient } from "./support/client.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(async () => server.close());

// SEC-08 and SEC-21: floods.
describe("rate limits", () => {
  it("let a session make six hundred requests a minute, then ask it to wait, and let it on again", async () => {
    const limiter = createRateLimiter(server.database);
    const key = uuidv7();
    const now = Date.now();
    for (let i = 0; i < RATE_LIMITS.session.requests; i += 1) await limiter.take("session", key, now);
    await expect(limiter.take("session", key, now + 1000)).rejects.toMatchObject({
      code: "too-many-requests",
      retryAfterSeconds: 59,
    });
    await limiter.take("session", key, now + 60_000);
    await limiter.take("session", uuidv7(), now + 1000);
  });

  it("of the open doors are one budget for all API processes", async () => {
    const [one, two] = [createRateLimiter(server.database), createRateLimiter(server.database)];
    const key = uuidv7();
    const now = Date.now();
    for (let i = 0; i < RATE_LIMITS.door.requests; i += 1)
      await (i % 2 === 0 ? one : two).take("door", key, now);
    await expect(one.take("door", key, now)).rejects.toMatchObject({ code: "too-many-requests" });
    await expect(two.take("door", key, now)).rejects.toMatchObject({ code: "too-many-requests" });
    await two.take("door", key, now + 60_001);
  });

  it("answer a flood of guessed links with 429, a time to wait, and a problem document", async () => {
    const visitor = createClient(server);
    const answers = [];
    for (let i = 0; i < RATE_LIMITS.door.requests + 3; i += 1)
      answers.push(await visitor.call("readReport", { params: { token: String(i).padStart(43, "x") } }));
    expect(answers.map(({ status }) => status).slice(0, 30)).toEqual(Array.from({ length: 30 }, () => 410));
    const last = answers.at(-1);
    expect([last?.status, last?.code]).toEqual([429, "too-many-requests"]);
    expect(Number(last?.headers.get("retry-after"))).toBeGreaterThan(0);
  });

  it("leave a signed-in person's work alone while somebody floods the open doors", async () => {
    const company = await makeCompany(server);
    expect((await (await company.clientOf("technician")).call("listCalls")).status).toBe(200);
  });
});
