import {
  calls,
  companies,
  customers,
  diagnoses,
  people,
  reportLinks,
  reports,
  sites,
  units,
} from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, desc, eq, gt } from "drizzle-orm";

/** Everything beside the record that a report names. */
export async function findReportSubject(db: Queryable, diagnosisId: string) {
  const [row] = await db
    .select({
      diagnosis: diagnoses,
      callNumber: calls.number,
      complaint: calls.complaint,
      unitName: units.name,
      site: sites,
      customerFirstName: customers.firstName,
      customerEmail: customers.email,
      technicianName: people.name,
      company: companies,
    })
    .from(diagnoses)
    .innerJoin(calls, eq(calls.id, diagnoses.callId))
    .innerJoin(units, eq(units.id, diagnoses.unitId))
    .innerJoin(sites, eq(sites.id, units.siteId))
    .innerJoin(customers, eq(customers.id, sites.customerId))
    .innerJoin(people, eq(people.id, diagnoses.technicianId))
    .innerJoin(companies, eq(companies.id, diagnoses.companyId))
    .where(eq(diagnoses.id, diagnosisId));
  return row;
}
export type ReportSubject = NonNullable<Awaited<ReturnType<typeof findReportSubject>>>;

export async function insertReport(db: Queryable, row: typeof reports.$inferInsert): Promise<void> {
  await db.insert(reports).values(row);
}

export async function findNewestReport(db: Queryable, diagnosisId: string) {
  const [row] = await db
    .select()
    .from(reports)
    .where(eq(reports.diagnosisId, diagnosisId))
    .orderBy(desc(reports.madeAt))
    .limit(1);
  return row;
}

export async function findReport(db: Queryable, reportId: string) {
  const [row] = await db.select().from(reports).where(eq(reports.id, reportId));
  return row;
}

export async function insertReportLink(db: Queryable, row: typeof reportLinks.$inferInsert): Promise<void> {
  await db.insert(reportLinks).values(row);
}

/** The report behind a link that still holds. */
export async function findLinkedReport(db: Queryable, tokenHash: string, now: Date) {
  const [row] = await db
    .select({ report: reports, expiresAt: reportLinks.expiresAt })
    .from(reportLinks)
    .innerJoin(reports, eq(reports.id, reportLinks.reportId))
    .where(and(eq(reportLinks.tokenHash, tokenHash), gt(reportLinks.expiresAt, now)));
  return row;
}
