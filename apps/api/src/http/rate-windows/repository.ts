import { createHash } from "node:crypto";
import { inTransaction, rateWindows } from "@emberladder/db";
import type { Database } from "@emberladder/db";
import { eq, lt, sql } from "drizzle-orm";

/** One window of a rate limit: requests so far, and when it starts again (UTC ms). */
export interface RateWindow {
  hits: number;
  resetsAt: number;
}

/** Counts one request in a window that all API processes share. The key is kept only as a hash. */
export async function countShared(
  database: Database,
  request: { key: string; now: number; seconds: number },
): Promise<RateWindow> {
  const keyHash = createHash("sha256").update(request.key).digest("hex");
  const at = new Date(request.now);
  const resetsAt = new Date(request.now + request.seconds * 1000);
  const [row] = await inTransaction(database, async (tx) => {
    await tx
      .insert(rateWindows)
      .values({ keyHash, hits: 1, resetsAt })
      .onDuplicateKeyUpdate({
        set: {
          hits: sql`if(${rateWindows.resetsAt} <= ${at}, 1, ${rateWindows.hits} + 1)`,
          resetsAt: sql`if(${rateWindows.resetsAt} <= ${at}, ${resetsAt}, ${rateWindows.resetsAt})`,
        },
      });
    return tx
      .select({ hits: rateWindows.hits, resetsAt: rateWindows.resetsAt })
      .from(rateWindows)
      .where(eq(rateWindows.keyHash, keyHash));
  });
  return row
    ? { hits: row.hits, resetsAt: row.resetsAt.getTime() }
    : { hits: 1, resetsAt: resetsAt.getTime() };
}

/** Removes windows that ended before a moment. */
export async function removeOldWindows(database: Database, before: Date): Promise<void> {
  await database.delete(rateWindows).where(lt(rateWindows.resetsAt, before));
}
