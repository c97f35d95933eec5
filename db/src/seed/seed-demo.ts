import { Argon2id } from "oslo/password";
import { base32 } from "oslo/encoding";
import { createTOTPKeyURI } from "oslo/otp";
import type { UnitProfile } from "@emberladder/furnace";
import { eq } from "drizzle-orm";
import type { Database, Transaction } from "../client.ts";
import { sealSecret } from "../sealed-secret.ts";
import { calls, companies, customers, people, sites, units } from "../schema/index.ts";
import { installShippedTrees } from "../shipped-trees.ts";
import { inTransaction } from "../transaction.ts";
import { demoCalls } from "./demo-calls.ts";
import { demoId } from "./demo-id.ts";
import { demoCompanies } from "./demo-people.ts";
import type { DemoCompany, DemoPerson } from "./demo-people.ts";
import { makePassphrase } from "./passphrase.ts";

/** How a demo person signs in, as it is printed where the demo was started. */
export interface DemoAccount {
  role: string;
  name: string;
  company: string;
  email: string;
  password: string;
  /** Present where a two-step code is asked for. */
  totpSecretUri?: string;
}

export interface SeedSources {
  database: Database;
  /** The installation's secret, under which authenticator secrets are sealed. */
  sessionSecret: string;
  now: Date;
  random: (bytes: number) => Uint8Array;
}

const TIME_ZONE = "America/Denver";
/** Calls are numbered from here, so that they look like a company's and not like a count. */
const FIRST_CALL_NUMBER = 1107;

/**
 * Fills an empty demo with two invented companies, their people, customers, units and today's calls, all or
 * nothing. Run again, it leaves the rows alone and only gives the people new passwords.
 */
export async function seedDemo(sources: SeedSources): Promise<DemoAccount[]> {
  const { database } = sources;
  const accounts: DemoAccount[] = [];
  const prepared: { company: DemoCompany; person: DemoPerson; secrets: Secrets }[] = [];
  for (const company of demoCompanies)
    for (const person of company.people) {
      const { account, secrets } = await preparePerson(company, person, sources);
      accounts.push(account);
      prepared.push({ company, person, secrets });
    }
  await inTransaction(database, async (tx) => {
    for (const company of demoCompanies) {
      await seedCompany(tx, company, sources.now);
      await installShippedTrees(tx, demoId("company", company.slug), sources.now);
    }
    for (const { company, person, secrets } of prepared)
      await seedPerson(tx, company, person, secrets, sources.now);
    for (const [index, call] of demoCalls.entries())
      await seedCall(tx, call, FIRST_CALL_NUMBER + index, sources.now);
  });
  return accounts;
}

type Secrets = Pick<typeof people.$inferInsert, "passwordHash" | "totpSecret" | "totpConfirmedAt">;

async function preparePerson(
  company: DemoCompany,
  person: DemoPerson,
  { random, sessionSecret, now }: SeedSources,
) {
  const password = makePassphrase(random);
  const passwordHash = await new Argon2id({ memorySize: 19_456, iterations: 2, parallelism: 1 }).hash(
    password,
  );
  const account: DemoAccount = {
    role: person.role,
    name: person.name,
    company: company.name,
    email: person.email,
    password,
  };
  const secrets: Secrets = { passwordHash, totpSecret: null, totpConfirmedAt: null };
  if (person.role === "supervisor") {
    const secret = random(20);
    account.totpSecretUri = createTOTPKeyURI("Emberladder", person.email, secret);
    secrets.totpSecret = sealSecret(secret, sessionSecret);
    secrets.totpConfirmedAt = now;
    // Checked here, because an authenticator that cannot read it would lock the demo.
    if (!account.totpSecretUri.includes(base32.encode(secret, { includePadding: false })))
      throw new Error("The two-step set-up of the demo is not readable.");
  }
  return { account, secrets };
}

async function seedCompany(tx: Transaction, company: DemoCompany, now: Date): Promise<void> {
  const id = demoId("company", company.slug);
  await tx
    .insert(companies)
    .values({
      id,
      name: company.name,
      timeZone: TIME_ZONE,
      altitudeRule: "4-from-sea-level",
      unitsShown: "inch-pound",
      mode: "demo",
      nextCallNumber: FIRST_CALL_NUMBER + demoCalls.length,
      createdAt: now,
    })
    .onDuplicateKeyUpdate({ set: { mode: "demo" } });
}

async function seedPerson(
  tx: Transaction,
  company: DemoCompany,
  person: DemoPerson,
  secrets: Secrets,
  now: Date,
) {
  const id = demoId("person", person.email);
  const { name, email, role } = person;
  await tx
    .insert(people)
    .values({ id, companyId: demoId("company", company.slug), name, email, role, ...secrets, createdAt: now })
    .onDuplicateKeyUpdate({ set: secrets });
}

async function seedCall(
  tx: Transaction,
  call: (typeof demoCalls)[number],
  number: number,
  now: Date,
): Promise<void> {
  const companyId = demoId("company", call.company);
  const ids = {
    customer: demoId("customer", call.slug),
    site: demoId("site", call.slug),
    unit: demoId("unit", call.slug),
    call: demoId("call", call.slug),
  };
  const known = await tx.select({ id: calls.id }).from(calls).where(eq(calls.id, ids.call));
  if (known.length > 0) return;
  const owner = { companyId, createdAt: now };
  await tx.insert(customers).values({ id: ids.customer, ...owner, ...call.customer });
  await tx
    .insert(sites)
    .values({ id: ids.site, customerId: ids.customer, ...owner, ...call.site, altitudeFt: 4300 });
  await tx.insert(units).values({
    id: ids.unit,
    siteId: ids.site,
    ...owner,
    name: call.unitName,
    profile: withFreshFlueCo(call.profile, now),
  });
  await tx.insert(calls).values({
    id: ids.call,
    ...owner,
    number,
    unitId: ids.unit,
    assignedTo: call.assignedTo === null ? null : personIdOf(call.company, call.assignedTo),
    status: "open",
    complaint: call.complaint,
    scheduledFor: todayAt(now, call.hour),
  });
}

/** A flue CO from two months ago: the units were serviced in the autumn, so a repair need not take it again. */
function withFreshFlueCo(profile: UnitProfile, now: Date): UnitProfile {
  const date = new Date(now.getTime() - 60 * 86_400_000).toISOString().slice(0, 10);
  return { ...profile, lastFlueCo: { date, airFreePpm: 29 } };
}

function personIdOf(company: string, start: string): string {
  const person = demoCompanies
    .find(({ slug }) => slug === company)
    ?.people.find(({ email }) => email.startsWith(`${start}@`));
  if (!person) throw new Error(`The demo has nobody called ${start}.`);
  return demoId("person", person.email);
}

/** An hour of the present day in the demo's time zone. */
function todayAt(now: Date, hour: number): Date {
  const day = new Intl.DateTimeFormat("en-CA", { timeZone: TIME_ZONE }).format(now);
  const noon = new Date(`${day}T12:00:00Z`);
  const noonThere = Number(
    new Intl.DateTimeFormat("en", { timeZone: TIME_ZONE, hour: "2-digit", hourCycle: "h23" }).format(noon),
  );
  return new Date(noon.getTime() + (hour - noonThere) * 3_600_000);
}
