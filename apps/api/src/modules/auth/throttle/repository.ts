import { inTransaction, signInThrottles } from "@emberladder/db";
import type { Database } from "@emberladder/db";
import { eq, inArray, lt } from "drizzle-orm";
import { judgeTry } from "./throttle-policy.ts";

/**
 * Takes one try for each key, all or none; the database locks them, so that several processes count as one.
 * Returns the moment until which the caller has to wait, or null when the try counts.
 */
export async function takeTry(
  database: Database,
  keys: readonly { hash: string; freeTries: number }[],
  now: Date,
): Promise<Date | null> {
  return inTransaction(database, async (tx) => {
    for (const { hash } of keys)
      await tx
        .insert(signInThrottles)
        .values({ keyHash: hash, attempts: 0, lastAttemptAt: now, blockedUntil: null })
        .onDuplicateKeyUpdate({ set: { keyHash: hash } });
    const changes = [];
    for (const { hash, freeTries } of keys) {
      const [row] = await tx
        .select()
        .from(signInThrottles)
        .where(eq(signInThrottles.keyHash, hash))
        .for("update");
      const verdict = judgeTry(row, now, freeTries);
      if ("refusedUntil" in verdict) return verdict.refusedUntil;
      changes.push({ hash, next: verdict.next });
    }
    for (const { hash, next } of changes)
      await tx.update(signInThrottles).set(next).where(eq(signInThrottles.keyHash, hash));
    return null;
  });
}

/** Forgets the tries of some keys, after the right password came. */
export async function forgetTries(database: Database, hashes: readonly string[]): Promise<void> {
  await database.delete(signInThrottles).where(inArray(signInThrottles.keyHash, [...hashes]));
}

/** Removes counts without a try since a moment. */
export async function removeOldThrottles(database: Database, before: Date): Promise<void> {
  await database.delete(signInThrottles).where(lt(signInThrottles.lastAttemptAt, before));
}
