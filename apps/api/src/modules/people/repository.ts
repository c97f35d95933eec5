import { devices, people } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, asc, eq, isNotNull, isNull } from "drizzle-orm";

const columns = {
  id: people.id,
  name: people.name,
  email: people.email,
  role: people.role,
  passwordHash: people.passwordHash,
  disabledAt: people.disabledAt,
  totpConfirmedAt: people.totpConfirmedAt,
  createdAt: people.createdAt,
  lastSeenAt: people.lastSeenAt,
};
export type PersonRow = Awaited<ReturnType<typeof listPeopleOf>>[number];

export async function listPeopleOf(db: Queryable, companyId: string) {
  return db.select(columns).from(people).where(eq(people.companyId, companyId)).orderBy(asc(people.name));
}

export async function findPerson(db: Queryable, companyId: string, personId: string) {
  const [row] = await db
    .select(columns)
    .from(people)
    .where(and(eq(people.companyId, companyId), eq(people.id, personId)));
  return row;
}

/** Supervisors who can sign in, locked until the transaction ends: two removals side by side cannot remove both. */
export async function lockActiveSupervisors(db: Queryable, companyId: string): Promise<string[]> {
  const rows = await db
    .select({ id: people.id })
    .from(people)
    .where(
      and(
        eq(people.companyId, companyId),
        eq(people.role, "supervisor"),
        isNull(people.disabledAt),
        isNotNull(people.passwordHash),
      ),
    )
    .for("update");
  return rows.map(({ id }) => id);
}

export async function updatePersonRow(
  db: Queryable,
  companyId: string,
  personId: string,
  change: Partial<typeof people.$inferInsert>,
): Promise<void> {
  await db
    .update(people)
    .set(change)
    .where(and(eq(people.companyId, companyId), eq(people.id, personId)));
}

export async function findCompanyDevice(db: Queryable, companyId: string, deviceId: string) {
  const [row] = await db
    .select()
    .from(devices)
    .where(and(eq(devices.companyId, companyId), eq(devices.id, deviceId)));
  return row;
}
