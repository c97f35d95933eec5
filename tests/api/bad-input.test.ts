import { ROUTE_NAMES, routeContracts } from "@emberladder/contract";
import type { RouteContract } from "@emberladder/contract";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { TestClient } from "./support/client.ts";
import { routeExamples } from "./support/route-examples.ts";
import type { Things } from "./support/route-examples.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";
import { makeThings } from "./support/things.ts";

let server: TestServer;
let things: Things;
let client: TestClient;
beforeAll(async () => {
  server = await startTestServer();
  things = await makeThings(server);
});
afterAll(async () => server.close());

const withBody = ROUTE_NAMES.filter((name) => (routeContracts[name] as RouteContract).body);
const withQuery = ROUTE_NAMES.filter((name) => (routeContracts[name] as RouteContract).query);
const JSON_TYPE = { "content-type": "application/json" };

const paramsFor = (name: (typeof ROUTE_NAMES)[number]) => routeExamples[name].params?.(things) ?? {};

const addressFor = (name: (typeof ROUTE_NAMES)[number]) => {
  const params = paramsFor(name);
  return routeContracts[name].path.replaceAll(/\{(\w+)\}/g, (_all, key: string) => params[key] ?? "");
};

// SEC-11: what is not in the contract is refused.
describe("a body", () => {
  for (const name of withBody) {
    it(`of ${name} that is no JSON, an array, null or nothing is refused`, async () => {
      client = await things.company.clientOf("supervisor");
      for (const body of ["", "{", "[]", "null", "7", '"text"', "{]", "\u0000", "[".repeat(50_000)]) {
        const answer = await client.send(addressFor(name), {
          method: routeContracts[name].method.toUpperCase(),
          headers: JSON_TYPE,
          body,
        });
        expect([body.slice(0, 10), answer.status]).toEqual([
          body.slice(0, 10),
          answer.status === 429 ? 429 : 400,
        ]);
      }
    });

    it(`of ${name} with a field of its own or a key to a prototype is refused`, async () => {
      client = await things.company.clientOf("supervisor");
      const good = routeExamples[name].body?.(things) as Record<string, unknown>;
      const extra = await client.call(name, {
        params: paramsFor(name),
        body: { ...good, isAdmin: true, companyId: things.company.id },
      });
      expect([400, 429]).toContain(extra.status);
      const text = JSON.stringify(good)
        .replace(/^\{/, '{"__proto__":{"role":"supervisor"},')
        .replace(",}", "}");
      const polluted = await client.send(addressFor(name), {
        method: routeContracts[name].method.toUpperCase(),
        headers: JSON_TYPE,
        body: text,
      });
      expect([400, 429]).toContain(polluted.status);
      expect(({} as { role?: string }).role).toBeUndefined();
    });

    it(`of ${name} over its limit is refused without being read to the end`, async () => {
      client = await things.company.clientOf("supervisor");
      const answer = await client.call(name, {
        params: paramsFor(name),
        body: { padding: "x".repeat(300 * 1024) },
      });
      expect([413, 429]).toContain(answer.status);
    });
  }

  it("of the wrong content type is refused", async () => {
    client = await things.company.clientOf("supervisor");
    for (const type of [
      "text/plain",
      "application/x-www-form-urlencoded",
      "multipart/form-data; boundary=x",
    ]) {
      const answer = await client.send("/api/customers", {
        method: "POST",
        headers: { "content-type": type },
        body: '{"firstName":"A"}',
      });
      expect([type, answer.status]).toEqual([type, 415]);
    }
  });

  it("names each field that cannot be used by JSON pointer", async () => {
    client = await things.company.clientOf("supervisor");
    const answer = await client.call("createCustomer", {
      body: { firstName: " ", email: "not an address", site: { address: "1 Street" } },
    });
    expect(answer.json<{ errors: { pointer: string }[] }>().errors.map(({ pointer }) => pointer)).toEqual([
      "/firstName",
      "/email",
      "/site/town",
    ]);
  });

  it("with control characters or half a character is refused", async () => {
    client = await things.company.clientOf("supervisor");
    for (const firstName of ["A\u0000B", "A\r\nBcc: x", "\ud800"]) {
      const answer = await client.call("createCustomer", { body: { firstName } });
      expect(answer.code).toBe("invalid-input");
    }
  });
});

// SEC-11 and SEC-13: queries.
describe("a query", () => {
  for (const name of withQuery)
    it(`of ${name} with a name given twice, an unknown one or a silly value is refused`, async () => {
      client = await things.company.clientOf("supervisor");
      for (const query of [
        "page=1&page=2",
        "page[]=1",
        "unknown=1",
        "page=-1",
        "page=1e9",
        "pageSize=100000",
        "__proto__=1",
      ]) {
        const answer = await client.send(`${addressFor(name)}?${query}`);
        expect([query, answer.status, answer.code]).toEqual([query, 400, "invalid-input"]);
      }
    });

  it("with the signs of SQL is a text like any other", async () => {
    client = await things.company.clientOf("supervisor");
    for (const search of ["' OR 1=1 --", "%", "_", "\\", "'; DROP TABLE people; --", "\u{1F525}"]) {
      const answer = await client.call("listCustomers", { query: { search } });
      expect([search, answer.status, answer.json<{ total: number }>().total]).toEqual([search, 200, 0]);
    }
  });
});

describe("a unit that cannot exist", () => {
  it("is refused with the fields that contradict each other", async () => {
    client = await things.company.clientOf("senior");
    const good = routeExamples.createUnit.body?.(things) as { profile: { codes: object; plate: object } };
    const answer = await client.call("createUnit", {
      body: {
        ...good,
        profile: {
          ...good.profile,
          codes: { ...good.profile.codes, ignition: "SP" },
          plate: { ...good.profile.plate, riseMinF: 70, riseMaxF: 40 },
        },
      },
    });
    expect(answer.code).toBe("profile-impossible");
    const pointers = answer.json<{ errors: { pointer: string }[] }>().errors.map(({ pointer }) => pointer);
    expect(pointers).toContain("/profile/codes/draft");
    expect(pointers).toContain("/profile/plate/riseMinF");
  });
});
