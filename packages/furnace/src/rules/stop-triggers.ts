import type { CheckId } from "../checks/check-ids.ts";
import type { FindingIdOf, UniversalFinding } from "../checks/findings.ts";
import type { ReadingUnit } from "../codes.ts";
import { evaluateVariant, fuel } from "../variant.ts";
import type { VariantContext, VariantExpr } from "../variant.ts";
import type { DoorField, DoorQuestionId } from "./door-questions.ts";
import { STOP_RULE_IDS } from "./stop-rule-ids.ts";
import type { StopRuleId } from "./stop-rule-ids.ts";

/** A span of numbers that triggers a rule. */
interface Span {
  readonly atLeast?: number;
  readonly above?: number;
  readonly atMost?: number;
  readonly below?: number;
}

export interface DoorTrigger extends Span {
  readonly on: "door";
  readonly question: DoorQuestionId;
  readonly field: DoorField;
  readonly is?: boolean;
  readonly includes?: string;
  /** Not where this other answer of the same question is at least so much. */
  readonly unless?: { readonly field: DoorField; readonly atLeast: number };
  readonly when?: VariantExpr;
}

export interface ReadingTrigger extends Span {
  readonly on: "reading";
  readonly check: CheckId;
  readonly unit: ReadingUnit;
  readonly when?: VariantExpr;
}

export type FindingTrigger = {
  [C in CheckId]: {
    readonly on: "finding";
    readonly check: C;
    readonly finding: FindingIdOf<C> | UniversalFinding;
    readonly when?: VariantExpr;
  };
}[CheckId];

/** A check that failed, whatever was found. */
export interface FailTrigger {
  readonly on: "fail";
  readonly check: CheckId;
  readonly when?: VariantExpr;
}

export type StopTrigger = DoorTrigger | ReadingTrigger | FindingTrigger | FailTrigger;

/** Height of a parapet, inches, from which it guards an edge: 42 less 3, 29 CFR 1910.29, from memory. */
const PARAPET_IN = 39;
/** Nearest work to an unguarded edge, feet: 29 CFR 1910.28, from memory. */
const EDGE_FT = 6;

/** What brings each stop rule up. A rule may also be raised by hand from any screen. */
export const STOP_TRIGGERS: Readonly<Record<StopRuleId, readonly StopTrigger[]>> = {
  co: [
    { on: "door", question: "people", field: "unwell", is: true },
    { on: "door", question: "people", field: "coPpm", atLeast: 70 },
    { on: "reading", check: "ck-co-ambient", unit: "ppm", atLeast: 70 },
  ],
  "co-alarm": [{ on: "door", question: "people", field: "alarm", is: true }],
  "co-30": [
    { on: "door", question: "people", field: "coPpm", atLeast: 30, below: 70 },
    { on: "reading", check: "ck-co-ambient", unit: "ppm", atLeast: 30, below: 70 },
  ],
  "gas-odor": [
    { on: "door", question: "smell", field: "smell", is: true },
    { on: "door", question: "smell", field: "lelPct", atLeast: 10 },
    { on: "reading", check: "ck-gas-detector", unit: "pct", atLeast: 10 },
    { on: "finding", check: "ck-gas-detector", finding: "room" },
    { on: "finding", check: "ck-regulator-vent", finding: "escaping" },
    { on: "fail", check: "ck-odor" },
  ],
  "lel-1": [
    { on: "door", question: "smell", field: "lelPct", atLeast: 1, below: 10 },
    { on: "reading", check: "ck-gas-detector", unit: "pct", atLeast: 1, below: 10 },
  ],
  "raw-gas": [{ on: "finding", check: "ck-gas-detector", finding: "burner-box-after-tries" }],
  access: [
    { on: "door", question: "way-in", field: "safe", is: false },
    { on: "door", question: "way-in", field: "hatchGuarded", is: false },
    {
      on: "door",
      question: "way-in",
      field: "edgeFt",
      below: EDGE_FT,
      unless: { field: "parapetIn", atLeast: PARAPET_IN },
    },
  ],
  "found-off": [
    { on: "finding", check: "ck-gas-shutoff", finding: "appliance-valve" },
    { on: "finding", check: "ck-gas-shutoff", finding: "branch-off-season" },
    { on: "finding", check: "ck-gas-shutoff", finding: "meter" },
    { on: "finding", check: "ck-gas-shutoff", finding: "control-switch-off" },
    { on: "finding", check: "ck-disconnect-fuses", finding: "handle-out" },
    { on: "finding", check: "ck-line-voltage", finding: "zero-load" },
  ],
  "lp-empty": [
    { on: "reading", check: "ck-lp-tank", unit: "pct", atMost: 5 },
    { on: "finding", check: "ck-lp-tank", finding: "empty" },
    { on: "finding", check: "ck-other-appliances", finding: "dead", when: fuel("LP") },
  ],
  "lp-low": [{ on: "finding", check: "ck-gas-detector", finding: "low-accumulates" }],
  rollout: [
    { on: "finding", check: "ck-rollout", finding: "tripped" },
    { on: "finding", check: "ck-safety-hop", finding: "lost-rollout" },
  ],
  spill: [
    { on: "finding", check: "ck-spill-switch", finding: "tripped" },
    { on: "finding", check: "ck-spill-switch", finding: "opens-hot" },
    { on: "finding", check: "ck-safety-hop", finding: "lost-spill" },
    { on: "reading", check: "ck-spillage", unit: "s", above: 300 },
    { on: "fail", check: "ck-spillage" },
  ],
  "flue-400": [
    { on: "reading", check: "ck-flue-analysis", unit: "ppm", above: 400 },
    { on: "finding", check: "ck-flue-analysis", finding: "co-rising" },
  ],
  exchanger: [{ on: "finding", check: "ck-heat-exchanger", finding: "crack" }],
  "leak-by": [
    { on: "reading", check: "ck-manifold-leakby", unit: "inwc", above: 0.05 },
    { on: "finding", check: "ck-manifold-leakby", finding: "rising" },
    { on: "finding", check: "ck-timing", finding: "outlasts-call" },
  ],
  soot: [
    { on: "door", question: "at-unit", field: "found", includes: "soot" },
    { on: "finding", check: "ck-visual-wiring", finding: "scorched" },
    { on: "finding", check: "ck-visual-wiring", finding: "melted" },
    { on: "finding", check: "ck-heat-exchanger", finding: "soot" },
  ],
  "live-cabinet": [
    { on: "door", question: "at-unit", field: "cabinetV", above: 30 },
    { on: "reading", check: "ck-cabinet-earth", unit: "V", above: 30 },
    { on: "finding", check: "ck-cabinet-earth", finding: "live" },
  ],
  flood: [{ on: "door", question: "at-unit", field: "found", includes: "under-water" }],
  "water-wet": [
    { on: "door", question: "at-unit", field: "found", includes: "wet-control" },
    { on: "finding", check: "ck-visual-wiring", finding: "wet-board" },
  ],
  asbestos: [{ on: "door", question: "at-unit", field: "found", includes: "old-wrap" }],
};

/** Something that happened on a visit, as far as stop rules look at it. */
export type StopFact =
  | { on: "door"; question: DoorQuestionId; answers: Readonly<Record<string, unknown>> }
  | {
      on: "check";
      check: CheckId;
      outcome?: "good" | "marginal" | "fail";
      finding?: string;
      value?: number;
      unit?: ReadingUnit;
    };

function isInSpan(value: unknown, { atLeast, above, atMost, below }: Span): boolean {
  if (typeof value !== "number" || Number.isNaN(value)) return false;
  if (atLeast === undefined && above === undefined && atMost === undefined && below === undefined)
    return false;
  return (
    (atLeast === undefined || value >= atLeast) &&
    (above === undefined || value > above) &&
    (atMost === undefined || value <= atMost) &&
    (below === undefined || value < below)
  );
}

function doorTriggers(trigger: DoorTrigger, answers: Readonly<Record<string, unknown>>): boolean {
  const answer = answers[trigger.field];
  if (trigger.unless) {
    const other = answers[trigger.unless.field];
    if (typeof other === "number" && other >= trigger.unless.atLeast) return false;
  }
  if (trigger.is !== undefined) return answer === trigger.is;
  if (trigger.includes !== undefined) return Array.isArray(answer) && answer.includes(trigger.includes);
  return isInSpan(answer, trigger);
}

function isTriggered(trigger: StopTrigger, fact: StopFact, unit: VariantContext): boolean {
  if (trigger.when && evaluateVariant(trigger.when, unit) === false) return false;
  if (trigger.on === "door" || fact.on === "door") {
    if (trigger.on !== "door" || fact.on !== "door") return false;
    return trigger.question === fact.question && doorTriggers(trigger, fact.answers);
  }
  if (trigger.check !== fact.check) return false;
  if (trigger.on === "finding") return trigger.finding === fact.finding;
  if (trigger.on === "fail") return fact.outcome === "fail";
  return trigger.unit === fact.unit && isInSpan(fact.value, trigger);
}

/** The stop rules that a door answer or an answered check brings up on a unit, the gravest first. */
export function stopRulesFor(fact: StopFact, unit: VariantContext): StopRuleId[] {
  return STOP_RULE_IDS.filter((id) => STOP_TRIGGERS[id].some((trigger) => isTriggered(trigger, fact, unit)));
}
