import type { CheckId } from "../checks/check-ids.ts";
import { CHECK_FINDINGS } from "../checks/findings.ts";
import type { FindingIdOf } from "../checks/findings.ts";
import { getCheck } from "../checks/checks.ts";
import type { Options, VariantCodes } from "../codes.ts";
import type { FaultId } from "../faults/fault-ids.ts";
import { all, evaluateVariant, fuel, loc, mayApply, opt, or } from "../variant.ts";
import type { VariantExpr } from "../variant.ts";
import type { StopRuleId } from "./stop-rule-ids.ts";

/** The items of the first look, before any watch. Each is optional. */
export const FIRST_LOOK_IDS = [
  "thermostat",
  "switch-breaker",
  "door",
  "filter",
  "shutoff",
  "status-light",
  "water",
] as const;
export type FirstLookId = (typeof FIRST_LOOK_IDS)[number];

/** One thing the first look may hit: the finding is the evidence, and `fault` the cause it settles. */
export type FirstLookHit = {
  [C in CheckId]: {
    readonly id: string;
    readonly check: C;
    readonly finding?: FindingIdOf<C>;
    /** The cause, where the hit settles it; a hit without one only points on. */
    readonly fault?: FaultId;
    readonly rule?: StopRuleId;
    readonly when?: VariantExpr;
  };
}[CheckId];

export interface FirstLookItem {
  readonly id: FirstLookId;
  readonly applies: VariantExpr;
  readonly hits: readonly FirstLookHit[];
}

/** The first look. Common practice; which hits settle a cause is judgement. */
export const FIRST_LOOK: readonly FirstLookItem[] = [
  {
    id: "thermostat",
    applies: all,
    hits: [
      {
        id: "blank",
        check: "ck-tstat-batteries",
        finding: "blank",
        fault: "tstat-dead-batteries",
        when: opt("stat-battery"),
      },
      {
        id: "low-icon",
        check: "ck-tstat-batteries",
        finding: "low-icon",
        fault: "tstat-dead-batteries",
        when: opt("stat-battery"),
      },
      { id: "blank-no-batteries", check: "ck-tstat-settings", finding: "blank" },
      { id: "mode", check: "ck-tstat-settings", finding: "mode", fault: "tstat-wrong-setting" },
      {
        id: "schedule-hold",
        check: "ck-tstat-settings",
        finding: "schedule-hold",
        fault: "tstat-wrong-setting",
      },
      { id: "system-type", check: "ck-tstat-settings", finding: "system-type", fault: "tstat-wrong-setting" },
    ],
  },
  {
    id: "switch-breaker",
    applies: all,
    hits: [
      {
        id: "switch-off",
        check: "ck-line-voltage",
        finding: "zero-load",
        fault: "service-switch-off",
        rule: "found-off",
        when: loc("IND", "ATT"),
      },
      {
        id: "breaker-tripped",
        check: "ck-line-voltage",
        finding: "zero-line",
        fault: "no-line-power-breaker",
        rule: "found-off",
      },
      {
        id: "disconnect-off",
        check: "ck-disconnect-fuses",
        finding: "handle-out",
        fault: "disconnect-off",
        rule: "found-off",
        when: loc("RTU"),
      },
      {
        id: "gfci-tripped",
        check: "ck-line-voltage",
        finding: "zero-past-gfci",
        fault: "gfci-tripped",
        rule: "found-off",
        when: opt("gfci"),
      },
      {
        id: "transformer-button-out",
        check: "ck-transformer-secondary",
        finding: "zero-button-out",
        fault: "transformer-reset-tripped",
        when: opt("transformer-breaker"),
      },
    ],
  },
  {
    id: "door",
    applies: loc("IND", "ATT"),
    hits: [
      { id: "misfit", check: "ck-panel-fit", finding: "misfit", fault: "door-switch-open" },
      { id: "tab-bent", check: "ck-panel-fit", finding: "tab-bent", fault: "door-switch-open" },
      { id: "missing", check: "ck-panel-fit", finding: "missing", fault: "door-switch-open" },
    ],
  },
  {
    id: "filter",
    applies: all,
    hits: [
      { id: "loaded", check: "ck-filter", finding: "loaded", fault: "limit-open-filter" },
      { id: "wrong-type", check: "ck-filter", finding: "wrong-type" },
      { id: "missing", check: "ck-filter", finding: "missing" },
    ],
  },
  {
    id: "shutoff",
    applies: all,
    hits: [
      {
        id: "appliance-valve",
        check: "ck-gas-shutoff",
        finding: "appliance-valve",
        fault: "gas-off-appliance-valve",
        rule: "found-off",
      },
      {
        id: "branch-off-season",
        check: "ck-gas-shutoff",
        finding: "branch-off-season",
        fault: "gas-off-after-summer",
        rule: "found-off",
        when: loc("RTU"),
      },
      {
        id: "meter",
        check: "ck-gas-shutoff",
        finding: "meter",
        fault: "gas-off-meter",
        rule: "found-off",
        when: fuel("NG"),
      },
      {
        id: "control-switch-off",
        check: "ck-gas-shutoff",
        finding: "control-switch-off",
        fault: "gas-valve-switch-off",
        rule: "found-off",
      },
      {
        id: "tank-empty",
        check: "ck-lp-tank",
        finding: "empty",
        fault: "lp-tank-empty",
        rule: "lp-empty",
        when: fuel("LP"),
      },
      {
        id: "others-dead",
        check: "ck-other-appliances",
        finding: "dead",
        rule: "lp-empty",
        when: fuel("LP"),
      },
      { id: "others-dead-gas", check: "ck-other-appliances", finding: "dead", when: fuel("NG") },
    ],
  },
  {
    id: "status-light",
    applies: getCheck("ck-board-status").applies,
    // Every text of the status light is a finding; it points on and settles nothing by itself.
    hits: statusLightHits(),
  },
  {
    id: "water",
    applies: or(opt("overflow"), opt("condensate-pump"), getCheck("ck-condensate-drain").applies),
    hits: [
      {
        id: "float-open-wet",
        check: "ck-overflow-switch",
        finding: "open-wet",
        fault: "overflow-switch-open",
        when: opt("overflow"),
      },
      {
        id: "reservoir-full",
        check: "ck-overflow-switch",
        finding: "open-reservoir-full",
        fault: "condensate-pump-failed",
        when: opt("condensate-pump"),
      },
      {
        id: "drain-backs-up",
        check: "ck-condensate-drain",
        finding: "backs-up",
        fault: "trap-plugged",
        when: getCheck("ck-condensate-drain").applies,
      },
      {
        id: "drain-frozen",
        check: "ck-condensate-drain",
        finding: "frozen",
        fault: "drain-frozen",
        when: getCheck("ck-condensate-drain").applies,
      },
      {
        id: "pump-off",
        check: "ck-condensate-drain",
        finding: "pump-off",
        fault: "condensate-pump-failed",
        when: opt("condensate-pump"),
      },
    ],
  },
];

function statusLightHits(): FirstLookHit[] {
  const ids = Object.keys(CHECK_FINDINGS["ck-board-status"]) as FindingIdOf<"ck-board-status">[];
  return ids.filter((id) => id !== "normal").map((id) => ({ id, check: "ck-board-status", finding: id }));
}

/** The items and hits of the first look that a unit may have. */
export function firstLookFor(unit: { codes: VariantCodes; options: Options }): FirstLookItem[] {
  return FIRST_LOOK.filter((item) => mayApply(item.applies, unit.codes, unit.options)).map((item) => ({
    ...item,
    hits: item.hits.filter((hit) => !hit.when || evaluateVariant(hit.when, unit) !== false),
  }));
}
