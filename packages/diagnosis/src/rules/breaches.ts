import { stopFor, stopsOf } from "../derive/stops.ts";
import type { Work } from "../derive/stops.ts";
import type { EventBody } from "../events/index.ts";
import type { DiagnosisState } from "../state/diagnosis-state.ts";
import type { Breach } from "./breach.ts";
import { breachWhere } from "./breach.ts";
import { checkAnswerRules, checkStartRules, jumperRules, putBackRules } from "./check-rules.ts";
import { closeRules, proofRules } from "./closing-rules.ts";
import { concludeRules } from "./conclude-rules.ts";
import { confirmRules, doorFirst, stopActRules, watchRules, watchStartRules } from "./visit-rules.ts";

/** Events that a stop rule and the order of the visit never block: they record what is, or end the visit. */
const WORK: Partial<Record<EventBody["type"], Work>> = {
  "unit.confirmed": "walk",
  "look.answered": "walk",
  "watch.started": "call-for-heat",
  "check.started": "check",
  "check.answered": "check",
  "cause.concluded": "walk",
  "repair.recorded": "repair",
};

/**
 * The rules of the trade that an event is against, judged on the state before it. The phone refuses what is
 * against a rule; the server takes it and flags it, because what was done in the field is never lost.
 */
export function breaches(state: DiagnosisState, event: EventBody, context: { now: number }): Breach[] {
  if (event.type === "diagnosis.opened")
    return breachWhere(state.opened !== null && { rule: "opened-already" });
  if (!state.opened) return [{ rule: "not-opened" }];
  const order = orderRules(state, event);
  return order.length > 0 ? order : ownRules(state, event, context.now);
}

function orderRules(state: DiagnosisState, event: EventBody): Breach[] {
  const afterClose =
    state.closed !== null && event.type !== "report.requested" && event.type !== "diagnosis.closed";
  if (afterClose) return [{ rule: "after-close" }];
  const work = WORK[event.type];
  if (!work) return [];
  const stop = stopFor(state, work);
  // Readings that a stop rule itself asks for are taken while it stands.
  const asked =
    event.type === "check.started" || event.type === "check.answered"
      ? isAskedByStop(state, event.body.check)
      : false;
  if (stop && !asked) return [{ rule: "stop-open", params: { stop: stop.rule } }];
  return doorFirst(state);
}

function isAskedByStop(state: DiagnosisState, check: string): boolean {
  return stopsOf(state).some((stop) => stop.acts.some((act) => act.check === check && !act.done));
}

function ownRules(state: DiagnosisState, event: EventBody, now: number): Breach[] {
  switch (event.type) {
    case "stop.act-recorded":
      return stopActRules(event.body);
    case "unit.confirmed":
      return confirmRules(event.body);
    case "watch.started":
      return watchStartRules(state, event.body);
    case "watch.seen":
      return watchRules(state, event.body.sight);
    case "watch.ended":
      return watchRules(state);
    case "check.started":
      return checkStartRules(state, event.body);
    case "check.answered":
      return checkAnswerRules(state, event.body);
    case "cause.concluded":
      return concludeRules(state, event.body);
    case "put-back.opened":
      return jumperRules(state, event.body);
    case "put-back.restored":
      return putBackRules(state, event.body);
    case "proof.recorded":
      return proofRules(state, event.body);
    case "diagnosis.closed":
      return closeRules(state, event.body, now);
    case "report.requested":
      return breachWhere(!state.closed && { rule: "report-before-close" });
    case "event.undone":
    case "event.corrected":
      return changeRules(state, event.body.of);
    default:
      return [];
  }
}

/** What may be taken back or put right: an event of this diagnosis that stands, but for its opening. */
function changeRules(state: DiagnosisState, of: string): Breach[] {
  const original = state.log.find((event) => event.id === of);
  return breachWhere(
    !original && { rule: "change-of-nothing" },
    original?.type === "diagnosis.opened" && { rule: "opening-stays" },
    state.undone[of] !== undefined && { rule: "undone-already" },
  );
}
