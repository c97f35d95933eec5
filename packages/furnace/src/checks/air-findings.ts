import type { CheckId } from "./check-ids.ts";
import type { FindingEntry } from "./check-types.ts";

/** What may be found at the checks of air, blower, combustion and rooftop units, with what it points at. Common practice and judgement. */
export const airFindings = {
  "ck-filter": {
    loaded: { classes: ["marginal", "fail"], pointsAt: ["limit-open-filter"] },
    "wrong-type": { classes: ["marginal", "fail"], pointsAt: ["limit-open-filter"] },
    missing: { classes: ["marginal"], pointsAt: ["limit-open-coil-plugged", "blower-wheel-dirty"] },
  },
  "ck-tesp": {
    "registers-shut": { classes: ["marginal", "fail"], pointsAt: ["limit-open-dampers"] },
    "supply-side": {
      classes: ["marginal", "fail"],
      pointsAt: ["limit-open-dampers", "limit-open-coil-plugged"],
    },
    "return-side": { classes: ["marginal", "fail"], pointsAt: ["limit-open-filter"] },
  },
  "ck-temp-rise": {
    high: {
      classes: ["marginal", "fail"],
      pointsAt: [
        "limit-open-filter",
        "limit-open-dampers",
        "limit-open-coil-plugged",
        "limit-open-overfire",
        "blower-wheel-dirty",
        "blower-reversed",
      ],
    },
    low: { classes: ["marginal", "fail"], pointsAt: ["economizer-stuck-open", "manifold-low"] },
  },
  "ck-blower-voltage": {
    "present-no-spin": {
      classes: ["good"],
      pointsAt: ["blower-motor-failed", "blower-capacitor", "limit-open-blower-failed"],
    },
    "line-and-command-no-spin": { classes: ["good"], pointsAt: ["blower-ecm-module"] },
    "present-spins": { classes: ["good"], pointsAt: [] },
    "zero-at-board": { classes: ["fail"], pointsAt: ["board-relay-blower"] },
    "zero-at-motor": {
      classes: ["fail"],
      pointsAt: [
        "fan-control-failed",
        "board-relay-blower",
        "blower-contactor-failed",
        "limit-open-blower-failed",
      ],
    },
    "coil-yes-motor-no": { classes: ["fail"], pointsAt: ["blower-contactor-failed"] },
    "no-command": { classes: ["fail"], pointsAt: ["board-relay-blower"] },
    low: { classes: ["marginal", "fail"], pointsAt: ["low-line-voltage"] },
  },
  "ck-blower-current": {
    zero: { classes: ["fail"], pointsAt: ["blower-motor-failed"] },
    locked: { classes: ["fail"], pointsAt: ["blower-motor-failed"] },
    low: { classes: ["marginal"], pointsAt: ["blower-belt-broken", "blower-wheel-dirty"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["blower-motor-failed", "blower-capacitor"] },
    "runs-on-manual": { classes: ["good"], pointsAt: ["fan-control-failed"] },
  },
  "ck-blower-capacitor": {
    low: { classes: ["marginal", "fail"], pointsAt: ["blower-capacitor"] },
    open: { classes: ["fail"], pointsAt: ["blower-capacitor"] },
  },
  "ck-blower-wheel": {
    dirty: { classes: ["fail"], pointsAt: ["blower-wheel-dirty"] },
    loose: { classes: ["fail"], pointsAt: ["blower-wheel-dirty"] },
    reversed: { classes: ["fail"], pointsAt: ["blower-reversed"] },
    belt: { classes: ["fail"], pointsAt: ["blower-belt-broken"] },
    stiff: { classes: ["fail"], pointsAt: ["blower-motor-failed"] },
  },
  "ck-blower-timing": {
    "never-on": {
      classes: ["fail"],
      pointsAt: ["fan-control-failed", "board-relay-blower", "blower-motor-failed"],
    },
    "late-on": { classes: ["marginal", "fail"], pointsAt: ["fan-control-failed"] },
    "early-on": { classes: ["marginal"], pointsAt: [] },
    "off-out-of-range": { classes: ["marginal"], pointsAt: [] },
  },
  "ck-flue-analysis": {
    "co-high": {
      classes: ["marginal", "fail"],
      pointsAt: ["burners-dirty", "rollout-dirty-burners", "rollout-blocked-flue", "fuel-conversion-missing"],
    },
    "co-rising": { classes: ["fail"], pointsAt: ["rollout-blocked-flue", "cracked-heat-exchanger"] },
    "low-o2": {
      classes: ["marginal", "fail"],
      pointsAt: ["limit-open-overfire", "manifold-high", "altitude-not-derated", "orifice-wrong"],
    },
    "high-o2": { classes: ["marginal", "fail"], pointsAt: ["manifold-low", "burner-misaligned"] },
    recirculation: { classes: ["fail"], pointsAt: ["flue-recirculation"] },
    "blower-change": {
      classes: ["marginal", "fail"],
      pointsAt: ["cracked-heat-exchanger", "rollout-cracked-exchanger"],
    },
  },
  "ck-economizer-position": {
    open: { classes: ["fail"], pointsAt: ["economizer-stuck-open"] },
    linkage: { classes: ["fail"], pointsAt: ["economizer-stuck-open"] },
  },
  "ck-board-relay-output": {
    inducer: { classes: ["fail"], pointsAt: ["board-relay-inducer"] },
    igniter: { classes: ["fail"], pointsAt: ["board-relay-igniter"] },
    gas: { classes: ["fail"], pointsAt: ["board-relay-gas"] },
    blower: { classes: ["fail"], pointsAt: ["board-relay-blower"] },
    "none-at-all": { classes: ["fail"], pointsAt: ["board-dead"] },
    "changes-with-flex": { classes: ["fail"], pointsAt: ["board-solder-crack"] },
  },
  "ck-coil-drop": {
    dirty: { classes: ["marginal", "fail"], pointsAt: ["limit-open-coil-plugged"] },
    iced: { classes: ["fail"], pointsAt: ["limit-open-coil-plugged"] },
  },
} as const satisfies Partial<Record<CheckId, Record<string, FindingEntry>>>;
