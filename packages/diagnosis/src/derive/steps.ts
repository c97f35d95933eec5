import type { TreeDocument } from "@emberladder/trees";
import type { DiagnosisState } from "../state/diagnosis-state.ts";
import { lastWatch } from "./ladder.ts";
import { openPutBacks } from "./put-backs.ts";
import { likelyOutcome, proofMissing, proofOf } from "./proof.ts";
import { urgentStop } from "./stops.ts";
import { treePosition } from "./tree-position.ts";

/** The steps of a visit, each with a screen of its own. */
export type WalkStep =
  | "door"
  | "stop"
  | "confirm"
  | "look"
  | "watch"
  | "check"
  | "checks"
  | "conclude"
  | "repair"
  | "put-back"
  | "proof"
  | "answers"
  | "done";

/** How far the door's three questions are. */
export function doorProgress(state: DiagnosisState): { answered: number; of: 3; complete: boolean } {
  const answered = (["people", "smell", "way-in"] as const).filter((question) => state.door[question]).length;
  return { answered, of: 3, complete: answered === 3 };
}

/**
 * The next step of a visit, from the fold and the tree alone: stop rules before all else, then door, unit,
 * first look, watch, checks, conclusion, repair, what is out, proof, answers. A first look that settled it goes
 * straight to the conclusion.
 */
export function stepOf(state: DiagnosisState, tree: TreeDocument | null, now: number): WalkStep {
  if (state.closed) return "done";
  if (urgentStop(state)) return "stop";
  if (!doorProgress(state).complete) return "door";
  if (!state.confirmed) return "confirm";
  if (state.conclusion) return stepAfterConclusion(state, now);
  const watch = lastWatch(state);
  if (watch && !watch.ended) return "watch";
  if (watch?.ended?.how === "no-glow" && state.unit.gas === "open" && state.observations.length === 0)
    return "watch";
  if (settledLook(state)) return "conclude";
  if (!watch && !state.watchSkipped && state.observations.length === 0) return "look";
  if (!tree) return "checks";
  const { node } = treePosition(tree, state);
  if (!node) return "checks";
  return node.kind === "conclude" ? "conclude" : "check";
}

/** The first-look hit that settles the cause by itself, the newest one. */
export function settledLook(state: DiagnosisState) {
  return state.looks.findLast((look) => look.answer === "hit" && look.outcome === "fail");
}

function stepAfterConclusion(state: DiagnosisState, now: number): WalkStep {
  const { conclusion } = state;
  if (!conclusion?.proven) return openPutBacks(state).length > 0 ? "put-back" : "proof";
  if (state.repairs.length === 0) return "repair";
  const outcome = likelyOutcome(state);
  // Covers go on with the proof's own act; everything else has to be back before the light-off.
  if (openPutBacks(state).some((item) => item.kind !== "cover-removed")) return "put-back";
  return proofMissing(proofOf(state, outcome, now)).some((item) => item.id !== "close-jumpers")
    ? "proof"
    : "answers";
}
