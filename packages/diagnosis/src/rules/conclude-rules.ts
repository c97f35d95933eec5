import { causesOf, decides, getFault, isFaultId, isSymptomId, mayApply } from "@emberladder/furnace";
import type { Evidence } from "@emberladder/furnace";
import type { BodyOf } from "../events/index.ts";
import type { DiagnosisState } from "../state/diagnosis-state.ts";
import { breachWhere } from "./breach.ts";
import type { Breach } from "./breach.ts";

/** Checks of devices that stay open until pressed: found tripped, they need a cause. */
const MANUAL_RESET_CHECKS = ["ck-rollout", "ck-spill-switch", "ck-aux-limit"];

/** The cause written where nothing was proven and nothing is suspected. */
export const UNKNOWN_CAUSE = "unknown";

/** Whether a manual-reset device of this unit was found tripped in this visit. */
export function foundTripped(state: DiagnosisState): boolean {
  return state.observations.some(
    (observation) => MANUAL_RESET_CHECKS.includes(observation.check) && observation.finding === "tripped",
  );
}

/**
 * Rules of a conclusion: a fault and not a symptom, one that this unit can have, shown by a reading or a look
 * that decides it, and with the root cause of a tripped device written. Where nothing was proven the record
 * says so, and then no evidence is asked for.
 */
export function concludeRules(state: DiagnosisState, body: BodyOf<"cause.concluded">): Breach[] {
  const { cause, proven } = body;
  if (!proven && cause === UNKNOWN_CAUSE) {
    return breachWhere(!body.openQuestionRef && { rule: "open-question-missing" });
  }
  if (isSymptomId(cause))
    return [{ rule: "symptom-is-not-a-cause", params: { cause, causes: causesOf(cause).join(" ") } }];
  if (!isFaultId(cause)) return [{ rule: "fault-unknown", params: { cause } }];
  const { profile } = state;
  const fits = !profile || mayApply(getFault(cause).applies, profile.codes, profile.options);
  return breachWhere(
    !fits && { rule: "fault-not-of-this-unit", params: { cause } },
    proven && cause === "ignition-lockout-latched" && { rule: "lockout-is-not-a-cause" },
    proven &&
      cause !== "ignition-lockout-latched" &&
      !isDecided(state, body) && { rule: "decisive-reading-missing", params: { cause } },
    !proven && !body.openQuestionRef && { rule: "open-question-missing" },
    foundTripped(state) && !body.rootCause && { rule: "root-cause-missing" },
  );
}

/** Whether the evidence named holds at least one check that decides the cause. */
export function isDecided(state: DiagnosisState, body: BodyOf<"cause.concluded">): boolean {
  const named: Evidence[] = [
    ...state.observations.filter((observation) => body.evidence.includes(observation.eventId)),
    ...state.looks.flatMap(({ check, finding, outcome, eventId }) =>
      check && body.evidence.includes(eventId) ? [{ check, finding, outcome }] : [],
    ),
  ];
  return [body.cause, ...(body.also ?? [])]
    .filter(isFaultId)
    .some((fault) => named.some((evidence) => decides(evidence, fault)));
}
