import type { LastStage, Options, VariantCodes } from "../codes.ts";
import { onLadder } from "../stages.ts";
import { evaluateVariant, mayApply } from "../variant.ts";
import type { VariantContext } from "../variant.ts";
import { airFaults } from "./air-faults.ts";
import { controlFaults } from "./control-faults.ts";
import { draftFaults } from "./draft-faults.ts";
import { FAULT_IDS } from "./fault-ids.ts";
import type { FaultId } from "./fault-ids.ts";
import type { Fault, FaultEntry, LastStageClause } from "./fault-types.ts";
import { flameFaults } from "./flame-faults.ts";
import { gasFaults } from "./gas-faults.ts";
import { ignitionFaults } from "./ignition-faults.ts";
import { limitFaults } from "./limit-faults.ts";
import { powerFaults } from "./power-faults.ts";
import { touchesOfRepairs } from "./repairs.ts";
import type { RepairId } from "./repair-ids.ts";

const entries: Record<FaultId, FaultEntry> = {
  ...powerFaults,
  ...controlFaults,
  ...limitFaults,
  ...draftFaults,
  ...ignitionFaults,
  ...gasFaults,
  ...flameFaults,
  ...airFaults,
};

function usualRepair(entry: FaultEntry): readonly RepairId[] {
  return entry.repairs.slice(0, 1);
}

/** Every fault of the catalogue. */
export const FAULTS: readonly Fault[] = FAULT_IDS.map((id) => ({
  id,
  ...entries[id],
  touches: touchesOfRepairs(usualRepair(entries[id])),
  provenance: "common-practice",
  frequencyProvenance: "judgement",
}));

const byId = new Map<FaultId, Fault>(FAULTS.map((fault) => [fault.id, fault]));

/** The fault with an id. */
export function getFault(id: FaultId): Fault {
  const fault = byId.get(id);
  if (!fault) throw new Error(`There is no fault ${id}.`);
  return fault;
}

/** The faults a unit may have; an option it does not state keeps its faults in. */
export function faultsFor(unit: { codes: VariantCodes; options: Options }): Fault[] {
  return FAULTS.filter((fault) => mayApply(fault.applies, unit.codes, unit.options));
}

/**
 * Where a unit with a fault may stop: the last stages its clauses allow, each put on a rung that the unit has.
 * The order is that of the clauses, the likeliest first.
 */
export function lastStagesOf(fault: FaultId | FaultEntry, context: VariantContext): Set<LastStage> {
  const clauses = (typeof fault === "string" ? getFault(fault) : fault).lastStage;
  const stages = readClauses(clauses, context);
  return new Set(stages.map((stage) => onLadder(stage, context.codes, context.options)));
}

function readClauses(clauses: readonly LastStageClause[], context: VariantContext): LastStage[] {
  const stages: LastStage[] = [];
  for (const clause of clauses) {
    const holds =
      clause.when === undefined || clause.when === "else" ? true : evaluateVariant(clause.when, context);
    if (holds === false) continue;
    stages.push(...clause.stages);
    if (holds === true) break;
  }
  return stages;
}
