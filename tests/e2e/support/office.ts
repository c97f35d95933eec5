import type { APIRequestContext, Browser } from "@playwright/test";
import { profileOf } from "@emberladder/db/seed";
import type { ReferenceCall } from "@emberladder/db/seed";
import type { UnitProfile } from "@emberladder/furnace";
import { person } from "./people.ts";

const origin = process.env["EMBERLADDER_ORIGIN"] ?? "http://127.0.0.1:4310";
const headers = { origin, "sec-fetch-site": "same-origin" };

async function post<T>(request: APIRequestContext, path: string, data: unknown): Promise<T> {
  const response = await request.post(path, { data, headers });
  if (!response.ok()) throw new Error(`${path} answered ${response.status()}: ${await response.text()}`);
  return (await response.json()) as T;
}

/** A call of its own for one test: customer, site, unit and call, opened by the office for a technician. */
export async function openCall(
  browser: Browser,
  given: {
    technician: string;
    office: string;
    profile: UnitProfile;
    complaint: string;
    customer: { firstName: string; lastName: string; email: string; phone?: string };
    address: string;
    unitName: string;
  },
): Promise<{ callId: string; unitId: string; email: string }> {
  const context = await browser.newContext({ baseURL: origin });
  try {
    const { request } = context;
    const office = person(given.office);
    await post(request, "/api/auth/sign-in", { email: office.email, password: office.password });
    const people = (await (await request.get("/api/people")).json()) as {
      items: { id: string; email: string }[];
    };
    const assignedTo = people.items.find(({ email }) => email === person(given.technician).email)?.id ?? null;
    const customer = await post<{ sites: { id: string }[] }>(request, "/api/customers", {
      ...given.customer,
      site: { address: given.address, town: "Harrow Falls", altitudeFt: 4300 },
    });
    const unit = await post<{ id: string }>(request, "/api/units", {
      siteId: customer.sites[0]?.id,
      name: given.unitName,
      profile: given.profile,
    });
    const call = await post<{ id: string }>(request, "/api/calls", {
      unitId: unit.id,
      complaint: given.complaint,
      scheduledFor: new Date().toISOString(),
      assignedTo,
    });
    return { callId: call.id, unitId: unit.id, email: given.customer.email };
  } finally {
    await context.close();
  }
}

let count = 0;

/** A call like a reference call, with a customer of its own, so that its mail can be told from others. */
export async function openReferenceCall(
  browser: Browser,
  reference: ReferenceCall,
  change: (profile: UnitProfile) => UnitProfile = (profile) => profile,
) {
  count += 1;
  const [firstName = "", lastName = ""] = reference.job.customer.name.split(" ");
  return openCall(browser, {
    technician: "ibby",
    office: "hollis",
    profile: change(profileOf(reference)),
    complaint: reference.complaint,
    customer: { firstName, lastName, email: `${reference.slug}-${Date.now()}-${count}@customer.example` },
    address: reference.job.site.address,
    unitName: reference.unit.profile.name,
  });
}

/** A unit's last flue CO, two months old: a repair of the flame need not take it again. */
export function withFreshFlueCo(profile: UnitProfile): UnitProfile {
  return {
    ...profile,
    lastFlueCo: { date: new Date(Date.now() - 60 * 86_400_000).toISOString().slice(0, 10), airFreePpm: 29 },
  };
}
