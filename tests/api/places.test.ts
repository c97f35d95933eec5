import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { endOfDay, startOfDay } from "@emberladder/api/src/modules/calls/day-range.ts";
import { customers } from "@emberladder/db";
import { makeCompany, testProfile } from "./support/company.ts";
import { startPost } from "./support/mail.ts";
import type { TestPost } from "./support/mail.ts";
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

describe("customers", () => {
  it("are added with a site, found by name, street or town, and changed", async () => {
    const senior = await (await makeCompany(server)).clientOf("senior");
    const made = await senior.call("createCustomer", {
      body: {
        firstName: "Fenella",
        lastName: "Quarrie",
        email: "fenella@quarrie.example",
        site: { address: "240 Millrace Street", town: "Harrow Falls", altitudeFt: 4300 },
      },
    });
    expect(made.status).toBe(201);
    const customer = made.json<{ id: string; sites: { id: string; altitudeFt: number }[] }>();
    expect(customer.sites).toMatchObject([{ address: "240 Millrace Street", altitudeFt: 4300, units: [] }]);
    for (const search of ["fenella", "QUARRIE", "millrace", "quarrie.example"]) {
      const page = (await senior.call("listCustomers", { query: { search } })).json<{
        items: { id: string }[];
      }>();
      expect([search, page.items.map(({ id }) => id)]).toEqual([search, [customer.id]]);
    }
    const params = { customerId: customer.id };
    const changed = await senior.call("updateCustomer", {
      params,
      body: { lastName: null, phone: "555-0199" },
    });
    expect(changed.json()).toMatchObject({ firstName: "Fenella", lastName: null, phone: "555-0199" });
    const site = await senior.call("updateSite", {
      params: { siteId: customer.sites[0]?.id ?? "" },
      body: { accessNote: "Side gate.\nMind the step." },
    });
    expect(site.json()).toMatchObject({ accessNote: "Side gate.\nMind the step.", altitudeFt: 4300 });
  });

  it("are listed by pages", async () => {
    const company = await makeCompany(server);
    const senior = await company.clientOf("senior");
    await server.database.insert(customers).values(
      Array.from({ length: 7 }, (_none, index) => ({
        id: server.dependencies.newId(),
        companyId: company.id,
        firstName: "Name",
        lastName: `A${index}`,
        createdAt: new Date(),
      })),
    );
    const page = (await senior.call("listCustomers", { query: { page: "2", pageSize: "3" } })).json<{
      items: { lastName: string }[];
      total: number;
    }>();
    expect(page).toMatchObject({ total: 8, page: 2, pageSize: 3 });
    expect(page.items.map(({ lastName }) => lastName)).toEqual(["A3", "A4", "A5"]);
  });
});

describe("units", () => {
  it("come back with the profile as it was given, and with their site", async () => {
    const company = await makeCompany(server);
    const technician = await company.clientOf("technician");
    const made = await technician.call("createUnit", {
      body: { siteId: company.siteId, name: "Attic furnace", profile: testProfile },
    });
    expect(made.status).toBe(201);
    expect(made.json()).toMatchObject({
      name: "Attic furnace",
      profile: testProfile,
      version: 1,
      customerFirstName: "Odalys",
      openShutOff: null,
      history: [],
    });
  });

  it("corrected by two people at once take the first and tell the second", async () => {
    const company = await makeCompany(server);
    const technician = await company.clientOf("technician");
    const correct = async (name: string) =>
      technician.call("updateUnit", { params: { unitId: company.unitId }, body: { version: 1, name } });
    const answers = await Promise.all([correct("One"), correct("Two")]);
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 409]);
    expect(answers.find(({ status }) => status === 409)?.code).toBe("changed-meanwhile");
  });
});

// SEC-20: what of a customer leaves the office.
describe("calls", () => {
  it("show people on site the first name and the site, and no more of the customer", async () => {
    const company = await makeCompany(server);
    const answer = await (
      await company.clientOf("technician")
    ).call("readCall", { params: { callId: company.callId } });
    expect(answer.json()).toMatchObject({
      customerFirstName: "Odalys",
      site: { address: "18 Kiln Row" },
      unit: { profile: testProfile },
      timeZone: "America/Denver",
    });
    expect(answer.text).not.toMatch(/Surname|555-0101|home\.example/);
  });

  it("are one's own and nobody's by default, and all when asked for", async () => {
    const company = await makeCompany(server);
    const { technician, senior } = company.people;
    const desk = await company.clientOf("senior");
    const open = async (assignedTo: string | null) =>
      (
        await desk.call("createCall", {
          body: {
            unitId: company.unitId,
            complaint: "No heat.",
            scheduledFor: "2026-01-12T15:00:00Z",
            assignedTo,
          },
        })
      ).json<{ number: number }>().number;
    const [theirs, mine, nobodys] = [await open(senior.id), await open(technician.id), await open(null)];
    const list = async (query: Record<string, string>) =>
      (await (await company.clientOf("technician")).call("listCalls", { query }))
        .json<{ items: { number: number }[] }>()
        .items.map(({ number }) => number);
    expect(await list({ date: "2026-01-12" })).toEqual([mine, nobodys]);
    expect(await list({ date: "2026-01-12", scope: "all" })).toEqual([theirs, mine, nobodys]);
    expect(await list({ date: "2026-01-13", scope: "all" })).toEqual([]);
  });

  it("are numbered without a gap or a repetition when opened at once", async () => {
    const company = await makeCompany(server);
    const technician = await company.clientOf("technician");
    const numbers = await Promise.all(
      Array.from(
        { length: 8 },
        async () =>
          (
            await technician.call("createCall", {
              body: { unitId: company.unitId, complaint: "No heat.", scheduledFor: "2026-01-12T15:00:00Z" },
            })
          ).json<{ number: number }>().number,
      ),
    );
    expect(numbers.toSorted((a, b) => a - b)).toEqual([1, 2, 3, 4, 5, 6, 7, 8]);
  });

  it("can be taken by a technician and given to somebody else only from the desk", async () => {
    const company = await makeCompany(server);
    const technician = await company.clientOf("technician");
    const open = async (assignedTo: string) =>
      technician.call("createCall", {
        body: {
          unitId: company.unitId,
          complaint: "No heat.",
          scheduledFor: "2026-01-12T15:00:00Z",
          assignedTo,
        },
      });
    expect((await open(company.people.technician.id)).status).toBe(201);
    expect((await open(company.people.senior.id)).code).toBe("not-allowed");
  });

  it("assigned to somebody tell them by mail, with the site's own time", async () => {
    const company = await makeCompany(server);
    const desk = await company.clientOf("senior");
    const { id, version } = (
      await desk.call("createCall", {
        body: {
          unitId: company.unitId,
          complaint: "No heat since noon.",
          scheduledFor: "2026-01-12T15:40:00Z",
        },
      })
    ).json<{ id: string; version: number }>();
    const { technician } = company.people;
    const assigned = await desk.call("assignCall", {
      params: { callId: id },
      body: { personId: technician.id, version },
    });
    expect(assigned.json()).toMatchObject({ assignedTo: { id: technician.id }, version: version + 1 });
    const late = await desk.call("assignCall", { params: { callId: id }, body: { personId: null, version } });
    expect(late.code).toBe("changed-meanwhile");
    await post.workOff();
    const [message] = await post.messagesTo(technician.email);
    // 15:40 UTC in January is 8:40 in the morning in Denver (UTC-7).
    expect(message?.text).toContain("Monday, January 12, 2026 at 8:40 AM MST");
    expect(message?.text).toContain("No heat since noon.");
    expect(message?.text).not.toMatch(/Surname|555-0101/);
  });

  it("that nobody has begun can be cancelled once", async () => {
    const company = await makeCompany(server);
    const desk = await company.clientOf("senior");
    const params = { callId: company.callId };
    expect((await desk.call("cancelCall", { params, body: { version: 1 } })).json()).toMatchObject({
      status: "cancelled",
    });
    expect((await desk.call("cancelCall", { params, body: { version: 2 } })).code).toBe("wrong-state");
  });
});

describe("a day in a time zone", () => {
  // Clock changes of 2026 in the United States: March 8 and November 1 at 2 in the morning (15 U.S.C. 260a,
  // from memory), so these days have 23 and 25 hours.
  it("is 23 hours long when clocks go forward and 25 when they go back", () => {
    const hours = (day: string) =>
      (endOfDay(day, "America/Denver").getTime() - startOfDay(day, "America/Denver").getTime()) / 3_600_000;
    expect([hours("2026-03-07"), hours("2026-03-08"), hours("2026-11-01")]).toEqual([24, 23, 25]);
    expect(startOfDay("2026-03-08", "America/Denver").toISOString()).toBe("2026-03-08T07:00:00.000Z");
  });
});
