import type { CheckId } from "./check-ids.ts";
import type { FindingEntry } from "./check-types.ts";

/** What may be found at the checks of the call for heat, with what it points at. Common practice and judgement. */
export const callFindings = {
  "ck-tstat-settings": {
    mode: { classes: ["fail"], pointsAt: ["tstat-wrong-setting"] },
    "schedule-hold": { classes: ["fail"], pointsAt: ["tstat-wrong-setting"] },
    "system-type": { classes: ["fail"], pointsAt: ["tstat-wrong-setting"] },
    blank: {
      classes: ["fail"],
      pointsAt: ["tstat-dead-batteries", "common-wire-open", "lv-fuse-blown", "overflow-switch-open"],
    },
    "no-c-wire": { classes: ["fail"], pointsAt: ["tstat-power-steal"] },
  },
  "ck-tstat-batteries": {
    low: { classes: ["marginal", "fail"], pointsAt: ["tstat-dead-batteries"] },
    blank: { classes: ["fail"], pointsAt: ["tstat-dead-batteries"] },
    "low-icon": { classes: ["fail"], pointsAt: ["tstat-dead-batteries"] },
  },
  "ck-tstat-call-w": {
    absent: {
      classes: ["fail"],
      pointsAt: [
        "tstat-wire-open",
        "tstat-failed",
        "tstat-wrong-setting",
        "tstat-dead-batteries",
        "overflow-switch-open",
        "bas-heat-lockout",
        "cooling-mode-stuck",
        "common-wire-open",
        "zone-panel-no-w",
      ],
    },
    "c-lost-at-stat": { classes: ["fail"], pointsAt: ["common-wire-open"] },
    "w-in-panel-not-out": { classes: ["fail"], pointsAt: ["zone-panel-no-w"] },
    "r-at-stat-w-out-dead": { classes: ["fail"], pointsAt: ["tstat-failed"] },
    "no-r-at-stat": {
      classes: ["fail"],
      pointsAt: ["tstat-wire-open", "overflow-switch-open", "lv-fuse-blown"],
    },
    pulsing: { classes: ["fail"], pointsAt: ["tstat-power-steal"] },
    "ends-early": { classes: ["fail"], pointsAt: ["tstat-anticipator-misset"] },
    resistive: { classes: ["marginal"], pointsAt: ["tstat-wire-open"] },
  },
  "ck-tstat-rw-jumper": {
    starts: {
      classes: ["good"],
      pointsAt: [
        "tstat-failed",
        "tstat-wire-open",
        "tstat-dead-batteries",
        "bas-heat-lockout",
        "zone-panel-no-w",
        "common-wire-open",
      ],
    },
    "starts-at-stat-base": { classes: ["good"], pointsAt: ["tstat-failed", "tstat-wrong-setting"] },
    "starts-at-unit-only": { classes: ["good"], pointsAt: ["tstat-wire-open"] },
    "runs-unbroken": { classes: ["good"], pointsAt: ["tstat-anticipator-misset", "tstat-power-steal"] },
    "no-start": { classes: ["fail"], pointsAt: [] },
  },
  "ck-tstat-cable-ohms": {
    open: { classes: ["fail"], pointsAt: ["tstat-wire-open"] },
    "c-open": { classes: ["fail"], pointsAt: ["common-wire-open"] },
    "data-pair": { classes: ["fail"], pointsAt: ["lost-communication"] },
    shorted: { classes: ["fail"], pointsAt: ["tstat-wire-short"] },
    high: { classes: ["marginal", "fail"], pointsAt: ["tstat-wire-open"] },
  },
  "ck-anticipator": {
    mismatch: { classes: ["marginal", "fail"], pointsAt: ["tstat-anticipator-misset"] },
    open: { classes: ["fail"], pointsAt: ["tstat-anticipator-misset"] },
  },
  "ck-bas-enable": {
    disabled: { classes: ["fail"], pointsAt: ["bas-heat-lockout"] },
    "outdoor-lockout": { classes: ["fail"], pointsAt: ["bas-heat-lockout"] },
    "cooling-mode": { classes: ["fail"], pointsAt: ["cooling-mode-stuck"] },
    "low-limit-trip": { classes: ["fail"], pointsAt: ["supply-low-limit"] },
  },
  "ck-smoke-contact": {
    latched: { classes: ["fail"], pointsAt: ["smoke-interlock-open"] },
    "in-alarm": { classes: ["fail"], pointsAt: ["smoke-interlock-open"] },
  },
  "ck-overflow-switch": {
    "open-wet": { classes: ["fail"], pointsAt: ["overflow-switch-open"] },
    "open-reservoir-full": { classes: ["fail"], pointsAt: ["condensate-pump-failed"] },
    "open-dry": { classes: ["fail"], pointsAt: ["overflow-switch-open"] },
  },
  "ck-twin-link": {
    "out-of-phase": { classes: ["fail"], pointsAt: ["twin-link-lost"] },
    "link-open": { classes: ["fail"], pointsAt: ["twin-link-lost"] },
    "partner-dead": { classes: ["fail"], pointsAt: ["twin-partner-locked"] },
  },
} as const satisfies Partial<Record<CheckId, Record<string, FindingEntry>>>;
