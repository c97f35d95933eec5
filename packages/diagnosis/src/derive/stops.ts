import {
  actPasses,
  evaluateVariant,
  getCheck,
  getStopRule,
  isCheckId,
  isStopRuleId,
  stopRulesFor,
} from "@emberladder/furnace";
import type { StopAct, StopFact, StopRuleId, StoppedWork } from "@emberladder/furnace";
import type { DiagnosisState, Observation } from "../state/diagnosis-state.ts";

/** One act of a stop rule that was met, and whether it is done. */
export interface MetAct extends StopAct {
  done: boolean;
}

/** A stop rule that was met in this visit. */
export interface MetStop {
  rule: StopRuleId;
  /** The event that met it, first. */
  eventId: string;
  at: number;
  stops: StoppedWork;
  acts: MetAct[];
  /** Every act is done that going on needs: work may go on. */
  lifted: boolean;
  /** The acts that are due whatever happens are done: the visit may end with the unit off. */
  mayFinish: boolean;
}

interface Trigger {
  rule: StopRuleId;
  eventId: string;
  at: number;
}

/**
 * The stop rules met in this visit, in the order in which they were met, with their acts. Everything is taken
 * from the fold: the newest door answers, looks, readings, readings of stop acts, and rules raised by hand. An
 * answer that was put right meets no rule any more.
 */
export function stopsOf(state: DiagnosisState): MetStop[] {
  const { profile } = state;
  if (!profile) return [];
  const unit = { codes: profile.codes, options: profile.options };
  const order = new Map(state.log.map((event, index) => [event.id, index]));
  const met = new Map<StopRuleId, Trigger>();
  for (const { eventId, at, rules } of facts(state, (fact) => stopRulesFor(fact, unit))) {
    for (const rule of rules) if (!met.has(rule)) met.set(rule, { rule, eventId, at });
  }
  return [...met.values()]
    .toSorted((a, b) => (order.get(a.eventId) ?? 0) - (order.get(b.eventId) ?? 0))
    .map((trigger) => describe(state, trigger, unit, (eventId) => order.get(eventId) ?? 0));
}

/** The stop rules that still stop something. */
export function openStops(state: DiagnosisState): MetStop[] {
  return stopsOf(state).filter((stop) => !stop.lifted);
}

/** The act of a stop rule to do next: those due at once first, in their order. */
export function nextAct(stop: MetStop): MetAct | undefined {
  return stop.acts.find((act) => !act.done && act.due !== "closing");
}

function facts(state: DiagnosisState, judge: (fact: StopFact) => StopRuleId[]) {
  const found: { eventId: string; at: number; rules: StopRuleId[] }[] = [];
  const add = (trace: { eventId: string; at: number }, rules: StopRuleId[]) => {
    if (rules.length > 0) found.push({ eventId: trace.eventId, at: trace.at, rules });
  };
  for (const answer of Object.values(state.door)) {
    add(answer, judge({ on: "door", question: answer.question, answers: { ...answer } }));
  }
  for (const raised of state.raised) if (isStopRuleId(raised.rule)) add(raised, [raised.rule]);
  for (const look of state.looks) {
    if (look.check && isCheckId(look.check)) add(look, judge(factOf({ ...look, check: look.check })));
  }
  for (const observation of state.observations) {
    if (isCheckId(observation.check)) add(observation, judge(factOf(observation)));
  }
  for (const act of state.stopActs) {
    const check = isStopRuleId(act.rule)
      ? getStopRule(act.rule).acts.find(({ id }) => id === act.act)?.check
      : undefined;
    if (check && act.value !== undefined) {
      add(act, judge({ on: "check", check, value: act.value, unit: getCheck(check).units[0] }));
    }
  }
  return found;
}

function factOf(answer: Pick<Observation, "check" | "outcome" | "finding" | "value" | "unit">): StopFact {
  const { check, outcome, finding, value, unit } = answer;
  return {
    on: "check",
    check: check as Extract<StopFact, { on: "check" }>["check"],
    outcome,
    finding,
    value: value === "OL" ? Infinity : value,
    unit,
  };
}

function describe(
  state: DiagnosisState,
  trigger: Trigger,
  unit: Parameters<typeof evaluateVariant>[1],
  placeOf: (eventId: string) => number,
): MetStop {
  const { acts, stops } = getStopRule(trigger.rule);
  const after = (eventId: string) => placeOf(eventId) > placeOf(trigger.eventId);
  const metActs = acts
    .filter((act) => !act.when || evaluateVariant(act.when, unit) !== false)
    .map((act): MetAct => ({ ...act, done: isDone(state, trigger.rule, act, after) }));
  const done = (due: StopAct["due"]) => metActs.every((act) => act.due !== due || act.done);
  return {
    ...trigger,
    stops,
    acts: metActs,
    lifted: done("all") && done("going-on"),
    mayFinish: done("all"),
  };
}

/** An act is done when it was recorded after the rule was met, and a reading or a look of its check counts too. */
function isDone(
  state: DiagnosisState,
  rule: StopRuleId,
  act: StopAct,
  after: (eventId: string) => boolean,
): boolean {
  const recorded = state.stopActs.findLast(
    (done) => done.rule === rule && done.act === act.id && after(done.eventId),
  );
  if (recorded)
    return act.kind !== "reading" || (recorded.value !== undefined && actPasses(act, recorded.value));
  if (!act.check) return false;
  const taken = state.observations.findLast(
    (observation) => observation.check === act.check && after(observation.eventId),
  );
  if (!taken) return false;
  if (act.kind !== "reading") return true;
  return typeof taken.value === "number" && actPasses(act, taken.value);
}

/** Kinds of work on a unit, as stop rules tell them apart. */
export type Work = "walk" | "check" | "call-for-heat" | "repair";

const STOPPED: Record<StoppedWork, readonly Work[]> = {
  everything: ["walk", "check", "call-for-heat", "repair"],
  entering: ["walk", "check", "call-for-heat", "repair"],
  touching: ["check", "call-for-heat", "repair"],
  restoring: ["call-for-heat", "repair"],
  "call-for-heat": ["call-for-heat"],
  firing: ["call-for-heat"],
};

/**
 * The open stop rule that stops a kind of work; undefined where none does. A rule against firing lets a call be
 * watched while the gas is recorded shut: nothing can burn then.
 */
export function stopFor(state: DiagnosisState, work: Work): MetStop | undefined {
  return openStops(state).find(
    (stop) =>
      STOPPED[stop.stops].includes(work) &&
      !(stop.stops === "firing" && work === "call-for-heat" && state.unit.gas === "shut"),
  );
}

/**
 * The stop rule whose acts come before anything else now: one that stops all work, or one with acts due at
 * once. A rule that only waits for readings or looks lets the walk go on to take them.
 */
export function urgentStop(state: DiagnosisState): MetStop | undefined {
  return openStops(state).find(
    (stop) =>
      STOPPED[stop.stops].includes("walk") ||
      stop.acts.some((act) => act.due === "all" && !act.done && (act.kind === "timer" || !act.check)) ||
      (stop.stops === "restoring" && !stop.lifted),
  );
}
