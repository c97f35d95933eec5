import { stepOf } from "@emberladder/diagnosis";
import type { DiagnosisState, WalkStep } from "@emberladder/diagnosis";
import type { TreeDocument } from "@emberladder/trees";
import { assign, createActor, setup } from "xstate";
import { paths } from "#lib/paths.ts";

/**
 * Navigation of the walk: which screen follows. The machine holds no truth of its own; it is built from the
 * folded state each time and never stored. The step is the fold's; the machine adds the one thing a person
 * may choose: to look at another screen first and come back.
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
  states: {
    walking: {
      on: {
        folded: [
          { guard: "isStop", target: "stopped", actions: "remember" },
          { guard: "isDone", target: "ended", actions: "remember" },
          { actions: "remember" },
        ],
      },
    },
    // A stop rule takes the walk away from wherever it was, and gives it back when its acts are done.
    stopped: { on: { folded: { target: "walking", actions: "remember" } } },
    ended: { on: { folded: { actions: "remember" } } },
  },
});

const PATH_OF_STEP: Record<WalkStep, (diagnosisId: string) => string> = {
  door: paths.diagnosis.door,
  stop: paths.diagnosis.stop,
  confirm: paths.diagnosis.confirm,
  look: paths.diagnosis.look,
  watch: paths.diagnosis.watch,
  check: paths.diagnosis.check,
  checks: paths.diagnosis.causes,
  conclude: paths.diagnosis.conclude,
  repair: paths.diagnosis.repair,
  "put-back": paths.diagnosis.putBack,
  proof: paths.diagnosis.proof,
  answers: paths.diagnosis.answers,
  done: (id) => `/diagnoses/${id}/done`,
};

/** The address of the screen for the next step of a diagnosis. */
export function pathOfNext(diagnosisId: string, state: DiagnosisState, tree: TreeDocument | null): string {
  const step = stepOf(state, tree, Date.now());
  const actor = createActor(walkMachine, { input: { step } }).start();
  actor.send({ type: "folded", step });
  const next = actor.getSnapshot().context.step;
  actor.stop();
  return PATH_OF_STEP[next](diagnosisId);
}
