import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { makeCompany } from "./support/company.ts";
import type { TestClient } from "./support/client.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

let server: TestServer;
let client: TestClient;
beforeAll(async () => {
  server = await startTestServer();
  client = await (await makeCompany(server)).clientOf("supervisor");
});
afterAll(async () => server.close());

// Rules after the OWASP sheet on cross-site request forgery (from memory): Fetch Metadata first, Origin where
// that is absent, and a JSON content type, which no form can send.
const SITES = [undefined, "same-origin", "same-site", "cross-site", "none"] as const;
const ORIGINS = ["own", "foreign", undefined] as const;
const TYPES = ["application/json", "text/plain", "application/x-www-form-urlencoded", undefined] as const;

const change = async (site: string | undefined, origin: string | undefined, type: string | undefined) => {
  const headers: Record<string, string> = {};
  if (client.cookie) headers["cookie"] = client.cookie;
  if (site !== undefined) headers["sec-fetch-site"] = site;
  if (origin !== undefined)
    headers["origin"] =
      origin === "own" ? server.dependencies.environment.publicOrigin : "https://elsewhere.example";
  if (type !== undefined) headers["content-type"] = type;
  // Through node:http, because fetch would fill in headers of its own.
  const { request } = await import("node:http");
  return new Promise<{ status: number; code: string | undefined }>((resolve, reject) => {
    const sent = request(`${server.origin}/api/company`, { method: "PATCH", headers }, (response) => {
      let text = "";
      response.on("data", (chunk: Buffer) => (text += chunk.toString()));
      response.on("end", () =>
        resolve({ status: response.statusCode ?? 0, code: (JSON.parse(text) as { code?: string }).code }),
      );
    });
    sent.on("error", reject);
    sent.end('{"unitsShown":"si"}');
  });
};

// SEC-05: requests from another origin.
describe("a change asked for with a session", () => {
  for (const site of SITES)
    for (const origin of ORIGINS)
      for (const type of TYPES) {
        const isOurs = site === undefined ? origin === "own" : site === "same-origin" && origin !== "foreign";
        const expected = isOurs ? (type === "application/json" ? 200 : 415) : 403;
        it(`from Sec-Fetch-Site ${site ?? "absent"}, Origin ${origin ?? "absent"}, type ${type ?? "absent"} gives ${expected}`, async () => {
          expect((await change(site, origin, type)).status).toBe(expected);
        });
      }

  it("is never made by a GET, whatever its query", async () => {
    const answer = await client.send("/api/company?unitsShown=si", {
      headers: { origin: "https://elsewhere.example" },
    });
    expect(answer.status).toBe(200);
    expect((await client.send("/api/auth/sign-out")).status).toBe(404);
  });
});
