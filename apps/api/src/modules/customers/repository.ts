import { customers, sites, units } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, asc, count, countDistinct, eq, inArray, like, or } from "drizzle-orm";

export type CustomerRow = typeof customers.$inferSelect;
export type SiteRow = typeof sites.$inferSelect;
export type UnitRow = typeof units.$inferSelect;

/** One page of customers by name, each with the number of its sites. */
export async function listCustomerRows(
  db: Queryable,
  {
    companyId,
    search,
    page,
    pageSize,
  }: { companyId: string; search?: string | undefined; page: number; pageSize: number },
) {
  const pattern = search ? `%${search.replaceAll(/[\\%_]/g, String.raw`\$&`)}%` : undefined;
  const where = and(
    eq(customers.companyId, companyId),
    pattern === undefined
      ? undefined
      : or(
          ...[customers.firstName, customers.lastName, customers.email, sites.address, sites.town].map(
            (column) => like(column, pattern),
          ),
        ),
  );
  const [rows, [total]] = await Promise.all([
    db
      .select({ customer: customers, siteCount: count(sites.id) })
      .from(customers)
      .leftJoin(sites, eq(sites.customerId, customers.id))
      .where(where)
      .groupBy(customers.id)
      .orderBy(asc(customers.lastName), asc(customers.firstName), asc(customers.id))
      .limit(pageSize)
      .offset((page - 1) * pageSize),
    db
      .select({ count: countDistinct(customers.id) })
      .from(customers)
      .leftJoin(sites, eq(sites.customerId, customers.id))
      .where(where),
  ]);
  return { rows, total: total?.count ?? 0 };
}

export async function findCustomer(db: Queryable, companyId: string, customerId: string) {
  const [row] = await db
    .select()
    .from(customers)
    .where(and(eq(customers.companyId, companyId), eq(customers.id, customerId)));
  return row;
}

export async function listSitesOf(db: Queryable, companyId: string, customerId: string): Promise<SiteRow[]> {
  return db
    .select()
    .from(sites)
    .where(and(eq(sites.companyId, companyId), eq(sites.customerId, customerId)))
    .orderBy(asc(sites.createdAt), asc(sites.id));
}

export async function listUnitsOfSites(
  db: Queryable,
  companyId: string,
  siteIds: string[],
): Promise<UnitRow[]> {
  if (siteIds.length === 0) return [];
  return db
    .select()
    .from(units)
    .where(and(eq(units.companyId, companyId), inArray(units.siteId, siteIds)))
    .orderBy(asc(units.createdAt), asc(units.id));
}

export async function findSite(db: Queryable, companyId: string, siteId: string) {
  const [row] = await db
    .select()
    .from(sites)
    .where(and(eq(sites.companyId, companyId), eq(sites.id, siteId)));
  return row;
}

export async function insertCustomer(db: Queryable, row: typeof customers.$inferInsert): Promise<void> {
  await db.insert(customers).values(row);
}

export async function insertSite(db: Queryable, row: typeof sites.$inferInsert): Promise<void> {
  await db.insert(sites).values(row);
}

export async function updateCustomerRow(
  db: Queryable,
  companyId: string,
  customerId: string,
  change: Partial<typeof customers.$inferInsert>,
): Promise<void> {
  if (Object.keys(change).length === 0) return;
  await db
    .update(customers)
    .set(change)
    .where(and(eq(customers.companyId, companyId), eq(customers.id, customerId)));
}

export async function updateSiteRow(
  db: Queryable,
  companyId: string,
  siteId: string,
  change: Partial<typeof sites.$inferInsert>,
): Promise<void> {
  if (Object.keys(change).length === 0) return;
  await db
    .update(sites)
    .set(change)
    .where(and(eq(sites.companyId, companyId), eq(sites.id, siteId)));
}
