import { customers, sites, units } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, eq, sql } from "drizzle-orm";

/** A unit with its site and the customer's first name. */
export async function findUnitPlace(db: Queryable, companyId: string, unitId: string) {
  const [row] = await db
    .select({ unit: units, site: sites, customerFirstName: customers.firstName })
    .from(units)
    .innerJoin(sites, eq(sites.id, units.siteId))
    .innerJoin(customers, eq(customers.id, sites.customerId))
    .where(and(eq(units.companyId, companyId), eq(units.id, unitId)));
  return row;
}

export async function insertUnit(db: Queryable, row: typeof units.$inferInsert): Promise<void> {
  await db.insert(units).values(row);
}

/** Changes a unit if its version is still the one that was read; false when it is not. */
export async function updateUnitRow(
  db: Queryable,
  { companyId, unitId, version }: { companyId: string; unitId: string; version: number },
  change: Partial<typeof units.$inferInsert>,
): Promise<boolean> {
  const [result] = await db
    .update(units)
    .set({ ...change, version: sql`${units.version} + 1` })
    .where(and(eq(units.companyId, companyId), eq(units.id, unitId), eq(units.version, version)));
  return result.affectedRows === 1;
}
