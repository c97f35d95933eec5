import { draft } from "../variant.ts";
import type { CheckId } from "./check-ids.ts";
import type { FindingEntry } from "./check-types.ts";

/** What may be found at the checks of ignition and flame, with what it points at. Common practice and judgement. */
export const ignitionFindings = {
  "ck-igniter-visual": {
    "no-glow": {
      classes: ["fail"],
      pointsAt: [
        "igniter-broken",
        "igniter-wiring-open",
        "board-relay-igniter",
        "valve-mount-control-failed",
      ],
    },
    cracked: { classes: ["fail"], pointsAt: ["igniter-broken"] },
    dull: { classes: ["marginal"], pointsAt: ["igniter-weak", "low-line-voltage"] },
    misaligned: { classes: ["fail"], pointsAt: ["igniter-misaligned"] },
  },
  "ck-igniter-voltage": {
    "present-no-glow": { classes: ["good"], pointsAt: ["igniter-broken"] },
    "zero-at-board": { classes: ["fail"], pointsAt: ["board-relay-igniter", "valve-mount-control-failed"] },
    "zero-at-plug": {
      classes: ["fail"],
      pointsAt: ["board-relay-igniter", "igniter-wiring-open", "valve-mount-control-failed"],
    },
    "board-yes-plug-no": { classes: ["fail"], pointsAt: ["igniter-wiring-open"] },
    low: { classes: ["marginal", "fail"], pointsAt: ["low-line-voltage"] },
  },
  "ck-igniter-ohms": {
    open: { classes: ["fail"], pointsAt: ["igniter-broken"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["igniter-weak"] },
    low: { classes: ["marginal", "fail"], pointsAt: ["igniter-broken"] },
    leak: { classes: ["fail"], pointsAt: ["igniter-broken"] },
  },
  "ck-igniter-current": {
    zero: { classes: ["fail"], pointsAt: ["igniter-broken", "igniter-wiring-open"] },
    low: { classes: ["marginal", "fail"], pointsAt: ["igniter-weak"] },
    high: { classes: ["marginal", "fail"], pointsAt: [] },
  },
  "ck-spark-visual": {
    none: { classes: ["fail"], pointsAt: ["spark-lead-failed", "module-failed", "board-dead"] },
    "arc-at-ceramic": { classes: ["fail"], pointsAt: ["spark-electrode-cracked"] },
    "arc-at-lead": { classes: ["fail"], pointsAt: ["spark-lead-failed"] },
    weak: { classes: ["marginal"], pointsAt: ["spark-gap-wrong", "poor-ground"] },
  },
  "ck-spark-gap": {
    wide: { classes: ["marginal", "fail"], pointsAt: ["spark-gap-wrong"] },
    narrow: { classes: ["marginal", "fail"], pointsAt: ["spark-gap-wrong"] },
    cracked: { classes: ["fail"], pointsAt: ["spark-electrode-cracked"] },
  },
  "ck-spark-lead-ohms": {
    open: { classes: ["fail"], pointsAt: ["spark-lead-failed"] },
    leak: { classes: ["fail"], pointsAt: ["spark-lead-failed"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["spark-lead-failed"] },
  },
  "ck-module-inputs": {
    zero: { classes: ["fail"], pointsAt: [] },
    low: { classes: ["marginal", "fail"], pointsAt: ["transformer-overloaded", "transformer-wrong-tap"] },
  },
  "ck-pilot-flame": {
    "out-as-found": {
      classes: ["fail"],
      pointsAt: ["pilot-blown-out", "thermocouple-failed", "thermocouple-loose", "gas-off-appliance-valve"],
    },
    "relights-holds": { classes: ["good"], pointsAt: ["pilot-blown-out"] },
    "good-lost-on-release": {
      classes: ["good"],
      pointsAt: [
        "thermocouple-failed",
        "thermocouple-loose",
        "pilot-magnet-failed",
        "tc-circuit-cutout-open",
      ],
    },
    "none-no-gas": {
      classes: ["fail"],
      pointsAt: ["pilot-orifice-plugged", "pilot-tube-kinked", "gas-off-appliance-valve"],
    },
    "none-gas-present": {
      classes: ["fail"],
      pointsAt: ["spark-gap-wrong", "spark-electrode-cracked", "igniter-weak"],
    },
    small: { classes: ["marginal"], pointsAt: ["pilot-weak", "low-inlet-pressure"] },
    yellow: { classes: ["marginal"], pointsAt: ["pilot-orifice-plugged", "pilot-weak"] },
    "misses-hood-dirty": { classes: ["fail"], pointsAt: ["pilot-dirty-off-sensor"] },
    "misses-rod-bent": { classes: ["fail"], pointsAt: ["flame-sensor-misplaced"] },
  },
  "ck-thermocouple-open": {
    low: { classes: ["marginal", "fail"], pointsAt: ["thermocouple-failed"] },
  },
  "ck-thermocouple-closed": {
    "low-open-good": { classes: ["marginal", "fail"], pointsAt: ["thermocouple-loose"] },
    "low-both": { classes: ["marginal", "fail"], pointsAt: ["thermocouple-failed"] },
    "lost-at-cutout": { classes: ["fail"], pointsAt: ["tc-circuit-cutout-open"] },
    "good-wont-hold": { classes: ["good"], pointsAt: ["pilot-magnet-failed"] },
    "recovers-pilot-cleaned": { classes: ["good", "marginal"], pointsAt: ["pilot-dirty-off-sensor"] },
  },
  "ck-pilot-dropout": {
    "never-holds": {
      classes: ["fail"],
      pointsAt: ["pilot-magnet-failed", "thermocouple-failed", "thermocouple-loose"],
    },
    early: { classes: ["marginal"], pointsAt: ["thermocouple-failed", "thermocouple-loose"] },
    slow: { classes: ["marginal", "fail"], pointsAt: ["pilot-magnet-failed"] },
  },
  "ck-pilot-valve-voltage": {
    "present-no-pilot": {
      classes: ["good"],
      pointsAt: [
        "pilot-orifice-plugged",
        "pilot-tube-kinked",
        "gas-valve-coil-open",
        "gas-valve-stuck-closed",
      ],
    },
    zero: { classes: ["fail"], pointsAt: ["module-failed"] },
    "board-yes-valve-no": { classes: ["fail"], pointsAt: ["gas-valve-wiring-open"] },
    low: { classes: ["marginal", "fail"], pointsAt: ["transformer-overloaded", "transformer-wrong-tap"] },
  },
  "ck-main-valve-voltage": {
    "present-no-flow": {
      classes: ["good"],
      pointsAt: ["gas-valve-stuck-closed", "gas-valve-coil-open", "gas-valve-switch-off"],
    },
    "zero-at-board": { classes: ["fail"], pointsAt: ["board-relay-gas"] },
    "board-yes-valve-no": { classes: ["fail"], pointsAt: ["gas-valve-wiring-open"] },
    "zero-at-valve": {
      classes: ["fail"],
      pointsAt: ["board-relay-gas", "gas-valve-wiring-open", "module-failed"],
    },
    "low-chatter": {
      classes: ["marginal", "fail"],
      pointsAt: ["transformer-wrong-tap", "transformer-overloaded", "low-line-voltage"],
    },
    "comes-and-goes": { classes: ["fail"], pointsAt: ["board-solder-crack"] },
  },
  "ck-valve-coil-ohms": {
    open: { classes: ["fail"], pointsAt: ["gas-valve-coil-open"] },
    shorted: { classes: ["marginal", "fail"], pointsAt: ["lv-fuse-blown"] },
  },
  "ck-valve-current": {
    zero: { classes: ["fail"], pointsAt: ["gas-valve-coil-open"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["lv-fuse-blown"] },
  },
  "ck-flame-current": {
    zero: {
      classes: ["fail"],
      pointsAt: [
        "flame-sensor-wire-open",
        "flame-sensor-grounded",
        "burner-crossover",
        "orifice-blocked-insects",
      ],
    },
    low: {
      classes: ["marginal", "fail"],
      pointsAt: [
        "flame-sensor-dirty",
        "flame-sensor-cracked",
        "flame-sensor-misplaced",
        "poor-ground",
        "pilot-dirty-off-sensor",
        "reversed-polarity",
      ],
    },
    "recovers-cleaned": { classes: ["good", "marginal"], pointsAt: ["flame-sensor-dirty"] },
    "recovers-bonded": { classes: ["good", "marginal"], pointsAt: ["poor-ground"] },
    "recovers-polarity": { classes: ["good", "marginal"], pointsAt: ["reversed-polarity"] },
    "recovers-moved": { classes: ["good", "marginal"], pointsAt: ["flame-sensor-misplaced"] },
    "recovers-pilot-cleaned": { classes: ["good", "marginal"], pointsAt: ["pilot-dirty-off-sensor"] },
    "good-not-accepted": { classes: ["good"], pointsAt: ["board-flame-circuit"] },
    "drifts-down": { classes: ["marginal", "fail"], pointsAt: ["flue-recirculation"] },
    "falls-when-others-run": {
      classes: ["marginal", "fail"],
      pointsAt: ["gas-line-undersized", "low-inlet-pressure"],
    },
    "changes-with-blower": { classes: ["marginal", "fail"], pointsAt: ["cracked-heat-exchanger"] },
    unstable: { classes: ["marginal", "fail"], pointsAt: ["poor-ground", "low-inlet-pressure"] },
    "leakage-ac": { classes: ["fail"], pointsAt: ["flame-sensor-cracked"] },
  },
  "ck-sensor-voltage": {
    "zero-at-board": { classes: ["fail"], pointsAt: ["board-flame-circuit"] },
    "board-yes-rod-no": { classes: ["fail"], pointsAt: ["flame-sensor-wire-open"] },
  },
  "ck-sensor-insulation": {
    grounded: { classes: ["fail"], pointsAt: ["flame-sensor-grounded"] },
    leak: { classes: ["marginal", "fail"], pointsAt: ["flame-sensor-cracked"] },
  },
  "ck-burner-ground": {
    high: { classes: ["marginal", "fail"], pointsAt: ["poor-ground"] },
  },
  "ck-flame-appearance": {
    "blue-then-out": {
      classes: ["good"],
      pointsAt: ["flame-sensor-dirty", "flame-sensor-wire-open", "poor-ground", "board-flame-circuit"],
    },
    "yellow-tips": { classes: ["marginal"], pointsAt: [] },
    "lazy-yellow": {
      classes: ["fail"],
      pointsAt: ["rollout-dirty-burners", "burners-dirty", "combustion-air-lacking"],
      also: { when: draft("IDC"), pointsAt: ["inducer-wheel-loose", "vent-blocked"] },
    },
    "huge-yellow": { classes: ["fail"], pointsAt: ["fuel-conversion-missing"] },
    tiny: {
      classes: ["fail"],
      pointsAt: ["fuel-conversion-missing", "low-inlet-pressure", "manifold-low", "lp-regulator-frozen"],
    },
    lifts: { classes: ["fail"], pointsAt: ["burner-misaligned", "flue-recirculation", "orifice-wrong"] },
    "rolls-out": {
      classes: ["fail"],
      pointsAt: ["rollout-blocked-flue", "rollout-dirty-burners", "combustion-air-lacking"],
      also: { when: draft("IDC"), pointsAt: ["inducer-wheel-loose", "vent-blocked"] },
    },
    "blower-change": { classes: ["fail"], pointsAt: ["cracked-heat-exchanger", "rollout-cracked-exchanger"] },
    "some-unlit": { classes: ["fail"], pointsAt: ["orifice-blocked-insects", "burner-crossover"] },
    "misses-rod": { classes: ["fail"], pointsAt: ["flame-sensor-misplaced"] },
  },
  "ck-crossover": {
    slow: {
      classes: ["marginal", "fail"],
      pointsAt: ["burner-crossover", "rollout-low-inlet", "orifice-blocked-insects"],
    },
    never: { classes: ["fail"], pointsAt: ["burner-crossover", "orifice-blocked-insects"] },
  },
  "ck-burner-visual": {
    webs: { classes: ["fail"], pointsAt: ["orifice-blocked-insects"] },
    "lint-rust": { classes: ["fail"], pointsAt: ["burners-dirty", "rollout-dirty-burners"] },
    misaligned: { classes: ["fail"], pointsAt: ["burner-misaligned"] },
    "crossover-slot": { classes: ["fail"], pointsAt: ["burner-crossover"] },
    wet: { classes: ["fail"], pointsAt: ["rtu-flue-water"] },
  },
} as const satisfies Partial<Record<CheckId, Record<string, FindingEntry>>>;
