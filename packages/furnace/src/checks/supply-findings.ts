import type { CheckId } from "./check-ids.ts";
import type { FindingEntry } from "./check-types.ts";

/** What may be found at the checks of arrival and electrical supply, with what it points at. Common practice and judgement. */
export const supplyFindings = {
  "ck-odor": {},
  "ck-gas-detector": {
    joint: { classes: ["marginal", "fail"], pointsAt: ["pilot-tube-kinked"] },
    room: { classes: ["marginal", "fail"], pointsAt: [], stopRules: ["gas-odor"] },
    "burner-box-after-tries": { classes: ["marginal", "fail"], pointsAt: [], stopRules: ["raw-gas"] },
    "low-accumulates": { classes: ["marginal", "fail"], pointsAt: [], stopRules: ["lp-low"] },
  },
  "ck-co-ambient": {
    "rises-firing": {
      classes: ["marginal", "fail"],
      pointsAt: ["cracked-heat-exchanger", "spill-tripped", "vent-disconnected"],
    },
    "present-before": { classes: ["marginal", "fail"], pointsAt: [] },
  },
  "ck-visual-wiring": {
    melted: { classes: ["fail"], pointsAt: ["melted-wire"] },
    scorched: {
      classes: ["fail"],
      pointsAt: ["melted-wire", "rollout-blocked-flue", "rollout-cracked-exchanger", "rollout-dirty-burners"],
      stopRules: ["soot"],
    },
    chewed: { classes: ["fail"], pointsAt: ["rodent-wire"] },
    "stapled-cut": { classes: ["fail"], pointsAt: ["tstat-wire-short", "tstat-wire-open"] },
    corroded: { classes: ["fail"], pointsAt: ["board-connector-corroded"] },
    "wet-board": { classes: ["fail"], pointsAt: ["board-water"] },
    "wet-burner-box": { classes: ["fail"], pointsAt: ["rtu-flue-water"] },
    "plug-missing": { classes: ["fail"], pointsAt: ["setup-plug-missing"] },
    rubbed: { classes: ["marginal"], pointsAt: [] },
  },
  "ck-line-voltage": {
    "zero-line": { classes: ["fail"], pointsAt: ["no-line-power-breaker", "disconnect-off"] },
    "zero-load": { classes: ["fail"], pointsAt: ["service-switch-off"] },
    "zero-past-gfci": { classes: ["fail"], pointsAt: ["gfci-tripped"] },
    "zero-past-door": { classes: ["fail"], pointsAt: ["door-switch-open", "door-switch-failed"] },
    "low-loaded": { classes: ["marginal", "fail"], pointsAt: ["low-line-voltage"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["transformer-wrong-tap"] },
  },
  "ck-line-short": {
    "to-ground": { classes: ["fail"], pointsAt: ["no-line-power-breaker"] },
    damp: { classes: ["marginal"], pointsAt: [] },
  },
  "ck-polarity-ground": {
    reversed: { classes: ["fail"], pointsAt: ["reversed-polarity"] },
    "open-ground": { classes: ["fail"], pointsAt: ["poor-ground"] },
    "loose-neutral": { classes: ["marginal", "fail"], pointsAt: ["low-line-voltage"] },
  },
  "ck-neutral-ground": {
    "loose-neutral": { classes: ["marginal", "fail"], pointsAt: ["low-line-voltage"] },
  },
  "ck-door-switch": {
    "closes-by-hand": { classes: ["good"], pointsAt: ["door-switch-open"] },
    "open-panel-on": { classes: ["fail"], pointsAt: ["door-switch-failed"] },
    resistive: { classes: ["marginal"], pointsAt: ["door-switch-failed"] },
  },
  "ck-disconnect-fuses": {
    "handle-out": { classes: ["fail"], pointsAt: ["disconnect-off"] },
    "one-fuse": { classes: ["fail"], pointsAt: ["disconnect-off", "phase-loss"] },
    "all-fuses": { classes: ["fail"], pointsAt: ["disconnect-off"] },
    "no-supply": { classes: ["fail"], pointsAt: ["no-line-power-breaker", "phase-loss"] },
  },
  "ck-phase-voltages": {
    "leg-lost": { classes: ["fail"], pointsAt: ["phase-loss"] },
    imbalance: { classes: ["marginal", "fail"], pointsAt: ["phase-loss"] },
    "all-low": { classes: ["fail"], pointsAt: ["low-line-voltage"] },
  },
  "ck-transformer-primary": {
    zero: { classes: ["fail"], pointsAt: ["disconnect-off", "service-switch-off", "door-switch-open"] },
    "off-tap": { classes: ["marginal", "fail"], pointsAt: ["transformer-wrong-tap", "low-line-voltage"] },
  },
  "ck-transformer-secondary": {
    zero: { classes: ["fail"], pointsAt: ["transformer-failed"] },
    "zero-button-out": { classes: ["fail"], pointsAt: ["transformer-reset-tripped"] },
    "low-idle": { classes: ["marginal", "fail"], pointsAt: ["transformer-wrong-tap", "low-line-voltage"] },
    sags: { classes: ["marginal", "fail"], pointsAt: ["transformer-overloaded"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["transformer-wrong-tap"] },
  },
  "ck-transformer-tap": {
    under: { classes: ["marginal", "fail"], pointsAt: ["transformer-wrong-tap"] },
    over: { classes: ["marginal", "fail"], pointsAt: ["transformer-wrong-tap"] },
  },
  "ck-lv-fuse": {
    blown: { classes: ["fail"], pointsAt: ["lv-fuse-blown"] },
    "sound-board-dead": { classes: ["good"], pointsAt: ["board-dead"] },
  },
  "ck-lv-short-isolate": {
    "field-cable": { classes: ["fail"], pointsAt: ["tstat-wire-short"] },
    harness: { classes: ["fail"], pointsAt: ["melted-wire", "rodent-wire"] },
    component: { classes: ["fail"], pointsAt: ["lv-fuse-blown"] },
    board: { classes: ["fail"], pointsAt: ["board-dead"] },
    "low-branch": { classes: ["marginal"], pointsAt: [] },
  },
  "ck-lv-current": {
    over: { classes: ["marginal", "fail"], pointsAt: ["transformer-overloaded"] },
  },
  "ck-board-status": {
    normal: { classes: ["good"], pointsAt: [] },
    dark: { classes: ["fail"], pointsAt: ["board-dead", "lv-fuse-blown", "transformer-failed"] },
    internal: { classes: ["fail"], pointsAt: ["board-dead", "board-solder-crack"] },
    "ignition-failed": {
      classes: ["marginal"],
      pointsAt: ["ignition-lockout-latched", "gas-off-appliance-valve", "igniter-weak"],
    },
    "flame-not-proved": {
      classes: ["marginal"],
      pointsAt: ["flame-sensor-dirty", "ignition-lockout-latched"],
    },
    "limit-open": { classes: ["marginal"], pointsAt: ["limit-open-filter", "limit-failed-open"] },
    "rollout-open": {
      classes: ["marginal"],
      pointsAt: ["rollout-blocked-flue", "rollout-cracked-exchanger"],
    },
    "draft-open": { classes: ["marginal"], pointsAt: ["vent-blocked", "pressure-switch-failed-open"] },
    "draft-closed-at-rest": {
      classes: ["marginal"],
      pointsAt: ["pressure-switch-stuck-closed", "centrifugal-stuck-closed"],
    },
    "flame-without-call": { classes: ["marginal"], pointsAt: ["gas-valve-leak-by"] },
    polarity: { classes: ["marginal"], pointsAt: ["reversed-polarity"] },
    "communication-lost": { classes: ["marginal"], pointsAt: ["lost-communication"] },
    "setup-plug": { classes: ["marginal"], pointsAt: ["setup-plug-missing"] },
    "sensor-range": { classes: ["marginal"], pointsAt: ["pressure-sensor-failed"] },
  },
  "ck-lockout-reset": {
    runs: { classes: ["good"], pointsAt: ["ignition-lockout-latched"] },
    "runs-then-fails": { classes: ["marginal"], pointsAt: [] },
    "no-change": {
      classes: ["fail"],
      pointsAt: ["module-failed", "valve-mount-control-failed", "board-dead"],
    },
  },
  "ck-timing": {
    "stage-never-came": { classes: ["fail"], pointsAt: [] },
    "flame-lost-at-trial-end": {
      classes: ["fail"],
      pointsAt: ["flame-sensor-dirty", "flame-sensor-wire-open", "poor-ground", "board-flame-circuit"],
    },
    "late-light": {
      classes: ["fail"],
      pointsAt: ["delayed-ignition", "igniter-weak", "igniter-misaligned", "burners-dirty"],
    },
    "lights-on-later-try": { classes: ["marginal"], pointsAt: ["gas-line-air"] },
    "quits-in-steady": {
      classes: ["fail"],
      pointsAt: ["trap-plugged", "limit-open-filter", "flue-recirculation", "vent-wind"],
    },
    "outlasts-call": { classes: ["fail"], pointsAt: ["gas-valve-leak-by"] },
    intermittent: { classes: ["fail"], pointsAt: ["board-solder-crack", "board-connector-corroded"] },
    slow: { classes: ["marginal"], pointsAt: [] },
  },
  "ck-wire-wiggle": {
    "board-flex": { classes: ["fail"], pointsAt: ["board-solder-crack"] },
    "board-plug": { classes: ["fail"], pointsAt: ["board-connector-corroded"] },
    "igniter-plug": { classes: ["fail"], pointsAt: ["igniter-wiring-open"] },
    "valve-plug": { classes: ["fail"], pointsAt: ["gas-valve-wiring-open"] },
    "sensor-lead": { classes: ["fail"], pointsAt: ["flame-sensor-wire-open"] },
    harness: { classes: ["fail"], pointsAt: ["melted-wire", "rodent-wire"] },
  },
  "ck-panel-fit": {
    misfit: { classes: ["fail"], pointsAt: ["door-switch-open"] },
    "tab-bent": { classes: ["fail"], pointsAt: ["door-switch-open"] },
    missing: { classes: ["fail"], pointsAt: ["door-switch-open"] },
  },
  "ck-cabinet-earth": {
    live: {
      classes: ["fail"],
      pointsAt: ["reversed-polarity", "poor-ground", "melted-wire"],
      stopRules: ["live-cabinet"],
    },
  },
} as const satisfies Partial<Record<CheckId, Record<string, FindingEntry>>>;
