import { all, ign, draft, ctl } from "../variant.ts";
import type { FaultId } from "./fault-ids.ts";
import type { FaultEntry } from "./fault-types.ts";

/** Faults of flame proving and the heat exchanger. Common practice; frequencies are judgement for US calls in the heating season. */
export const flameFaults = {
  "flame-sensor-dirty": {
    component: "flame-sensor",
    applies: ign.not("SP"),
    lastStage: [{ stages: ["lightoff"] }],
    decisive: [{ check: "ck-flame-current", findings: ["low", "recovers-cleaned"] }],
    repairs: ["clean-flame-sensor", "replace-flame-sensor"],
    frequency: "VC",
    hazards: ["HOT"],
  },
  "flame-sensor-cracked": {
    component: "flame-sensor",
    applies: ign.not("SP"),
    lastStage: [{ stages: ["lightoff"] }],
    decisive: [
      { check: "ck-sensor-insulation", findings: ["leak"] },
      { check: "ck-flame-current", findings: ["low", "leakage-ac"] },
    ],
    repairs: ["replace-flame-sensor"],
    frequency: "U",
  },
  "flame-sensor-wire-open": {
    component: "flame-sensor-wire",
    applies: ign.not("SP"),
    lastStage: [{ stages: ["lightoff"] }],
    decisive: [
      { check: "ck-flame-current", findings: ["zero"] },
      { check: "ck-sensor-voltage", findings: ["board-yes-rod-no"] },
    ],
    repairs: ["repair-flame-sensor-wire"],
    frequency: "C",
  },
  "flame-sensor-grounded": {
    component: "flame-sensor",
    applies: ign.not("SP"),
    lastStage: [{ stages: ["lightoff"] }],
    decisive: [
      { check: "ck-sensor-insulation", findings: ["grounded"] },
      { check: "ck-flame-current", findings: ["zero"] },
    ],
    repairs: ["reposition-flame-sensor", "replace-flame-sensor"],
    frequency: "U",
  },
  "flame-sensor-misplaced": {
    component: "flame-sensor",
    applies: ign.not("SP"),
    lastStage: [{ stages: ["lightoff"] }],
    decisive: [
      { check: "ck-flame-current", findings: ["low", "recovers-moved"] },
      { check: "ck-pilot-flame", findings: ["misses-rod-bent"] },
      { check: "ck-flame-appearance", findings: ["misses-rod"] },
    ],
    repairs: ["reposition-flame-sensor"],
    frequency: "C",
  },
  "board-flame-circuit": {
    component: "board",
    applies: ctl("IFC", "MOD-S", "VMC"),
    lastStage: [{ stages: ["lightoff"] }],
    decisive: [
      { check: "ck-flame-current", findings: ["good-not-accepted"] },
      { check: "ck-sensor-voltage", findings: ["zero-at-board"] },
    ],
    repairs: ["replace-board", "replace-ignition-module", "replace-gas-control"],
    frequency: "U",
  },
  "flue-recirculation": {
    component: "termination",
    applies: draft("CON"),
    lastStage: [{ stages: ["blower-on"] }],
    decisive: [
      { check: "ck-flue-analysis", findings: ["recirculation"] },
      { check: "ck-vent-inspect", findings: ["recirculation"] },
      { check: "ck-intake-inspect", findings: ["recirculation"] },
      { check: "ck-flame-current", findings: ["drifts-down"] },
    ],
    repairs: ["re-terminate-vent"],
    frequency: "U",
    hazards: ["CO"],
  },
  "cracked-heat-exchanger": {
    component: "heat-exchanger",
    applies: all,
    lastStage: [{ stages: ["blower-on"] }],
    decisive: [
      { check: "ck-heat-exchanger", findings: ["crack"] },
      { check: "ck-flue-analysis", findings: ["co-rising", "blower-change"] },
      { check: "ck-flame-appearance", findings: ["blower-change"] },
      { check: "ck-co-ambient", findings: ["rises-firing"] },
    ],
    repairs: ["tag-heat-exchanger", "replace-heat-exchanger"],
    frequency: "U",
    hazards: ["CO"],
    stopRules: ["exchanger"],
    shutOff: true,
  },
} satisfies Partial<Record<FaultId, FaultEntry>>;
