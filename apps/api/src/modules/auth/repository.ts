import type { Role } from "@emberladder/contract";
import { companies, devices, events, people, sessions, totpUsedSteps, recoveryCodes } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, desc, eq, gt, isNull, lt, max, ne, sql } from "drizzle-orm";

/** What sign-in and the account routes know of a person. */
export interface AccountRow {
  id: string;
  companyId: string;
  name: string;
  email: string;
  role: Role;
  passwordHash: string | null;
  disabledAt: Date | null;
  totpSecret: string | null;
  totpPending: string | null;
  totpConfirmedAt: Date | null;
}

const accountColumns = {
  id: people.id,
  companyId: people.companyId,
  name: people.name,
  email: people.email,
  role: people.role,
  passwordHash: people.passwordHash,
  disabledAt: people.disabledAt,
  totpSecret: people.totpSecret,
  totpPending: people.totpPending,
  totpConfirmedAt: people.totpConfirmedAt,
};

export async function findAccountByEmail(db: Queryable, email: string): Promise<AccountRow | undefined> {
  const [row] = await db.select(accountColumns).from(people).where(eq(people.email, email));
  return row;
}

export async function findAccount(db: Queryable, personId: string): Promise<AccountRow | undefined> {
  const [row] = await db.select(accountColumns).from(people).where(eq(people.id, personId));
  return row;
}

/** The same, locked until the transaction ends. */
export async function lockAccount(db: Queryable, personId: string): Promise<AccountRow | undefined> {
  const [row] = await db.select(accountColumns).from(people).where(eq(people.id, personId)).for("update");
  return row;
}

export async function updateAccount(
  db: Queryable,
  personId: string,
  change: Partial<typeof people.$inferInsert>,
): Promise<void> {
  await db.update(people).set(change).where(eq(people.id, personId));
}

export async function findCompany(db: Queryable, companyId: string) {
  const [row] = await db.select().from(companies).where(eq(companies.id, companyId));
  return row;
}

/**
 * Finds a session with its person by the session's hash: only the columns that every request needs. The query is
 * put into words once, because every request makes it.
 */
export function prepareFindSession(db: Queryable) {
  const query = db
    .select({
      personId: sessions.userId,
      expiresAt: sessions.expiresAt,
      deviceId: sessions.deviceId,
      createdAt: sessions.createdAt,
      lastUsedAt: sessions.lastUsedAt,
      twoStepPassed: sessions.twoStepPassed,
      companyId: people.companyId,
      name: people.name,
      email: people.email,
      role: people.role,
      disabledAt: people.disabledAt,
      totpConfirmedAt: people.totpConfirmedAt,
    })
    .from(sessions)
    .innerJoin(people, eq(people.id, sessions.userId))
    .where(eq(sessions.id, sql.placeholder("sessionHash")))
    .prepare();
  return async (sessionHash: string) => {
    const [row] = await query.execute({ sessionHash });
    return row;
  };
}

export async function deleteSession(db: Queryable, sessionHash: string): Promise<void> {
  await db.delete(sessions).where(eq(sessions.id, sessionHash));
}

/** Ends a person's sessions; all of them, or all but one. */
export async function deleteSessionsOf(db: Queryable, personId: string, keep?: string): Promise<void> {
  await db
    .delete(sessions)
    .where(and(eq(sessions.userId, personId), keep === undefined ? undefined : ne(sessions.id, keep)));
}

export async function deleteSessionsOfDevice(db: Queryable, deviceId: string): Promise<void> {
  await db.delete(sessions).where(eq(sessions.deviceId, deviceId));
}

/** Ends one session by its public id, if it is the person's own. Returns how many ended. */
export async function deleteOwnSession(db: Queryable, personId: string, publicId: string): Promise<number> {
  const [result] = await db
    .delete(sessions)
    .where(and(eq(sessions.userId, personId), eq(sessions.publicId, publicId)));
  return result.affectedRows;
}

/** Writes the last use of a session and of its person. */
export async function touchSession(
  db: Queryable,
  { sessionHash, personId, now }: { sessionHash: string; personId: string; now: Date },
): Promise<void> {
  await db.update(sessions).set({ lastUsedAt: now }).where(eq(sessions.id, sessionHash));
  await markSeen(db, personId, now);
}

/** Writes when a person was last here. */
export async function markSeen(db: Queryable, personId: string, now: Date): Promise<void> {
  await db.update(people).set({ lastSeenAt: now }).where(eq(people.id, personId));
}

export async function setSessionDevice(db: Queryable, sessionHash: string, deviceId: string): Promise<void> {
  await db.update(sessions).set({ deviceId }).where(eq(sessions.id, sessionHash));
}

export async function listSessionsOf(db: Queryable, personId: string, now: Date) {
  return db
    .select({
      hash: sessions.id,
      id: sessions.publicId,
      deviceName: devices.name,
      startedAt: sessions.createdAt,
      lastUsedAt: sessions.lastUsedAt,
      endsAt: sessions.expiresAt,
    })
    .from(sessions)
    .leftJoin(devices, eq(devices.id, sessions.deviceId))
    .where(and(eq(sessions.userId, personId), gt(sessions.expiresAt, now)))
    .orderBy(desc(sessions.lastUsedAt));
}

export async function findDevice(db: Queryable, deviceId: string) {
  const [row] = await db.select().from(devices).where(eq(devices.id, deviceId));
  return row;
}

export async function insertDevice(db: Queryable, device: typeof devices.$inferInsert): Promise<void> {
  await db.insert(devices).values(device);
}

export async function updateDevice(
  db: Queryable,
  deviceId: string,
  change: Partial<typeof devices.$inferInsert>,
): Promise<void> {
  await db.update(devices).set(change).where(eq(devices.id, deviceId));
}

/** Devices of a person with the highest number each has used in the record. */
export async function listDevicesOf(db: Queryable, companyId: string, personId: string) {
  return db
    .select({
      id: devices.id,
      name: devices.name,
      registeredAt: devices.registeredAt,
      lastSeenAt: devices.lastSeenAt,
      revokedAt: devices.revokedAt,
      lastSeq: max(events.deviceSeq),
    })
    .from(devices)
    .leftJoin(events, eq(events.deviceId, devices.id))
    .where(and(eq(devices.companyId, companyId), eq(devices.personId, personId)))
    .groupBy(devices.id, devices.name, devices.registeredAt, devices.lastSeenAt, devices.revokedAt)
    .orderBy(desc(devices.lastSeenAt));
}

/** Takes a time step for a person. @throws duplicate key when it was used before. */
export async function insertUsedStep(
  db: Queryable,
  row: { id: string; personId: string; step: number },
): Promise<void> {
  await db.insert(totpUsedSteps).values(row);
}

export async function replaceRecoveryCodes(
  db: Queryable,
  personId: string,
  hashes: readonly string[],
  now: Date,
): Promise<void> {
  await db.delete(recoveryCodes).where(eq(recoveryCodes.personId, personId));
  if (hashes.length > 0)
    await db.insert(recoveryCodes).values(hashes.map((codeHash) => ({ codeHash, personId, createdAt: now })));
}

/** Spends a recovery code; false when it is unknown, another person's, or spent. */
export async function spendRecoveryCode(
  db: Queryable,
  personId: string,
  codeHash: string,
  now: Date,
): Promise<boolean> {
  const [result] = await db
    .update(recoveryCodes)
    .set({ usedAt: now })
    .where(
      and(
        eq(recoveryCodes.personId, personId),
        eq(recoveryCodes.codeHash, codeHash),
        isNull(recoveryCodes.usedAt),
      ),
    );
  return result.affectedRows === 1;
}

/** Removes sessions past their absolute limit. */
export async function deleteOverSessions(db: Queryable, now: Date): Promise<void> {
  await db.delete(sessions).where(lt(sessions.expiresAt, now));
}
