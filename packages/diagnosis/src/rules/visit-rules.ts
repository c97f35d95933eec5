import { isStopRuleId, getStopRule, profileProblems, SIGHTS } from "@emberladder/furnace";
import type { BodyOf } from "../events/index.ts";
import { doorProgress } from "../derive/steps.ts";
import { lastWatch } from "../derive/ladder.ts";
import type { DiagnosisState } from "../state/diagnosis-state.ts";
import { breachWhere } from "./breach.ts";
import type { Breach } from "./breach.ts";

/** Seconds of shut gas before another try, where the unit was reset before the visit or nobody knows. */
const CLEAR_OUT_S = 300;

/** The door comes first: three answers before anything else on the visit. */
export function doorFirst(state: DiagnosisState): Breach[] {
  return breachWhere(!doorProgress(state).complete && { rule: "door-first" });
}

/** Rules of a corrected unit: a profile that can exist. */
export function confirmRules(body: BodyOf<"unit.confirmed">): Breach[] {
  const problem = body.profile ? profileProblems(body.profile)[0] : undefined;
  return breachWhere(
    problem && { rule: "profile-impossible", params: { field: problem.field, reason: problem.reason } },
  );
}

/** Rules of a call for heat: after resets the gas was shut five minutes and both places read zero. */
export function watchStartRules(state: DiagnosisState, body: BodyOf<"watch.started">): Breach[] {
  const { resetsBefore, before } = body;
  const needsWait = resetsBefore === null || resetsBefore > 0;
  const running = lastWatch(state);
  return breachWhere(
    running && !running.ended && { rule: "watch-running" },
    needsWait && !before && { rule: "resets-need-wait" },
    needsWait &&
      before &&
      before.gasShutS < CLEAR_OUT_S && {
        rule: "resets-wait-longer",
        params: { waited: before.gasShutS, needed: CLEAR_OUT_S },
      },
    needsWait &&
      before &&
      (before.lelBurnerBoxPct > 0 || before.lelVentPct > 0) && { rule: "resets-gas-left" },
  );
}

/** Rules of something seen, or of the end: there is a watch, and it is one of the things that can be seen. */
export function watchRules(state: DiagnosisState, sight?: string): Breach[] {
  const watch = lastWatch(state);
  return breachWhere(
    (!watch || watch.ended !== undefined) && { rule: "no-watch-running" },
    sight !== undefined &&
      !SIGHTS.some((known) => known === sight) && { rule: "sight-unknown", params: { sight } },
  );
}

/** Rules of an act of a stop rule: one it has, and a reading that does it or is recorded as it is. */
export function stopActRules(body: BodyOf<"stop.act-recorded">): Breach[] {
  if (!isStopRuleId(body.rule)) return [{ rule: "stop-unknown", params: { stop: body.rule } }];
  const act = getStopRule(body.rule).acts.find(({ id }) => id === body.act);
  if (!act) return [{ rule: "stop-act-unknown", params: { stop: body.rule, act: body.act } }];
  return breachWhere(
    act.kind === "reading" &&
      body.value === undefined && { rule: "stop-act-needs-reading", params: { stop: body.rule } },
    act.kind === "text" &&
      body.noteRef === undefined && { rule: "stop-act-needs-text", params: { stop: body.rule } },
  );
}
