import { closingPass, getClosingCheck, isClosingCheckId } from "@emberladder/furnace";
import { bypassedDevices, openPutBacks } from "../derive/put-backs.ts";
import { proofMissing, proofOf, wasLit } from "../derive/proof.ts";
import type { BodyOf } from "../events/index.ts";
import type { DiagnosisState } from "../state/diagnosis-state.ts";
import { openStops, stopsOf } from "../derive/stops.ts";
import { breachWhere } from "./breach.ts";
import type { Breach } from "./breach.ts";
import { concludeRules } from "./conclude-rules.ts";

/** Rules of a closing check: one there is, with what it needs, and a downstream leak check only with a flame. */
export function proofRules(state: DiagnosisState, body: BodyOf<"proof.recorded">): Breach[] {
  const { closing } = body;
  if (!isClosingCheckId(closing)) return [{ rule: "closing-unknown", params: { closing } }];
  const verdict = state.profile ? closingPass(closing, body, state.profile) : undefined;
  const missing = verdict?.missing.filter((field) => !field.startsWith("plate.")) ?? [];
  return breachWhere(
    getClosingCheck(closing).fillsItself && { rule: "closing-fills-itself", params: { closing } },
    closing === "close-leak-down" && !wasLit(state) && { rule: "leak-down-before-light" },
    missing.length > 0 && { rule: "closing-incomplete", params: { closing, missing: missing.join(" ") } },
  );
}

/**
 * Rules of closing. As fixed only with a proven cause that its evidence still shows, a repair, nothing out and the whole proof passed; with
 * a safety bypassed only as shut off; with a stop rule open only as shut off or referred; a unit left off with
 * what a unit left off needs.
 */
export function closeRules(state: DiagnosisState, body: BodyOf<"diagnosis.closed">, now: number): Breach[] {
  const { outcome, left } = body;
  const stops = openStops(state);
  const bypassed = bypassedDevices(state);
  const out = openPutBacks(state);
  const leavesOff = outcome === "shut-off" || outcome === "referred" || outcome === "part-needed";
  const general = breachWhere(
    state.closed !== null && { rule: "closed-already" },
    bypassed.length > 0 &&
      outcome !== "shut-off" && { rule: "safety-bypassed", params: { device: bypassed[0] ?? "" } },
    stops.length > 0 &&
      outcome !== "shut-off" &&
      outcome !== "referred" && { rule: "stop-open", params: { stop: stops[0]?.rule ?? "" } },
    stops.some((stop) => !stop.mayFinish) && {
      rule: "stop-acts-missing",
      params: { stop: stops.find((stop) => !stop.mayFinish)?.rule ?? "" },
    },
    stopsOf(state).some((stop) => stop.acts.some((act) => act.due === "closing" && !act.done)) && {
      rule: "stop-closing-act-missing",
    },
    outcome === "shut-off" && left.gas === "open" && { rule: "shut-off-gas-open" },
    outcome === "shut-off" && left.inService && { rule: "shut-off-in-service" },
  );
  if (outcome === "fixed") {
    const ordered = state.repairs.some((repair) => repair.parts.some((part) => part.state === "ordered"));
    return [
      ...general,
      ...breachWhere(
        !state.conclusion && { rule: "not-concluded" },
        state.conclusion?.proven === false && { rule: "not-proven" },
        state.repairs.length === 0 && { rule: "no-repair" },
        ordered && { rule: "part-still-ordered" },
        out.length > 0 && { rule: "put-back-open", params: { count: out.length } },
      ),
      ...standingConclusionRules(state),
      ...proofBreaches(state, outcome, now),
    ];
  }
  // A unit that nobody may enter or stay at has no proof to take: the stop rule's own acts are the proof.
  if (leavesOff && stops.length > 0) return general;
  if (outcome === "not-found") {
    return [
      ...general,
      ...breachWhere(out.length > 0 && { rule: "put-back-open", params: { count: out.length } }),
      ...proofBreaches(state, outcome, now),
    ];
  }
  return [
    ...general,
    ...proofBreaches(state, outcome, now).filter((breach) => breach.params?.["closing"] !== "close-jumpers"),
  ];
}

/**
 * What a proven conclusion is against by now: a reading that it rests on may have been taken back or put right
 * after it was written. A closing as fixed refuses such a one; a unit that is left off is never held up by it.
 */
export function standingConclusionRules({ conclusion, ...state }: DiagnosisState): Breach[] {
  return conclusion?.proven ? concludeRules({ ...state, conclusion }, conclusion) : [];
}

function proofBreaches(
  state: DiagnosisState,
  outcome: BodyOf<"diagnosis.closed">["outcome"],
  now: number,
): Breach[] {
  return proofMissing(proofOf(state, outcome, now)).map((item): Breach => {
    if (item.id === "close-cycles" && item.reading) {
      return {
        rule: "too-few-lights",
        params: { closing: item.id, seen: item.reading.value ?? 0, asked: item.lights ?? 1 },
      };
    }
    if (item.reading) return { rule: "proof-failed", params: { closing: item.id } };
    return { rule: "proof-missing", params: { closing: item.id } };
  });
}
