import type { CheckId } from "./check-ids.ts";
import type { FindingEntry } from "./check-types.ts";

/** What may be found at the checks of gas pressure and flow, with what it points at. Common practice and judgement. */
export const gasFindings = {
  "ck-gas-shutoff": {
    "appliance-valve": { classes: ["fail"], pointsAt: ["gas-off-appliance-valve"] },
    "branch-off-season": { classes: ["fail"], pointsAt: ["gas-off-after-summer"] },
    meter: { classes: ["fail"], pointsAt: ["gas-off-meter"] },
    "control-switch-off": { classes: ["fail"], pointsAt: ["gas-valve-switch-off"] },
  },
  "ck-lp-tank": {
    empty: { classes: ["fail"], pointsAt: ["lp-tank-empty"] },
    low: { classes: ["marginal", "fail"], pointsAt: ["lp-tank-empty"] },
    overfilled: { classes: ["marginal"], pointsAt: [] },
    "enough-no-pressure": { classes: ["good"], pointsAt: ["lp-excess-flow-closed", "lp-regulator-frozen"] },
  },
  "ck-inlet-pressure-static": {
    zero: {
      classes: ["fail"],
      pointsAt: [
        "gas-off-appliance-valve",
        "gas-off-after-summer",
        "gas-off-meter",
        "gas-service-failed",
        "lp-tank-empty",
        "lp-excess-flow-closed",
        "lp-regulator-frozen",
      ],
    },
    "zero-cocks-open": { classes: ["fail"], pointsAt: ["gas-service-failed", "lp-excess-flow-closed"] },
    "returns-slow-open": { classes: ["good"], pointsAt: ["lp-excess-flow-closed"] },
    low: { classes: ["marginal", "fail"], pointsAt: ["low-inlet-pressure"] },
    sinking: { classes: ["marginal", "fail"], pointsAt: ["lp-tank-empty", "lp-regulator-frozen"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["high-inlet-pressure"] },
    creeping: { classes: ["fail"], pointsAt: ["high-inlet-pressure"] },
  },
  "ck-inlet-pressure-running": {
    low: { classes: ["marginal", "fail"], pointsAt: ["low-inlet-pressure", "rollout-low-inlet"] },
    "drop-others": { classes: ["marginal", "fail"], pointsAt: ["gas-line-undersized"] },
    unstable: { classes: ["fail"], pointsAt: ["lp-regulator-frozen"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["high-inlet-pressure"] },
  },
  "ck-manifold-pressure": {
    zero: {
      classes: ["fail"],
      pointsAt: ["gas-valve-stuck-closed", "gas-valve-switch-off", "gas-valve-coil-open"],
    },
    "low-inlet-ok": { classes: ["marginal", "fail"], pointsAt: ["manifold-low"] },
    "low-inlet-low": {
      classes: ["marginal", "fail"],
      pointsAt: ["low-inlet-pressure", "lp-regulator-frozen", "gas-line-undersized"],
    },
    "stays-low-on-high": { classes: ["fail"], pointsAt: ["high-stage-switch-open"] },
    "holds-no-flame": { classes: ["good"], pointsAt: ["orifice-blocked-insects"] },
    "wrong-for-fuel": { classes: ["fail"], pointsAt: ["fuel-conversion-missing"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["manifold-high"] },
  },
  "ck-manifold-leakby": {
    passes: { classes: ["marginal", "fail"], pointsAt: ["gas-valve-leak-by"] },
    rising: { classes: ["fail"], pointsAt: ["gas-valve-leak-by"] },
  },
  "ck-leak-solution": {
    "pilot-tube": { classes: ["fail"], pointsAt: ["pilot-tube-kinked"] },
    joint: { classes: ["fail"], pointsAt: [] },
  },
  "ck-drop-test": {},
  "ck-meter-dial-leak": {},
  "ck-meter-clock": {
    over: {
      classes: ["marginal", "fail"],
      pointsAt: ["limit-open-overfire", "manifold-high", "orifice-wrong", "altitude-not-derated"],
    },
    under: {
      classes: ["marginal", "fail"],
      pointsAt: ["manifold-low", "orifice-wrong", "orifice-blocked-insects", "low-inlet-pressure"],
    },
  },
  "ck-orifice-size": {
    "wrong-size": { classes: ["fail"], pointsAt: ["orifice-wrong"] },
    "wrong-fuel": { classes: ["fail"], pointsAt: ["fuel-conversion-missing"] },
    "wrong-altitude": { classes: ["fail"], pointsAt: ["altitude-not-derated"] },
    plugged: { classes: ["fail"], pointsAt: ["orifice-blocked-insects"] },
    "pilot-plugged": { classes: ["fail"], pointsAt: ["pilot-orifice-plugged"] },
    "pilot-wrong": { classes: ["fail"], pointsAt: ["pilot-weak"] },
    "pilot-clear": {
      classes: ["good"],
      pointsAt: ["pilot-tube-kinked"],
      rulesOut: ["pilot-orifice-plugged"],
    },
  },
  "ck-regulator-vent": {
    iced: { classes: ["fail"], pointsAt: ["lp-regulator-frozen"] },
    blocked: { classes: ["fail"], pointsAt: ["lp-regulator-frozen", "high-inlet-pressure"] },
    "no-outlet": { classes: ["fail"], pointsAt: ["gas-service-failed", "lp-regulator-frozen"] },
    escaping: { classes: ["fail"], pointsAt: [], stopRules: ["gas-odor"] },
  },
  "ck-other-appliances": {
    burn: { classes: ["good"], pointsAt: ["gas-off-appliance-valve", "gas-off-after-summer"] },
    dead: {
      classes: ["fail"],
      pointsAt: ["gas-off-meter", "lp-tank-empty", "gas-service-failed", "lp-excess-flow-closed"],
    },
    weak: { classes: ["marginal"], pointsAt: ["low-inlet-pressure", "lp-regulator-frozen"] },
  },
} as const satisfies Partial<Record<CheckId, Record<string, FindingEntry>>>;
