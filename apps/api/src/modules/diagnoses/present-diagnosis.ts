import type { DiagnosisSummary } from "@emberladder/contract";
import type { SummaryRow } from "./summaries/repository.ts";

/** A diagnosis as lists show it. */
export function presentSummary(row: SummaryRow): DiagnosisSummary {
  const { technicianId, technicianName, ...rest } = row;
  return {
    ...rest,
    technician: { id: technicianId, name: technicianName },
    openedAt: row.openedAt.toISOString(),
    lastEventAt: row.lastEventAt.toISOString(),
    closedAt: row.closedAt?.toISOString() ?? null,
  };
}

/**
 * The record that a unit stands shut off, where its last closed diagnosis left it so. Any later closing lifts
 * it, whatever its outcome.
 */
export function presentOpenShutOff(lastClosed: SummaryRow | undefined) {
  if (!lastClosed || lastClosed.outcome !== "shut-off" || lastClosed.closedAt === null) return null;
  return {
    diagnosisId: lastClosed.id,
    closedAt: lastClosed.closedAt.toISOString(),
    technicianName: lastClosed.technicianName,
  };
}
