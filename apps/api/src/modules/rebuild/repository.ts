import { calls, diagnoses, eventFlags } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, asc, eq, gt, inArray, ne } from "drizzle-orm";
import type { DiagnosisRow } from "#modules/sync/repository.ts";

/** Ids of diagnoses after one of them, at most `limit`. */
export async function listDiagnosisIds(
  db: Queryable,
  after: string | undefined,
  limit: number,
): Promise<string[]> {
  const rows = await db
    .select({ id: diagnoses.id })
    .from(diagnoses)
    .where(after === undefined ? undefined : gt(diagnoses.id, after))
    .orderBy(asc(diagnoses.id))
    .limit(limit);
  return rows.map(({ id }) => id);
}

export async function listFlagRows(db: Queryable, diagnosisId: string) {
  return db.select().from(eventFlags).where(eq(eventFlags.diagnosisId, diagnosisId));
}

export async function deleteFlags(db: Queryable, ids: readonly string[]): Promise<void> {
  if (ids.length > 0) await db.delete(eventFlags).where(inArray(eventFlags.id, [...ids]));
}

export async function updateDiagnosis(
  db: Queryable,
  id: string,
  change: Partial<DiagnosisRow>,
): Promise<void> {
  await db.update(diagnoses).set(change).where(eq(diagnoses.id, id));
}

/** A call as far as diagnoses move it; undefined for one that was cancelled. */
export async function findMovableCall(db: Queryable, callId: string) {
  const [row] = await db
    .select({ status: calls.status, doneAt: calls.doneAt })
    .from(calls)
    .where(and(eq(calls.id, callId), ne(calls.status, "cancelled")));
  return row;
}
