import { stepOf, treePosition } from "@emberladder/diagnosis";
import type { DiagnosisState, WalkStep } from "@emberladder/diagnosis";
import { isAsking } from "@emberladder/trees";
import type { TreeDocument } from "@emberladder/trees";
import { assign, setup } from "xstate";
import { paths } from "#lib/paths.ts";

/**
 * Navigation of the walk. The machine holds no truth of its own: it is fed the step that the fold gives and is
 * never stored. It knows one thing more than the fold: a stop rule takes the walk away from whatever screen is
 * open, and gives it back when its acts are done.
 */
export const walkMachine = setup({
  types: {
    context: {} as { step: WalkStep },
    events: {} as { type: "folded"; step: WalkStep },
    input: {} as { step: WalkStep },
  },
  actions: { remember: assign({ step: ({ event }) => event.step }) },
  guards: {
    isStop: ({ event }) => event.step === "stop",
    isDone: ({ event }) => event.step === "done",
  },
}).createMachine({
  id: "walk",
  context: ({ input }) => ({ step: input.step }),
  initial: "walking",
  on: {
    folded: [
      { guard: "isStop", target: ".stopped", actions: "remember" },
      { guard: "isDone", target: ".ended", actions: "remember" },
      { target: ".walking", actions: "remember" },
    ],
  },
  states: { walking: {}, stopped: {}, ended: {} },
});

const PATH_OF_STEP: Record<WalkStep, (diagnosisId: string) => string> = {
  door: paths.diagnosis.door,
  stop: paths.diagnosis.stop,
  confirm: paths.diagnosis.confirm,
  look: paths.diagnosis.look,
  watch: paths.diagnosis.watch,
  check: (id) => paths.diagnosis.check(id),
  checks: paths.diagnosis.causes,
  conclude: paths.diagnosis.conclude,
  repair: paths.diagnosis.repair,
  "put-back": paths.diagnosis.putBack,
  proof: paths.diagnosis.proof,
  answers: paths.diagnosis.answers,
  done: (id) => `/diagnoses/${id}/done`,
};

/** Screens that stay open while a stop rule is: its own, the ways to end, and what only shows. */
const OPEN_WHILE_STOPPED = ["stop", "close", "safety", "ladder", "record", "put-back", "check", "checks"];

/** Whether a screen gives way to the stop screen. */
export function givesWayToStop(screen: string): boolean {
  return !OPEN_WHILE_STOPPED.includes(screen);
}

/**
 * The address of the screen for the next step of a diagnosis. A check is named in its address, so that the way
 * back leads to the check that was seen and not to the one that is next by then.
 */
export function pathOfNext(diagnosisId: string, state: DiagnosisState, tree: TreeDocument | null): string {
  const step = stepOf(state, tree, Date.now());
  if (step !== "check") return PATH_OF_STEP[step](diagnosisId);
  const node = tree ? treePosition(tree, state).node : null;
  return paths.diagnosis.check(
    diagnosisId,
    state.current?.check ?? (node && isAsking(node) ? node.check : undefined),
  );
}
