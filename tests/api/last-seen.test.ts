import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { createClient } from "./support/client.ts";
import { makeCompany, PASSWORD } from "./support/company.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(async () => {
  await server.close();
});

type Company = Awaited<ReturnType<typeof makeCompany>>;
type Role = "technician" | "senior" | "trainee" | "supervisor";

async function lastSeenOf(company: Company, role: Role): Promise<string | null | undefined> {
  const supervisor = await company.clientOf("supervisor");
  const { items } = (await supervisor.call("listPeople")).json<{
    items: { id: string; lastSeenAt: string | null }[];
  }>();
  return items.find(({ id }) => id === company.people[role].id)?.lastSeenAt;
}

describe("when a person was last seen", () => {
  it("is not known before the first sign-in, and is its moment after it", async () => {
    const company = await makeCompany(server);
    expect(await lastSeenOf(company, "technician")).toBeNull();
    const before = server.dependencies.clock();
    const { email } = company.people.technician;
    await createClient(server).call("signIn", { body: { email, password: PASSWORD } });
    const seen = Date.parse((await lastSeenOf(company, "technician")) ?? "");
    expect(seen).toBeGreaterThanOrEqual(before);
    expect(seen).toBeLessThanOrEqual(server.dependencies.clock());
  });

  it("stays unknown while a sign-in still owes its two-step code", async () => {
    const company = await makeCompany(server, { hasTwoStep: ["supervisor", "senior"] });
    const { email } = company.people.senior;
    await createClient(server).call("signIn", { body: { email, password: PASSWORD } });
    expect(await lastSeenOf(company, "senior")).toBeNull();
  });

  it("moves on while the session is used, days after the sign-in", async () => {
    const company = await makeCompany(server);
    const technician = await company.clientOf("technician");
    const first = Date.parse((await lastSeenOf(company, "technician")) ?? "");
    server.moveClock(2 * 86_400_000);
    expect((await technician.call("readMe")).status).toBe(200);
    const later = Date.parse((await lastSeenOf(company, "technician")) ?? "");
    expect(later - first).toBeGreaterThanOrEqual(2 * 86_400_000);
  });
});
