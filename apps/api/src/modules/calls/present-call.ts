import type { Call, CallDetail } from "@emberladder/contract";
import type { Queryable } from "@emberladder/db";
import { presentSite, presentUnit } from "#modules/customers/present-place.ts";
import { presentOpenShutOff, presentSummary } from "#modules/diagnoses/present-diagnosis.ts";
import { listLastClosedOfUnits, listSummariesOfCalls } from "#modules/diagnoses/summaries/repository.ts";
import type { SummaryRow } from "#modules/diagnoses/summaries/repository.ts";
import type { CallRow } from "./repository.ts";

interface Around {
  diagnoses: SummaryRow[];
  lastClosed: Map<string, SummaryRow>;
}

async function readAround(db: Queryable, companyId: string, rows: CallRow[]): Promise<Around> {
  const [diagnoses, lastClosed] = await Promise.all([
    listSummariesOfCalls(
      db,
      companyId,
      rows.map(({ call }) => call.id),
    ),
    listLastClosedOfUnits(db, companyId, [...new Set(rows.map(({ unit }) => unit.id))]),
  ]);
  return { diagnoses, lastClosed };
}

/** Calls as lists show them, with what stands open on each. */
export async function presentCalls(db: Queryable, companyId: string, rows: CallRow[]): Promise<Call[]> {
  const around = await readAround(db, companyId, rows);
  return rows.map((row) => presentCall(row, around));
}

/** One call with its whole unit and its diagnoses. */
export async function presentCallDetail(db: Queryable, companyId: string, row: CallRow): Promise<CallDetail> {
  const around = await readAround(db, companyId, [row]);
  return {
    ...presentCall(row, around),
    unit: presentUnit(row.unit),
    diagnoses: around.diagnoses.map(presentSummary),
  };
}

function presentCall(
  { call, unit, site, customerFirstName, assignedName, companyTimeZone }: CallRow,
  around: Around,
): Call {
  const open = around.diagnoses.find(({ callId, status }) => callId === call.id && status === "open");
  return {
    id: call.id,
    number: call.number,
    status: call.status,
    complaint: call.complaint,
    scheduledFor: call.scheduledFor.toISOString(),
    assignedTo: call.assignedTo === null ? null : { id: call.assignedTo, name: assignedName ?? "" },
    customerFirstName,
    site: presentSite(site),
    timeZone: site.timeZone ?? companyTimeZone,
    unit: { id: unit.id, name: unit.name, codes: unit.profile.codes },
    openShutOff: presentOpenShutOff(around.lastClosed.get(unit.id)),
    openDiagnosisId: open?.id ?? null,
    version: call.version,
  };
}
