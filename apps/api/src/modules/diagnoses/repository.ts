import { diagnoses, eventFlags } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, asc, eq } from "drizzle-orm";

export async function listFlagsOf(db: Queryable, companyId: string, diagnosisId: string) {
  return db
    .select({ eventId: eventFlags.eventId, rule: eventFlags.rule, params: eventFlags.params })
    .from(eventFlags)
    .where(and(eq(eventFlags.companyId, companyId), eq(eventFlags.diagnosisId, diagnosisId)))
    .orderBy(asc(eventFlags.id));
}

/** Ends the waiting of a flagged closing; false when it does not wait. */
export async function endWaiting(db: Queryable, companyId: string, diagnosisId: string): Promise<boolean> {
  const [result] = await db
    .update(diagnoses)
    .set({ waitsForRelease: false })
    .where(
      and(
        eq(diagnoses.companyId, companyId),
        eq(diagnoses.id, diagnosisId),
        eq(diagnoses.waitsForRelease, true),
      ),
    );
  return result.affectedRows === 1;
}
