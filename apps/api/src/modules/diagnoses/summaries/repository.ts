import { calls, diagnoses, people, units } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, count, desc, eq, gt, gte, inArray, lt } from "drizzle-orm";
import type { SQL } from "drizzle-orm";

const columns = {
  id: diagnoses.id,
  callId: diagnoses.callId,
  callNumber: calls.number,
  unitId: diagnoses.unitId,
  unitName: units.name,
  technicianId: diagnoses.technicianId,
  technicianName: people.name,
  status: diagnoses.status,
  outcome: diagnoses.outcome,
  lastStage: diagnoses.lastStage,
  openedAt: diagnoses.openedAt,
  lastEventAt: diagnoses.lastEventAt,
  closedAt: diagnoses.closedAt,
  flags: diagnoses.flags,
  waitsForRelease: diagnoses.waitsForRelease,
  serverSeq: diagnoses.serverSeq,
  isDemo: diagnoses.isDemo,
};
export type SummaryRow = Awaited<ReturnType<typeof selectSummaries>>[number];

async function selectSummaries(db: Queryable, where: SQL | undefined, limit: number, offset = 0) {
  return db
    .select(columns)
    .from(diagnoses)
    .innerJoin(calls, eq(calls.id, diagnoses.callId))
    .innerJoin(units, eq(units.id, diagnoses.unitId))
    .innerJoin(people, eq(people.id, diagnoses.technicianId))
    .where(where)
    .orderBy(desc(diagnoses.openedAt), desc(diagnoses.id))
    .limit(limit)
    .offset(offset);
}

/** What lists of diagnoses can be narrowed by; times are moments, `to` is not included. */
export interface SummaryFilter {
  companyId: string;
  status?: "open" | "closed" | undefined;
  outcome?: string | undefined;
  technicianId?: string | undefined;
  unitId?: string | undefined;
  flagged?: "yes" | "no" | undefined;
  from?: Date | undefined;
  to?: Date | undefined;
}

/** One page of diagnoses, newest first, with the count of all. */
export async function listSummaries(db: Queryable, filter: SummaryFilter, page: number, pageSize: number) {
  const { status, outcome, technicianId, unitId, flagged, from, to } = filter;
  const where = and(
    eq(diagnoses.companyId, filter.companyId),
    status && eq(diagnoses.status, status),
    outcome ? eq(diagnoses.outcome, outcome) : undefined,
    technicianId ? eq(diagnoses.technicianId, technicianId) : undefined,
    unitId ? eq(diagnoses.unitId, unitId) : undefined,
    flagged === "yes" ? gt(diagnoses.flags, 0) : undefined,
    flagged === "no" ? eq(diagnoses.flags, 0) : undefined,
    from && gte(diagnoses.openedAt, from),
    to && lt(diagnoses.openedAt, to),
  );
  const [rows, [total]] = await Promise.all([
    selectSummaries(db, where, pageSize, (page - 1) * pageSize),
    db.select({ count: count() }).from(diagnoses).where(where),
  ]);
  return { rows, total: total?.count ?? 0 };
}

export async function findSummary(db: Queryable, companyId: string, diagnosisId: string) {
  const [row] = await selectSummaries(
    db,
    and(eq(diagnoses.companyId, companyId), eq(diagnoses.id, diagnosisId)),
    1,
  );
  return row;
}

/** Diagnoses on some calls, newest first. */
export async function listSummariesOfCalls(db: Queryable, companyId: string, callIds: string[]) {
  if (callIds.length === 0) return [];
  return selectSummaries(
    db,
    and(eq(diagnoses.companyId, companyId), inArray(diagnoses.callId, callIds)),
    500,
  );
}

/** The newest closed diagnosis of each of some units, which says whether the unit stands shut off. */
export async function listLastClosedOfUnits(db: Queryable, companyId: string, unitIds: string[]) {
  if (unitIds.length === 0) return new Map<string, SummaryRow>();
  const rows = await selectSummaries(
    db,
    and(
      eq(diagnoses.companyId, companyId),
      inArray(diagnoses.unitId, unitIds),
      eq(diagnoses.status, "closed"),
    ),
    2000,
  );
  const newest = new Map<string, SummaryRow>();
  for (const row of rows) {
    const known = newest.get(row.unitId);
    if (!known || (row.closedAt ?? row.openedAt) > (known.closedAt ?? known.openedAt))
      newest.set(row.unitId, row);
  }
  return newest;
}
