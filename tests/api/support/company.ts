import { createSessionKeeper } from "@emberladder/api/src/modules/auth/sessions.ts";
import { hashPassword } from "@emberladder/api/src/modules/auth/passwords.ts";
import { ROLES } from "@emberladder/contract";
import type { Role } from "@emberladder/contract";
import { calls, companies, customers, devices, people, sealSecret, sites, units } from "@emberladder/db";
import { demoCalls } from "@emberladder/db/seed";
import { v7 as uuidv7 } from "uuid";
import { createClient } from "./client.ts";
import type { TestClient } from "./client.ts";
import type { TestServer } from "./test-server.ts";

/** The pass phrase of every person made here. */
export const PASSWORD = "oboe kiln seventeen ladders";
/** The authenticator secret of every person who has one. */
export const TOTP_SECRET = new TextEncoder().encode("12345678901234567890");
let passwordHash: Promise<string> | undefined;

export interface TestPerson {
  id: string;
  email: string;
  role: Role;
  deviceId: string;
}

/** A company of its own for one test: one person of each role, a customer with a site, a unit and a call. */
export interface TestCompany {
  id: string;
  people: Record<Role, TestPerson>;
  customerId: string;
  siteId: string;
  unitId: string;
  callId: string;
  /** A signed-in client of somebody, with a device bound. */
  clientOf: (role: Role) => Promise<TestClient>;
}

/** The unit profile used in tests: a direct hot-surface unit with an integrated board, invented. */
const [firstDemoCall] = demoCalls;
if (!firstDemoCall) throw new Error("The demo has calls.");
export const testProfile = firstDemoCall.profile;

/** Makes a company. Its names are its own, so that tests never meet each other. */
export async function makeCompany(
  server: TestServer,
  { hasTwoStep = ["supervisor"] as Role[] } = {},
): Promise<TestCompany> {
  const { database } = server;
  const id = uuidv7();
  const now = new Date(server.dependencies.clock());
  const mark = id.slice(-12);
  passwordHash ??= hashPassword(PASSWORD);
  const hash = await passwordHash;
  await database.insert(companies).values({
    id,
    name: `Company ${mark}`,
    timeZone: "America/Denver",
    altitudeRule: "4-from-sea-level",
    unitsShown: "inch-pound",
    mode: server.dependencies.environment.mode,
    createdAt: now,
  });
  const entries = ROLES.map((role): [Role, TestPerson] => [
    role,
    { id: uuidv7(), email: `${role}-${mark}@company.example`, role, deviceId: uuidv7() },
  ]);
  for (const [role, person] of entries) {
    const withCodes = hasTwoStep.includes(role);
    await database.insert(people).values({
      id: person.id,
      companyId: id,
      name: `The ${role}`,
      email: person.email,
      role,
      passwordHash: hash,
      totpSecret: withCodes ? sealSecret(TOTP_SECRET, server.dependencies.environment.sessionSecret) : null,
      totpConfirmedAt: withCodes ? now : null,
      createdAt: now,
    });
    await database.insert(devices).values({
      id: person.deviceId,
      companyId: id,
      personId: person.id,
      name: "Test phone",
      registeredAt: now,
      lastSeenAt: now,
    });
  }
  const owner = { companyId: id, createdAt: now };
  const rows = { customerId: uuidv7(), siteId: uuidv7(), unitId: uuidv7(), callId: uuidv7() };
  await database.insert(customers).values({
    id: rows.customerId,
    ...owner,
    firstName: "Odalys",
    lastName: `Surname-${mark}`,
    email: `customer-${mark}@home.example`,
    phone: "555-0101",
  });
  await database.insert(sites).values({
    id: rows.siteId,
    ...owner,
    customerId: rows.customerId,
    address: "18 Kiln Row",
    town: "Harrow Falls",
  });
  await database.insert(units).values({
    id: rows.unitId,
    ...owner,
    siteId: rows.siteId,
    name: "Basement furnace",
    profile: testProfile,
  });
  await database.insert(calls).values({
    id: rows.callId,
    ...owner,
    number: 1_000_000,
    unitId: rows.unitId,
    assignedTo: entries.find(([role]) => role === "technician")?.[1].id ?? null,
    status: "open",
    complaint: "No heat since last night.",
    scheduledFor: now,
  });
  const byRole = Object.fromEntries(entries) as Record<Role, TestPerson>;
  return {
    id,
    people: byRole,
    ...rows,
    clientOf: async (role) => {
      const person = byRole[role];
      const { cookie } = await createSessionKeeper(server.dependencies).begin({
        personId: person.id,
        role,
        deviceId: person.deviceId,
        twoStepPassed: true,
        now: new Date(server.dependencies.clock()),
      });
      return createClient(server, cookie.split(";")[0]);
    },
  };
}
