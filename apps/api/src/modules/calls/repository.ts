import { calls, companies, customers, people, sites, units } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, asc, count, eq, gte, isNull, lt, or, sql } from "drizzle-orm";
import type { SQL } from "drizzle-orm";

export type CallStatus = typeof calls.$inferSelect.status;
export type CallRow = Awaited<ReturnType<typeof selectCalls>>[number];

async function selectCalls(db: Queryable, where: SQL | undefined, limit: number, offset = 0) {
  return db
    .select({
      call: calls,
      unit: units,
      site: sites,
      customerFirstName: customers.firstName,
      assignedName: people.name,
      companyTimeZone: companies.timeZone,
    })
    .from(calls)
    .innerJoin(units, eq(units.id, calls.unitId))
    .innerJoin(sites, eq(sites.id, units.siteId))
    .innerJoin(customers, eq(customers.id, sites.customerId))
    .innerJoin(companies, eq(companies.id, calls.companyId))
    .leftJoin(people, eq(people.id, calls.assignedTo))
    .where(where)
    .orderBy(asc(calls.scheduledFor), asc(calls.number))
    .limit(limit)
    .offset(offset);
}

/** What the list of calls can be narrowed by; `to` is not included. */
export interface CallFilter {
  companyId: string;
  /** This person's own calls and those that nobody has. */
  mineOf?: string | undefined;
  from?: Date | undefined;
  to?: Date | undefined;
  status?: CallStatus | undefined;
  assignedTo?: string | undefined;
  unitId?: string | undefined;
}

/** One page of calls by time, with the count of all. */
export async function listCallRows(db: Queryable, filter: CallFilter, page: number, pageSize: number) {
  const { mineOf, from, to, status, assignedTo, unitId } = filter;
  const where = and(
    eq(calls.companyId, filter.companyId),
    mineOf ? or(eq(calls.assignedTo, mineOf), isNull(calls.assignedTo)) : undefined,
    from && gte(calls.scheduledFor, from),
    to && lt(calls.scheduledFor, to),
    status && eq(calls.status, status),
    assignedTo ? eq(calls.assignedTo, assignedTo) : undefined,
    unitId ? eq(calls.unitId, unitId) : undefined,
  );
  const [rows, [total]] = await Promise.all([
    selectCalls(db, where, pageSize, (page - 1) * pageSize),
    db.select({ count: count() }).from(calls).where(where),
  ]);
  return { rows, total: total?.count ?? 0 };
}

export async function findCallRow(db: Queryable, companyId: string, callId: string) {
  const [row] = await selectCalls(db, and(eq(calls.companyId, companyId), eq(calls.id, callId)), 1);
  return row;
}

/** Takes the next number of the company; the company's row is locked until the transaction ends. */
export async function takeCallNumber(db: Queryable, companyId: string): Promise<number> {
  const [row] = await db
    .select({ next: companies.nextCallNumber })
    .from(companies)
    .where(eq(companies.id, companyId))
    .for("update");
  const number = row?.next ?? 1;
  await db
    .update(companies)
    .set({ nextCallNumber: number + 1 })
    .where(eq(companies.id, companyId));
  return number;
}

export async function insertCall(db: Queryable, row: typeof calls.$inferInsert): Promise<void> {
  await db.insert(calls).values(row);
}

/** Changes a call if its version is still the one that was read; false when it is not. */
export async function updateCallRow(
  db: Queryable,
  { companyId, callId, version }: { companyId: string; callId: string; version: number },
  change: Partial<typeof calls.$inferInsert>,
): Promise<boolean> {
  const [result] = await db
    .update(calls)
    .set({ ...change, version: sql`${calls.version} + 1` })
    .where(and(eq(calls.companyId, companyId), eq(calls.id, callId), eq(calls.version, version)));
  return result.affectedRows === 1;
}
