import type { FaultId } from "./fault-ids.ts";
import { getFault } from "./faults.ts";

/** Something seen or read, in the shape in which evidence is judged. */
export interface Evidence {
  check: string;
  finding?: string;
  outcome?: string;
}

/**
 * Whether one piece of evidence decides a fault: a deciding check with a deciding finding, or, where no finding
 * was named, one that failed or was marginal. The one truth of what proves a cause: the record is judged by it
 * and decision trees are held against it.
 */
export function decides(evidence: Evidence, fault: FaultId): boolean {
  return getFault(fault).decisive.some((decisive) => {
    if (decisive.check !== evidence.check || evidence.finding === "no-path") return false;
    const findings: readonly string[] = decisive.findings ?? [];
    if (evidence.finding !== undefined && findings.length > 0) return findings.includes(evidence.finding);
    return evidence.outcome === "fail" || evidence.outcome === "marginal";
  });
}
