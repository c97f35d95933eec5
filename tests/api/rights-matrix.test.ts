import { mountedRoutes } from "@emberladder/api/src/http/create-app.ts";
import { ROLES, ROUTE_NAMES, routeContracts } from "@emberladder/contract";
import type { RouteContract, RouteName } from "@emberladder/contract";
import {
  calls,
  companies,
  customers,
  devices,
  diagnoses,
  jobs,
  noteTexts,
  people,
  sites,
  units,
} from "@emberladder/db";
import { eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { createClient } from "./support/client.ts";
import type { TestClient } from "./support/client.ts";
import { routeExamples } from "./support/route-examples.ts";
import type { Things } from "./support/route-examples.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";
import { makeThings } from "./support/things.ts";

let server: TestServer;
/** A company whose things strangers try to reach. */
let victim: Things;
/** A company whose people try. */
let stranger: Things;
beforeAll(async () => {
  server = await startTestServer();
  [victim, stranger] = [await makeThings(server), await makeThings(server)];
});
afterAll(async () => server.close());

const ask = async (client: TestClient, name: RouteName, things: Things) => {
  const { params, query, body } = routeExamples[name];
  return client.call(name, {
    ...(params ? { params: params(things) } : {}),
    ...(query ? { query } : {}),
    ...(body ? { body: body(things) } : {}),
  });
};

/** Everything of a company that a request could change. */
const snapshot = async (companyId: string) => {
  const owned = [people, devices, customers, sites, units, calls, diagnoses, noteTexts, jobs] as const;
  return JSON.stringify([
    await server.database.select().from(companies).where(eq(companies.id, companyId)),
    ...(await Promise.all(
      owned.map(async (table) => server.database.select().from(table).where(eq(table.companyId, companyId))),
    )),
  ]);
};

// SEC-10: every route against everybody.
describe("the matrix of rights", () => {
  it("has every route that the server mounts, and the server every route of the contract", () => {
    const mounted = mountedRoutes("demo").map(({ name }) => name);
    expect(mounted.toSorted((a, b) => a.localeCompare(b))).toEqual(
      [...ROUTE_NAMES].toSorted((a, b) => a.localeCompare(b)),
    );
    expect(Object.keys(routeExamples).length).toBe(mounted.length);
  });

  it("mounts no route of the demo in mode live", () => {
    const live = mountedRoutes("live").map(({ name }) => name);
    expect(ROUTE_NAMES.filter((name) => !live.includes(name))).toEqual(["readMailBox", "readMailMessage"]);
  });

  for (const name of ROUTE_NAMES) {
    const contract: RouteContract = routeContracts[name];
    const { allowed, namesThing = false } = routeExamples[name];

    describe(`${contract.method.toUpperCase()} ${contract.path}`, () => {
      it(`${allowed === "public" ? "is open to" : "refuses"} somebody signed out`, async () => {
        const answer = await ask(createClient(server), name, victim);
        expect(answer.code === "signed-out").toBe(allowed !== "public");
        expect(answer.status === 401).toBe(allowed !== "public" || name === "signIn");
        expect(answer.status).toBeLessThan(500);
      });

      if (allowed === "public") return;

      it("refuses a disabled person", async () => {
        const { company } = await makeThings(server);
        const client = await company.clientOf("senior");
        await server.database
          .update(people)
          .set({ disabledAt: new Date() })
          .where(eq(people.id, company.people.senior.id));
        expect((await ask(client, name, victim)).status).toBe(401);
      });

      it(`lets in ${allowed.join(", ")} and nobody else`, async () => {
        const own = await makeThings(server);
        for (const role of ROLES) {
          const client = await own.company.clientOf(role);
          const before = await snapshot(own.company.id);
          const answer = await ask(client, name, own);
          expect(answer.status).toBeLessThan(500);
          const isLetIn = allowed.includes(role);
          expect([role, answer.status === 401]).toEqual([role, false]);
          expect([role, answer.code === "not-allowed"]).toEqual([role, !isLetIn]);
          expect([role, answer.status === 403]).toEqual([role, !isLetIn]);
          // Whoever is let in may change things; whoever is not has changed nothing.
          expect(isLetIn || (await snapshot(own.company.id)) === before).toBe(true);
        }
      });

      if (!namesThing) return;

      it("knows nothing of another company's things, and changes none", async () => {
        const before = await snapshot(victim.company.id);
        for (const role of allowed) {
          const answer = await ask(await stranger.company.clientOf(role), name, victim);
          expect([role, answer.status, answer.code]).toEqual([role, 404, "not-found"]);
        }
        expect(await snapshot(victim.company.id)).toBe(before);
      });

      it("answers 404 for an id that nobody has, and 400 for one that is none", async () => {
        const { params } = routeExamples[name];
        if (!params) return;
        const client = await stranger.company.clientOf("supervisor");
        const body = routeExamples[name].body?.(stranger);
        const withParams = async (value: string) => {
          const entries = Object.entries(params(stranger));
          const [key] = entries[0] ?? [""];
          return client.call(name, {
            params: { ...Object.fromEntries(entries), [key]: value },
            ...(body === undefined ? {} : { body }),
          });
        };
        expect((await withParams("01890000-0000-7000-8000-000000000000")).status).toBe(404);
        expect((await withParams("not-an-id")).code).toBe("invalid-input");
      });
    });
  }
});

describe("a session that has not passed its two-step code", () => {
  it("reaches nothing but the two-step routes, its own state and the way out", async () => {
    const { company } = await makeThings(server);
    const open: string[] = [];
    for (const name of ROUTE_NAMES) {
      if (routeExamples[name].allowed === "public") continue;
      const fresh = createClient(server);
      await fresh.call("signIn", {
        body: { email: company.people.supervisor.email, password: "oboe kiln seventeen ladders" },
      });
      const answer = await ask(fresh, name, stranger);
      if (answer.code !== "two-step-needed") open.push(name);
    }
    expect(open).toEqual(["signOut", "readMe", "setUpTwoStep", "confirmTwoStep", "verifyTwoStep"]);
  }, 60_000);
});
