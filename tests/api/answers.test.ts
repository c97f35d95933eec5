import { mkdtemp, mkdir, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { ERRORS, problemSchema, ROUTE_NAMES, routeContracts } from "@emberladder/contract";
import type { RouteContract } from "@emberladder/contract";
import { routes } from "@emberladder/api/src/routes.ts";
import { afterAll, beforeAll, describe, expect, it, vi } from "vitest";
import { createClient } from "./support/client.ts";
import type { TestAnswer, TestClient } from "./support/client.ts";
import { PASSWORD } from "./support/company.ts";
import { routeExamples } from "./support/route-examples.ts";
import type { Things } from "./support/route-examples.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";
import { makeThings } from "./support/things.ts";

let server: TestServer;
let things: Things;
let client: TestClient;
let web: string;
beforeAll(async () => {
  web = await mkdtemp(join(tmpdir(), "emberladder-web-"));
  await mkdir(join(web, "assets"));
  await writeFile(join(web, "index.html"), "<!doctype html><title>Start page</title>");
  await writeFile(join(web, "assets", "main-abc123.js"), "export {};");
  await writeFile(join(web, "sw.js"), "self;");
  server = await startTestServer({ WEB_DIST: web });
  things = await makeThings(server);
  client = await things.company.clientOf("supervisor");
});
afterAll(async () => {
  await server.close();
  await rm(web, { recursive: true, force: true });
});

// The policy of the quality criteria, typed here apart from the code that sends it.
const POLICY = [
  "base-uri 'none'",
  "connect-src 'self'",
  "default-src 'none'",
  "font-src 'self'",
  "form-action 'self'",
  "frame-ancestors 'none'",
  "img-src 'self' blob: data:",
  "manifest-src 'self'",
  "object-src 'none'",
  "script-src 'self'",
  "style-src 'self'",
  "worker-src 'self'",
];

const expectSafeHeaders = ({ headers }: TestAnswer) => {
  const policy = (headers.get("content-security-policy") ?? "").split(";").map((part) => part.trim());
  expect(policy.toSorted((a, b) => a.localeCompare(b))).toEqual(POLICY);
  expect(headers.get("x-content-type-options")).toBe("nosniff");
  expect(headers.get("referrer-policy")).toBe("no-referrer");
  expect(headers.get("cross-origin-opener-policy")).toBe("same-origin");
  expect(headers.get("x-frame-options")).toBe("DENY");
  expect(headers.get("x-powered-by")).toBeNull();
  expect(headers.get("x-request-id")).toMatch(/^[0-9a-f-]{36}$/);
  // Plain HTTP on loopback: no HSTS, which would lock the address to TLS.
  expect(headers.get("strict-transport-security")).toBeNull();
};

const ask = async (name: (typeof ROUTE_NAMES)[number]) => {
  const { params, query, body } = routeExamples[name];
  return (await things.company.clientOf("supervisor")).call(name, {
    ...(params ? { params: params(things) } : {}),
    ...(query ? { query } : {}),
    ...(body ? { body: body(things) } : {}),
  });
};

// SEC-14 and SEC-20: headers of every answer, errors included.
describe("every answer", () => {
  for (const name of ROUTE_NAMES)
    it(`of ${name} carries the headers, and the contract's status or a problem document`, async () => {
      const contract: RouteContract = routeContracts[name];
      const answer = await ask(name);
      expectSafeHeaders(answer);
      const isKept = !/^\/(?:api|dev|health)/.test(contract.path);
      expect(answer.headers.get("cache-control") === "no-store").toBe(!isKept);
      const isProblem = answer.status >= 400;
      const problem = isProblem ? problemSchema.parse(answer.json()) : undefined;
      const codeOf = problem ? ERRORS[problem.code].status : contract.answer.status;
      expect([answer.status, problem?.status ?? answer.status]).toEqual([codeOf, codeOf]);
      expect(problem?.instance ?? `urn:uuid:${answer.headers.get("x-request-id")}`).toBe(
        `urn:uuid:${answer.headers.get("x-request-id")}`,
      );
    });

  it("for an unknown address of the API is a problem document with the headers", async () => {
    for (const path of ["/api/nothing", "/api", "/health/nothing", "/api/calls/x/y/z", "/dev/nothing"]) {
      const answer = await client.send(path);
      expectSafeHeaders(answer);
      expect([path, answer.status, answer.code]).toEqual([path, 404, "not-found"]);
    }
  });

  it("for an address that is not well-formed or too long is a problem document", async () => {
    const bad = await client.send("/api/calls/%E0%A4%A");
    expect([bad.status, bad.code]).toEqual([400, "invalid-input"]);
    const long = await client.send(`/api/customers?search=${"x".repeat(3000)}`);
    expect([long.status, long.code]).toEqual([413, "too-large"]);
  });

  it("over TLS asks browsers to stay with TLS for a year", async () => {
    const other = await startTestServer({ PUBLIC_ORIGIN: "https://heat.example" });
    const answer = await createClient(other).call("ping");
    expect(answer.headers.get("strict-transport-security")).toBe("max-age=31536000; includeSubDomains");
    await other.close();
  });
});

// SEC-17: what a fault tells.
describe("a fault inside a route", () => {
  const secret = "SELECT password_hash FROM people; at /srv/secret.ts:1:1";
  for (const name of ROUTE_NAMES)
    it(`of ${name} is told by its id alone`, async () => {
      const route = routes.find((candidate) => candidate.name === name);
      if (!route) throw new Error("no such route");
      const broken = vi.spyOn(route, "handle").mockRejectedValue(new Error(secret));
      const answer = await ask(name);
      broken.mockRestore();
      expect([answer.status, answer.code]).toEqual([500, "server-fault"]);
      expect(answer.text).not.toMatch(/SELECT| {4}at |\.ts:|password_hash/);
      expectSafeHeaders(answer);
      expect(server.logged.some((line) => line.includes(answer.headers.get("x-request-id") ?? "none"))).toBe(
        true,
      );
    });
});

// SEC-18: what is logged, and what never is.
describe("the log", () => {
  it("holds no password, cookie, code, token or address of a link, and one line for each request", async () => {
    const before = server.logged.length;
    const { email } = things.company.people.technician;
    const visitor = createClient(server);
    await visitor.call("signIn", { body: { email, password: PASSWORD } });
    const cookie = visitor.cookie?.split("=")[1] ?? "none";
    await visitor.call("readMe");
    await visitor.call("verifyTwoStep", { body: { code: "482913" } });
    const token = "SecretLinkSecretLinkSecretLinkSecretLink123";
    await visitor.call("readReport", { params: { token } });
    await visitor.call("resetPassword", { body: { token, password: "planted pass phrase here" } });
    await visitor.send("/api/customers?search=planted%0D%0Aforged-line");
    const lines = server.logged.slice(before);
    const text = lines.join("");
    for (const planted of [PASSWORD, cookie, "482913", token, "planted pass phrase", "forged-line", email])
      expect([planted, text.includes(planted)]).toEqual([planted, false]);
    for (const line of lines) expect(() => JSON.parse(line) as unknown).not.toThrow();
    const requests = lines.map((line) => JSON.parse(line) as { msg: string; route: string; time: string });
    expect(requests.filter(({ msg }) => msg === "request")).toHaveLength(6);
    expect(requests.map(({ route }) => route)).toContain("GET /api/reports/{token}");
    expect(requests[0]?.time).toMatch(/Z$/);
  });
});

describe("the client's files", () => {
  it("give the start page, never kept, for any page address", async () => {
    for (const path of ["/", "/calls", "/r/abc", "/first-run/abc"]) {
      const answer = await client.send(path, { headers: { accept: "text/html" } });
      expect(answer.text).toContain("Start page");
      expect(answer.headers.get("cache-control")).toBe("no-cache");
      expectSafeHeaders(answer);
    }
  });

  it("are kept for ever where the name carries a hash, and not where it does not", async () => {
    const hashed = await client.send("/assets/main-abc123.js");
    expect(hashed.headers.get("cache-control")).toBe("public, max-age=31536000, immutable");
    expect((await client.send("/sw.js")).headers.get("cache-control")).toBe("no-cache");
  });

  it("that are missing are not answered with the start page", async () => {
    for (const path of ["/assets/old-000.js", "/missing.png"])
      expect((await client.send(path, { headers: { accept: "text/html" } })).status).toBe(404);
    const post = await client.send("/calls", { method: "POST", headers: { accept: "text/html" } });
    expect(post.status).toBe(404);
  });
});

describe("the description of the API", () => {
  it("is OpenAPI 3.1 and lists every route with the errors it can give", async () => {
    const document = (await client.call("readOpenApi")).json<{
      openapi: string;
      paths: Record<string, Record<string, { operationId: string; responses: Record<string, unknown> }>>;
    }>();
    expect(document.openapi).toBe("3.1.0");
    const operations = Object.values(document.paths).flatMap((methods) => Object.values(methods));
    expect(operations.map(({ operationId }) => operationId).toSorted((a, b) => a.localeCompare(b))).toEqual(
      [...ROUTE_NAMES].toSorted((a, b) => a.localeCompare(b)),
    );
    for (const { responses } of operations) expect(Object.keys(responses)).toContain("500");
  });

  it("can be read as a page without any script or inline style", async () => {
    const { text } = await client.call("readApiPage");
    expect(text).toContain("POST /api/sync/batch");
    expect(text).not.toMatch(/<script| style=| on\w+="/i);
  });
});
