import { calls, companies, customers, people, sites, units } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, eq } from "drizzle-orm";

/** A person with the company, as messages name them. */
export async function findRecipient(db: Queryable, personId: string) {
  const [row] = await db
    .select({
      name: people.name,
      email: people.email,
      passwordHash: people.passwordHash,
      disabledAt: people.disabledAt,
      companyId: companies.id,
      companyName: companies.name,
      timeZone: companies.timeZone,
    })
    .from(people)
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(eq(people.id, personId));
  return row;
}

/** A call as the message about it names it. */
export async function findCallForMail(db: Queryable, companyId: string, callId: string) {
  const [row] = await db
    .select({
      number: calls.number,
      complaint: calls.complaint,
      scheduledFor: calls.scheduledFor,
      assignedTo: calls.assignedTo,
      address: sites.address,
      town: sites.town,
      timeZone: sites.timeZone,
      customerFirstName: customers.firstName,
    })
    .from(calls)
    .innerJoin(units, eq(units.id, calls.unitId))
    .innerJoin(sites, eq(sites.id, units.siteId))
    .innerJoin(customers, eq(customers.id, sites.customerId))
    .where(and(eq(calls.companyId, companyId), eq(calls.id, callId)));
  return row;
}
