import { and, ign, opt } from "../variant.ts";
import type { FaultId } from "./fault-ids.ts";
import type { FaultEntry } from "./fault-types.ts";

/** Faults of the ignition source and the pilot. Common practice; frequencies are judgement for US calls in the heating season. */
export const ignitionFaults = {
  "igniter-broken": {
    component: "igniter",
    applies: ign("HSI", "IPH"),
    lastStage: [{ stages: ["prepurge"] }],
    decisive: [
      { check: "ck-igniter-visual", findings: ["no-glow", "cracked"] },
      { check: "ck-igniter-ohms", findings: ["open", "low", "leak"] },
      { check: "ck-igniter-voltage", findings: ["present-no-glow"] },
    ],
    repairs: ["replace-igniter"],
    frequency: "VC",
    hazards: ["HOT"],
  },
  "igniter-weak": {
    component: "igniter",
    applies: ign("HSI", "IPH"),
    lastStage: [{ stages: ["gas"] }],
    decisive: [
      { check: "ck-igniter-current", findings: ["low"] },
      { check: "ck-igniter-ohms", findings: ["high"] },
      { check: "ck-igniter-visual", findings: ["dull"] },
    ],
    repairs: ["replace-igniter"],
    frequency: "C",
    hazards: ["GAS"],
  },
  "igniter-wiring-open": {
    component: "igniter-harness",
    applies: ign("HSI", "IPH"),
    lastStage: [{ stages: ["prepurge"] }],
    decisive: [
      { check: "ck-igniter-voltage", findings: ["zero-at-plug", "board-yes-plug-no"] },
      { check: "ck-wire-wiggle", findings: ["igniter-plug"] },
    ],
    repairs: ["repair-igniter-harness"],
    frequency: "U",
  },
  "igniter-misaligned": {
    component: "igniter",
    applies: ign("HSI", "IPH"),
    lastStage: [{ stages: ["gas"] }],
    decisive: [{ check: "ck-igniter-visual", findings: ["misaligned"] }],
    repairs: ["refit-igniter"],
    frequency: "U",
  },
  "spark-gap-wrong": {
    component: "spark-electrode",
    applies: ign("IPS", "DSI"),
    lastStage: [{ stages: ["gas"] }],
    decisive: [{ check: "ck-spark-gap", findings: ["wide", "narrow"] }],
    repairs: ["set-spark-gap", "replace-spark-electrode"],
    frequency: "C",
    hazards: ["HV-SPK"],
  },
  "spark-electrode-cracked": {
    component: "spark-electrode",
    applies: ign("IPS", "DSI"),
    lastStage: [{ stages: ["prepurge"] }],
    decisive: [{ check: "ck-spark-visual", findings: ["arc-at-ceramic"] }],
    repairs: ["replace-spark-electrode"],
    frequency: "C",
    hazards: ["HV-SPK"],
  },
  "spark-lead-failed": {
    component: "spark-lead",
    applies: ign("IPS", "DSI"),
    lastStage: [{ stages: ["prepurge"] }],
    decisive: [{ check: "ck-spark-lead-ohms", findings: ["open", "leak", "high"] }],
    repairs: ["replace-spark-lead"],
    frequency: "U",
    hazards: ["HV-SPK"],
  },
  "pilot-orifice-plugged": {
    component: "pilot",
    applies: ign("SP", "IPS", "IPH"),
    lastStage: [
      { when: ign("SP"), stages: ["safeties"] },
      { when: "else", stages: ["ignition-source"] },
    ],
    decisive: [
      { check: "ck-pilot-flame", findings: ["none-no-gas", "yellow"] },
      { check: "ck-orifice-size", findings: ["pilot-plugged", "pilot-clear"] },
    ],
    repairs: ["clean-pilot-orifice", "replace-pilot-orifice"],
    frequency: "C",
  },
  "pilot-tube-kinked": {
    component: "pilot-tube",
    applies: ign("SP", "IPS", "IPH"),
    lastStage: [
      { when: ign("SP"), stages: ["safeties"] },
      { when: "else", stages: ["ignition-source"] },
    ],
    decisive: [
      { check: "ck-pilot-flame", findings: ["none-no-gas"] },
      { check: "ck-orifice-size", findings: ["pilot-clear"] },
      { check: "ck-leak-solution", findings: ["pilot-tube"] },
    ],
    repairs: ["replace-pilot-tube"],
    frequency: "U",
    hazards: ["GAS"],
  },
  "pilot-weak": {
    component: "pilot",
    applies: ign("SP", "IPS", "IPH"),
    lastStage: [
      { when: ign("SP"), stages: ["safeties"] },
      { when: "else", stages: ["lightoff"] },
    ],
    decisive: [
      { check: "ck-pilot-flame", findings: ["small", "yellow"] },
      { check: "ck-orifice-size", findings: ["pilot-wrong"] },
      { check: "ck-inlet-pressure-running" },
    ],
    repairs: ["adjust-pilot", "clean-pilot-orifice"],
    frequency: "C",
  },
  "pilot-dirty-off-sensor": {
    component: "pilot",
    applies: ign("SP", "IPS", "IPH"),
    lastStage: [
      { when: ign("SP"), stages: ["safeties"] },
      { when: "else", stages: ["lightoff"] },
    ],
    decisive: [
      { check: "ck-pilot-flame", findings: ["misses-hood-dirty"] },
      { check: "ck-flame-current", findings: ["low", "recovers-pilot-cleaned"] },
      { check: "ck-thermocouple-closed", findings: ["recovers-pilot-cleaned"] },
    ],
    repairs: ["clean-pilot-hood"],
    frequency: "C",
  },
  "pilot-blown-out": {
    component: "pilot",
    applies: ign("SP"),
    lastStage: [{ stages: ["safeties"] }],
    decisive: [
      { check: "ck-pilot-flame", findings: ["out-as-found", "relights-holds"] },
      { check: "ck-thermocouple-closed" },
    ],
    repairs: ["relight-pilot"],
    frequency: "C",
  },
  "thermocouple-failed": {
    component: "thermocouple",
    applies: ign("SP"),
    lastStage: [{ stages: ["safeties"] }],
    decisive: [{ check: "ck-thermocouple-open", findings: ["low"] }],
    repairs: ["replace-thermocouple"],
    frequency: "VC",
  },
  "thermocouple-loose": {
    component: "thermocouple",
    applies: ign("SP"),
    lastStage: [{ stages: ["safeties"] }],
    decisive: [
      { check: "ck-thermocouple-closed", findings: ["low-open-good"] },
      { check: "ck-thermocouple-open" },
    ],
    repairs: ["tighten-thermocouple"],
    frequency: "C",
  },
  "tc-circuit-cutout-open": {
    component: "thermocouple-cutout",
    applies: and(ign("SP"), opt("tc-cutout")),
    lastStage: [{ stages: ["safeties"] }],
    decisive: [{ check: "ck-thermocouple-closed", findings: ["lost-at-cutout"] }],
    repairs: ["replace-thermocouple-cutout"],
    frequency: "U",
    stopRules: ["spill", "rollout"],
  },
  "pilot-magnet-failed": {
    component: "gas-valve",
    applies: ign("SP"),
    lastStage: [{ stages: ["safeties"] }],
    decisive: [
      { check: "ck-thermocouple-closed", findings: ["good-wont-hold"] },
      { check: "ck-pilot-dropout", findings: ["never-holds", "slow"] },
    ],
    repairs: ["replace-gas-valve"],
    frequency: "U",
  },
} satisfies Partial<Record<FaultId, FaultEntry>>;
