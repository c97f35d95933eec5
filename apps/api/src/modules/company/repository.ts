import { companies, people } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { count, eq, ne } from "drizzle-orm";

export async function updateCompanyRow(
  db: Queryable,
  companyId: string,
  change: Partial<typeof companies.$inferInsert>,
): Promise<void> {
  if (Object.keys(change).length > 0)
    await db.update(companies).set(change).where(eq(companies.id, companyId));
}

export async function countCompanies(db: Queryable): Promise<number> {
  const [row] = await db.select({ count: count() }).from(companies);
  return row?.count ?? 0;
}

/** Companies of another mode than the installation's: none may exist. */
export async function countForeignCompanies(db: Queryable, mode: "demo" | "live"): Promise<number> {
  const [row] = await db.select({ count: count() }).from(companies).where(ne(companies.mode, mode));
  return row?.count ?? 0;
}

export async function insertCompany(db: Queryable, company: typeof companies.$inferInsert): Promise<void> {
  await db.insert(companies).values(company);
}

export async function insertPerson(db: Queryable, person: typeof people.$inferInsert): Promise<void> {
  await db.insert(people).values(person);
}
