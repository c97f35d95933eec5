import { treePosition } from "@emberladder/diagnosis";
import type { EventBody } from "@emberladder/diagnosis";
import type { TreeDocument } from "@emberladder/trees";
import type { Breach, DiagnosisState, ReadBody } from "./judge.ts";

/**
 * Whether an event takes the step of the tree that was due: the walk is replayed with the stored document of
 * the version that the diagnosis pinned. It only tells a supervisor something, because leaving the tree is
 * allowed, with a reason; a step that the walk never came to says that the phone followed another document.
 *
 * @param tree the pinned document; null where there is none to judge by
 */
export function treeFlagsOf(state: DiagnosisState, read: ReadBody, tree: TreeDocument | null): Breach[] {
  if (read.kind !== "known") return [];
  const { event } = read;
  if (event.type === "diagnosis.opened") {
    const isUnknown = event.body.tree !== null && tree === null;
    return isUnknown ? [{ rule: "tree-unknown" }] : [];
  }
  const step = stepOf(event);
  if (step === undefined || tree === null) return [];
  const due = treePosition(tree, state).node?.id;
  return due === step ? [] : [{ rule: "tree-step-unreachable", params: { step, due: due ?? "" } }];
}

/** The node of the tree that an event says it took. */
function stepOf(event: EventBody): string | undefined {
  switch (event.type) {
    case "check.answered":
      return event.body.shown?.treeNode;
    case "check.declined":
    case "tree.step-done":
      return event.body.treeNode;
    default:
      return undefined;
  }
}
