import { all, and, or, draft, loc, ctl, opt } from "../variant.ts";
import type { FaultId } from "./fault-ids.ts";
import type { FaultEntry } from "./fault-types.ts";

/** Faults of blower, airflow and rooftop units. Common practice; frequencies are judgement for US calls in the heating season. */
export const airFaults = {
  "blower-motor-failed": {
    component: "blower",
    applies: all,
    lastStage: [{ stages: ["main-burner"] }],
    decisive: [
      { check: "ck-blower-voltage", findings: ["present-no-spin"] },
      { check: "ck-blower-current", findings: ["zero", "locked", "high"] },
    ],
    repairs: ["replace-blower-motor"],
    frequency: "C",
    hazards: ["ROT"],
  },
  "blower-capacitor": {
    component: "blower-capacitor",
    applies: opt("psc-blower"),
    lastStage: [{ stages: ["main-burner"] }],
    decisive: [{ check: "ck-blower-capacitor", findings: ["low", "open"] }],
    repairs: ["replace-blower-capacitor"],
    frequency: "C",
    hazards: ["CAP"],
  },
  "blower-ecm-module": {
    component: "blower",
    applies: opt("ecm-blower"),
    lastStage: [{ stages: ["main-burner"] }],
    decisive: [{ check: "ck-blower-voltage", findings: ["line-and-command-no-spin"] }],
    repairs: ["replace-blower-module", "replace-blower-motor"],
    frequency: "C",
    hazards: ["CAP"],
  },
  "blower-belt-broken": {
    component: "blower-belt",
    applies: opt("belt-blower"),
    lastStage: [{ stages: ["main-burner"] }],
    decisive: [
      { check: "ck-blower-wheel", findings: ["belt"] },
      { check: "ck-blower-current", findings: ["low"] },
    ],
    repairs: ["replace-blower-belt"],
    frequency: "C",
  },
  "blower-wheel-dirty": {
    component: "blower-wheel",
    applies: all,
    lastStage: [{ stages: ["blower-on"] }],
    decisive: [
      { check: "ck-temp-rise", findings: ["high"] },
      { check: "ck-blower-wheel", findings: ["dirty", "loose"] },
    ],
    repairs: ["clean-blower-wheel"],
    frequency: "C",
  },
  "blower-reversed": {
    component: "supply",
    applies: and(loc("RTU"), opt("three-phase")),
    lastStage: [{ stages: ["blower-on"] }],
    decisive: [{ check: "ck-blower-wheel", findings: ["reversed"] }],
    repairs: ["swap-two-legs"],
    frequency: "U",
  },
  "fan-control-failed": {
    component: "fan-control",
    applies: or(draft("ND"), ctl("MOD-S", "VMC")),
    lastStage: [{ stages: ["main-burner"] }],
    decisive: [
      { check: "ck-blower-voltage", findings: ["zero-at-motor"] },
      { check: "ck-blower-current", findings: ["runs-on-manual"] },
    ],
    repairs: ["replace-fan-control"],
    frequency: "C",
  },
  "twin-link-lost": {
    component: "twin-link",
    applies: opt("twinned"),
    lastStage: [{ stages: ["blower-on"] }],
    decisive: [{ check: "ck-twin-link", findings: ["out-of-phase", "link-open"] }],
    repairs: ["repair-twin-link"],
    frequency: "U",
  },
  "twin-partner-locked": {
    component: "twin-partner",
    applies: opt("twinned"),
    lastStage: [{ stages: ["blower-on"] }],
    decisive: [{ check: "ck-twin-link", findings: ["partner-dead"] }],
    repairs: ["clear-partner-lockout"],
    frequency: "U",
  },
  "economizer-stuck-open": {
    component: "economizer",
    applies: and(loc("RTU"), opt("economizer")),
    lastStage: [{ stages: ["blower-on"] }],
    decisive: [
      { check: "ck-economizer-position", findings: ["open", "linkage"] },
      { check: "ck-temp-rise", findings: ["low"] },
    ],
    repairs: ["repair-economizer"],
    frequency: "C",
  },
  "supply-low-limit": {
    component: "low-limit",
    applies: and(loc("RTU"), opt("low-limit")),
    lastStage: [{ stages: ["power"] }],
    decisive: [
      { check: "ck-safety-hop", findings: ["lost-low-limit"] },
      { check: "ck-bas-enable", findings: ["low-limit-trip"] },
    ],
    repairs: ["correct-outdoor-damper"],
    frequency: "U",
  },
  "rtu-flue-water": {
    component: "burner-box",
    applies: loc("RTU"),
    lastStage: [
      { when: draft("IDC"), stages: ["gas", "main-burner"] },
      { when: "else", stages: ["inducer", "gas"] },
    ],
    decisive: [
      { check: "ck-visual-wiring", findings: ["wet-burner-box"] },
      { check: "ck-burner-visual", findings: ["wet"] },
    ],
    repairs: ["dry-and-seal"],
    frequency: "U",
  },
  "cooling-mode-stuck": {
    component: "building-control",
    applies: loc("RTU"),
    lastStage: [{ stages: ["power"] }],
    decisive: [
      { check: "ck-bas-enable", findings: ["cooling-mode"] },
      { check: "ck-tstat-call-w", findings: ["absent"] },
    ],
    repairs: ["set-heating-mode"],
    frequency: "U",
  },
  "rtu-airflow-switch-open": {
    component: "airflow-switch",
    applies: and(loc("RTU"), opt("airflow-switch")),
    lastStage: [{ stages: ["call"] }],
    decisive: [{ check: "ck-safety-hop", findings: ["lost-airflow"] }],
    repairs: ["repair-airflow-switch"],
    frequency: "U",
  },
} satisfies Partial<Record<FaultId, FaultEntry>>;
