import type { CheckId } from "./check-ids.ts";
import type { FindingEntry } from "./check-types.ts";

/** What may be found at the checks of the safety string and draft, with what it points at. Common practice and judgement. */
export const draftFindings = {
  "ck-safety-hop": {
    "lost-fuse": { classes: ["fail"], pointsAt: ["lv-fuse-blown"] },
    "lost-limit": {
      classes: ["fail"],
      pointsAt: ["limit-failed-open", "limit-open-filter", "limit-open-dampers"],
    },
    "lost-aux": { classes: ["fail"], pointsAt: ["aux-limit-tripped"] },
    "lost-rollout": {
      classes: ["fail"],
      pointsAt: [
        "rollout-blocked-flue",
        "rollout-cracked-exchanger",
        "rollout-dirty-burners",
        "rollout-low-inlet",
        "rollout-failed-open",
      ],
    },
    "lost-link": { classes: ["fail"], pointsAt: ["fusible-link-open"] },
    "lost-spill": { classes: ["fail"], pointsAt: ["spill-tripped"] },
    "lost-damper": { classes: ["fail"], pointsAt: ["vent-damper-stuck"] },
    "lost-float": { classes: ["fail"], pointsAt: ["overflow-switch-open", "condensate-pump-failed"] },
    "lost-smoke": { classes: ["fail"], pointsAt: ["smoke-interlock-open"] },
    "lost-airflow": { classes: ["fail"], pointsAt: ["rtu-airflow-switch-open"] },
    "lost-low-limit": { classes: ["fail"], pointsAt: ["supply-low-limit"] },
    "lost-draft": { classes: ["fail"], pointsAt: [] },
    "lost-wire": { classes: ["fail"], pointsAt: ["melted-wire", "rodent-wire", "board-connector-corroded"] },
    "lost-two": { classes: ["fail"], pointsAt: [] },
  },
  "ck-limit-voltage": {
    "open-hot": {
      classes: ["fail"],
      pointsAt: [
        "limit-open-filter",
        "limit-open-dampers",
        "limit-open-coil-plugged",
        "limit-open-overfire",
        "limit-open-blower-failed",
      ],
    },
    "open-cold": { classes: ["fail"], pointsAt: ["limit-failed-open"] },
    resistive: { classes: ["marginal"], pointsAt: ["limit-failed-open"] },
  },
  "ck-limit-ohms": {
    "open-cold": { classes: ["fail"], pointsAt: ["limit-failed-open"] },
    resistive: { classes: ["marginal", "fail"], pointsAt: ["limit-failed-open"] },
  },
  "ck-rollout": {
    tripped: {
      classes: ["fail"],
      pointsAt: [
        "rollout-blocked-flue",
        "rollout-cracked-exchanger",
        "rollout-dirty-burners",
        "rollout-low-inlet",
      ],
    },
    "open-not-tripped": { classes: ["fail"], pointsAt: ["rollout-failed-open"] },
    "link-open": { classes: ["fail"], pointsAt: ["fusible-link-open"] },
  },
  "ck-aux-limit": {
    tripped: { classes: ["fail"], pointsAt: ["aux-limit-tripped"] },
    "opens-hot": { classes: ["fail"], pointsAt: ["aux-limit-tripped"] },
  },
  "ck-spill-switch": {
    tripped: { classes: ["fail"], pointsAt: ["spill-tripped"] },
    "opens-hot": { classes: ["fail"], pointsAt: ["spill-tripped"] },
  },
  "ck-vent-damper": {
    shut: { classes: ["fail"], pointsAt: ["vent-damper-stuck"] },
    "end-switch-open": { classes: ["fail"], pointsAt: ["vent-damper-stuck"] },
    "no-voltage": { classes: ["fail"], pointsAt: [] },
  },
  "ck-pressure-switch-rest": {
    closed: { classes: ["fail"], pointsAt: ["pressure-switch-stuck-closed"] },
    "closed-tube-on-only": { classes: ["fail"], pointsAt: ["pressure-tube-water"] },
  },
  "ck-pressure-switch-voltage": {
    "open-suction-ok": { classes: ["fail"], pointsAt: ["pressure-switch-failed-open"] },
    "open-suction-low": { classes: ["fail"], pointsAt: [] },
    "hi-open-suction-ok": { classes: ["fail"], pointsAt: ["high-stage-switch-open"] },
    "opens-in-run": {
      classes: ["fail"],
      pointsAt: ["trap-plugged", "drain-frozen", "vent-wind", "intake-blocked", "flue-recirculation"],
    },
    resistive: { classes: ["marginal"], pointsAt: ["pressure-switch-failed-open"] },
  },
  "ck-pressure-suction": {
    "low-everywhere": {
      classes: ["marginal", "fail"],
      pointsAt: [
        "inducer-wheel-loose",
        "inducer-capacitor",
        "vent-blocked",
        "vent-nest",
        "vent-ice-snow",
        "collector-gasket-leak",
        "trap-plugged",
        "drain-frozen",
      ],
    },
    "low-cold-header": { classes: ["marginal", "fail"], pointsAt: ["secondary-hx-plugged", "trap-plugged"] },
    "lost-in-tube": { classes: ["fail"], pointsAt: ["pressure-tube-cracked", "pressure-tube-water"] },
    "zero-at-port": { classes: ["fail"], pointsAt: ["pressure-port-plugged"] },
    "falls-in-run": { classes: ["marginal", "fail"], pointsAt: ["trap-plugged", "drain-frozen"] },
    swings: { classes: ["marginal", "fail"], pointsAt: ["vent-wind"] },
    flutters: { classes: ["marginal", "fail"], pointsAt: ["trap-dry", "pressure-tube-water"] },
    "makes-vent-open": {
      classes: ["marginal", "fail"],
      pointsAt: ["vent-blocked", "vent-nest", "vent-ice-snow", "vent-too-long"],
    },
    "makes-intake-open": { classes: ["marginal", "fail"], pointsAt: ["intake-blocked"] },
    "sensor-disagrees": { classes: ["good"], pointsAt: ["pressure-sensor-failed"] },
  },
  "ck-pressure-switch-trip": {
    "never-makes": { classes: ["fail"], pointsAt: ["pressure-switch-failed-open"] },
    "off-label": { classes: ["marginal", "fail"], pointsAt: ["pressure-switch-failed-open"] },
    "never-opens": { classes: ["fail"], pointsAt: ["pressure-switch-stuck-closed"] },
  },
  "ck-pressure-tubing": {
    crack: { classes: ["fail"], pointsAt: ["pressure-tube-cracked"] },
    off: { classes: ["fail"], pointsAt: ["pressure-tube-cracked"] },
    plugged: { classes: ["fail"], pointsAt: ["pressure-port-plugged"] },
    water: { classes: ["fail"], pointsAt: ["pressure-tube-water"] },
  },
  "ck-centrifugal-switch": {
    "closed-at-rest": { classes: ["fail"], pointsAt: ["centrifugal-stuck-closed"] },
    "open-at-speed": { classes: ["fail"], pointsAt: ["centrifugal-stuck-open"] },
    resistive: { classes: ["marginal"], pointsAt: ["centrifugal-stuck-open"] },
  },
  "ck-inducer-voltage": {
    "present-no-spin": {
      classes: ["good"],
      pointsAt: ["inducer-motor-failed", "inducer-seized", "inducer-capacitor"],
    },
    "present-spins": { classes: ["good"], pointsAt: [] },
    "zero-at-motor": {
      classes: ["fail"],
      pointsAt: [
        "board-relay-inducer",
        "inducer-relay-failed",
        "pressure-switch-stuck-closed",
        "centrifugal-stuck-closed",
      ],
    },
    "coil-yes-motor-no": { classes: ["fail"], pointsAt: ["inducer-relay-failed"] },
    "zero-at-board": { classes: ["fail"], pointsAt: ["board-relay-inducer"] },
    "board-yes-motor-no": { classes: ["fail"], pointsAt: ["board-connector-corroded", "melted-wire"] },
    low: { classes: ["marginal", "fail"], pointsAt: ["low-line-voltage"] },
  },
  "ck-inducer-current": {
    zero: { classes: ["fail"], pointsAt: ["inducer-motor-failed"] },
    locked: { classes: ["fail"], pointsAt: ["inducer-seized"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["inducer-seized", "inducer-capacitor"] },
    low: { classes: ["marginal"], pointsAt: ["inducer-wheel-loose", "vent-blocked"] },
  },
  "ck-inducer-ohms": {
    open: { classes: ["fail"], pointsAt: ["inducer-motor-failed"] },
    shorted: { classes: ["marginal", "fail"], pointsAt: ["inducer-motor-failed"] },
    "frame-leak": {
      classes: ["marginal", "fail"],
      pointsAt: ["inducer-motor-failed", "no-line-power-breaker"],
    },
    high: { classes: ["marginal", "fail"], pointsAt: ["inducer-motor-failed"] },
  },
  "ck-inducer-capacitor": {
    low: { classes: ["marginal", "fail"], pointsAt: ["inducer-capacitor"] },
    open: { classes: ["fail"], pointsAt: ["inducer-capacitor"] },
  },
  "ck-inducer-wheel": {
    loose: { classes: ["fail"], pointsAt: ["inducer-wheel-loose"] },
    eaten: { classes: ["fail"], pointsAt: ["inducer-wheel-loose"] },
    stiff: { classes: ["fail"], pointsAt: ["inducer-seized"] },
  },
  "ck-vent-inspect": {
    blocked: { classes: ["fail"], pointsAt: ["vent-blocked", "rollout-blocked-flue", "spill-tripped"] },
    nest: { classes: ["fail"], pointsAt: ["vent-nest", "vent-blocked", "spill-tripped"] },
    "ice-snow": { classes: ["fail"], pointsAt: ["vent-ice-snow"] },
    "sag-water": { classes: ["fail"], pointsAt: ["vent-too-long"] },
    "size-length": { classes: ["fail"], pointsAt: ["vent-too-long"] },
    "termination-wind": { classes: ["fail"], pointsAt: ["vent-wind"] },
    recirculation: { classes: ["fail"], pointsAt: ["flue-recirculation"] },
    disconnected: { classes: ["fail"], pointsAt: ["vent-disconnected", "spill-tripped"] },
  },
  "ck-intake-inspect": {
    blocked: { classes: ["fail"], pointsAt: ["intake-blocked"] },
    "ice-snow": { classes: ["fail"], pointsAt: ["vent-ice-snow"] },
    recirculation: { classes: ["fail"], pointsAt: ["flue-recirculation"] },
  },
  "ck-condensate-drain": {
    "backs-up": { classes: ["fail"], pointsAt: ["trap-plugged"] },
    frozen: { classes: ["fail"], pointsAt: ["drain-frozen"] },
    "pump-off": { classes: ["fail"], pointsAt: ["condensate-pump-failed"] },
    slow: { classes: ["marginal"], pointsAt: ["trap-plugged"] },
  },
  "ck-condensate-trap": {
    dry: { classes: ["fail"], pointsAt: ["trap-dry"] },
    sludge: { classes: ["fail"], pointsAt: ["trap-plugged"] },
  },
  "ck-heat-exchanger": {
    crack: { classes: ["fail"], pointsAt: ["cracked-heat-exchanger", "rollout-cracked-exchanger"] },
    soot: { classes: ["fail"], pointsAt: ["rollout-blocked-flue", "rollout-dirty-burners"] },
    "secondary-plugged": { classes: ["fail"], pointsAt: ["secondary-hx-plugged"] },
    plugged: { classes: ["fail"], pointsAt: ["rollout-blocked-flue"] },
    "rust-scale": { classes: ["marginal"], pointsAt: [] },
  },
  "ck-draft": {
    weak: { classes: ["marginal"], pointsAt: ["vent-blocked"] },
    positive: { classes: ["fail"], pointsAt: ["vent-blocked", "spill-tripped"] },
    "positive-fans-on": { classes: ["fail"], pointsAt: ["spill-tripped"] },
  },
  "ck-spillage": {
    always: { classes: ["fail"], pointsAt: ["vent-blocked", "spill-tripped"] },
    "fans-on": { classes: ["fail"], pointsAt: ["spill-tripped"] },
    "door-shut-only": { classes: ["fail"], pointsAt: ["combustion-air-lacking", "spill-tripped"] },
  },
  "ck-collector-seal": {
    "smoke-drawn-in": { classes: ["fail"], pointsAt: ["collector-gasket-leak"] },
    "seal-torn": { classes: ["fail"], pointsAt: ["collector-gasket-leak"] },
  },
  "ck-combustion-air": {
    "passes-door-open": { classes: ["fail"], pointsAt: ["combustion-air-lacking"] },
    "openings-blocked": { classes: ["fail"], pointsAt: ["combustion-air-lacking"] },
  },
} as const satisfies Partial<Record<CheckId, Record<string, FindingEntry>>>;
