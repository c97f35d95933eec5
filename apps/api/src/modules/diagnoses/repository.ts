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

/** The head of a diagnosis: how far its record goes, and the chain hash there. */
export async function findHead(db: Queryable, companyId: string, diagnosisId: string) {
  const [row] = await db
    .select({ serverSeq: diagnoses.serverSeq, chainHash: diagnoses.chainHash })
    .from(diagnoses)
    .where(and(eq(diagnoses.companyId, companyId), eq(diagnoses.id, diagnosisId)));
  return row;
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
