import { calls, devices, diagnoses, treeVersions, units } from "@emberladder/db";
import type { Database } from "@emberladder/db";
import { and, count, eq, inArray } from "drizzle-orm";

/** How many of some units there are. */
export async function countUnits(database: Database, ids: readonly string[]): Promise<number> {
  const [row] = await database
    .select({ count: count() })
    .from(units)
    .where(inArray(units.id, [...ids]));
  return row?.count ?? 0;
}

/** How many of some diagnoses have asked for their report, which is the last step of a record. */
export async function countComplete(database: Database, ids: readonly string[]): Promise<number> {
  const [row] = await database
    .select({ count: count() })
    .from(diagnoses)
    .where(and(inArray(diagnoses.id, [...ids]), eq(diagnoses.wantsReport, true)));
  return row?.count ?? 0;
}

/** Adds a call; one that is there already stays as it is. */
export async function insertPastCall(database: Database, row: typeof calls.$inferInsert): Promise<void> {
  await database
    .insert(calls)
    .values(row)
    .onDuplicateKeyUpdate({ set: { companyId: row.companyId } });
}

/** Adds a phone; one that is there already stays as it is. */
export async function insertPhone(database: Database, row: typeof devices.$inferInsert): Promise<void> {
  await database
    .insert(devices)
    .values(row)
    .onDuplicateKeyUpdate({ set: { companyId: row.companyId } });
}

/** The version of a company's tree that is in force, as an opening pins it; null where it has none. */
export async function findTreeInForce(database: Database, companyId: string) {
  const [row] = await database
    .select({ id: treeVersions.treeId, version: treeVersions.version, hash: treeVersions.hash })
    .from(treeVersions)
    .where(and(eq(treeVersions.companyId, companyId), eq(treeVersions.inForce, true)))
    .limit(1);
  return row ?? null;
}
