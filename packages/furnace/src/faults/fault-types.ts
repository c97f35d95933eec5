import type { ClosingCheckId } from "../closing/closing-ids.ts";
import type { TouchRow } from "../closing/touch-rows.ts";
import type { CheckId } from "../checks/check-ids.ts";
import type { Hazard } from "../checks/check-types.ts";
import type { FindingIdOf } from "../checks/findings.ts";
import type { LastStage } from "../codes.ts";
import type { StopRuleId } from "../rules/stop-rule-ids.ts";
import type { VariantExpr } from "../variant.ts";
import type { ComponentId } from "./component-ids.ts";
import type { FaultId } from "./fault-ids.ts";
import type { RepairId } from "./repair-ids.ts";

/** How often a fault is met: very common, common, uncommon, rare. Judgement. */
export const FREQUENCIES = ["VC", "C", "U", "R"] as const;
export type Frequency = (typeof FREQUENCIES)[number];

/**
 * One clause of where a unit with a fault stops. Clauses are read in order: a condition that is false is
 * skipped, a true one ends the reading, an unknown one adds its stages and reading goes on; `else` is true
 * when it is reached. Several stages are all possible, the likeliest first.
 */
export interface LastStageClause {
  readonly when?: VariantExpr | "else";
  readonly stages: readonly LastStage[];
}

/** A check that decides a fault, with those of its findings that point at it. */
export type DecisiveCheck = {
  [C in CheckId]: { readonly check: C; readonly findings?: readonly FindingIdOf<C>[] };
}[CheckId];

export interface FaultEntry {
  readonly component: ComponentId;
  readonly applies: VariantExpr;
  readonly lastStage: readonly LastStageClause[];
  readonly decisive: readonly DecisiveCheck[];
  /** Repairs that cure it, the usual one first. */
  readonly repairs: readonly RepairId[];
  readonly frequency: Frequency;
  readonly hazards?: readonly Hazard[];
  /** Stop rules that belong to it. */
  readonly stopRules?: readonly StopRuleId[];
  /** Closing checks it asks for besides those of the rows touched. */
  readonly closing?: readonly ClosingCheckId[];
  /** The unit is shut off and tagged where it cannot be cured now. */
  readonly shutOff?: boolean;
}

/** A fault of the catalogue with its id. */
export interface Fault extends FaultEntry {
  readonly id: FaultId;
  /** Rows of the closing table that its usual repair touches. Judgement. */
  readonly touches: readonly TouchRow[];
  readonly provenance: "common-practice";
  readonly frequencyProvenance: "judgement";
}
