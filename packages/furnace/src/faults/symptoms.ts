import { all, ign } from "../variant.ts";
import type { VariantExpr } from "../variant.ts";
import type { CheckId } from "../checks/check-ids.ts";
import type { LastStageClause } from "./fault-types.ts";
import type { FaultId, SymptomId } from "./fault-ids.ts";

/** Something seen that is never accepted as a cause; a diagnosis points on from it. */
export interface Symptom {
  readonly applies: VariantExpr;
  readonly lastStage: readonly LastStageClause[];
  readonly decisive: readonly CheckId[];
  readonly pointsTo: readonly FaultId[];
  readonly provenance: "common-practice";
}

/** The three symptoms and the faults they point to. Common practice; the links are judgement. */
export const SYMPTOMS: Readonly<Record<SymptomId, Symptom>> = {
  "limit-open-blower-failed": {
    applies: all,
    lastStage: [{ stages: ["main-burner"] }],
    decisive: ["ck-blower-voltage"],
    pointsTo: [
      "blower-motor-failed",
      "blower-capacitor",
      "blower-ecm-module",
      "blower-belt-broken",
      "fan-control-failed",
      "board-relay-blower",
      "blower-contactor-failed",
    ],
    provenance: "common-practice",
  },
  "spark-continues-flame-unsensed": {
    applies: ign("IPS"),
    lastStage: [{ stages: ["lightoff"] }],
    decisive: ["ck-flame-current"],
    pointsTo: [
      "pilot-weak",
      "pilot-dirty-off-sensor",
      "flame-sensor-dirty",
      "flame-sensor-cracked",
      "flame-sensor-wire-open",
      "flame-sensor-grounded",
      "flame-sensor-misplaced",
      "poor-ground",
      "reversed-polarity",
      "board-flame-circuit",
    ],
    provenance: "common-practice",
  },
  "delayed-ignition": {
    applies: all,
    lastStage: [{ stages: ["gas"] }],
    decisive: ["ck-timing"],
    pointsTo: [
      "igniter-weak",
      "igniter-misaligned",
      "spark-gap-wrong",
      "low-inlet-pressure",
      "burner-crossover",
      "burners-dirty",
    ],
    provenance: "common-practice",
  },
};
