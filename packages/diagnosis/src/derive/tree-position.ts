import { afterAnswer, afterDeclined, afterDone, enterTree, findNode, settleNode } from "@emberladder/trees";
import type { TreeDocument, TreeNode } from "@emberladder/trees";
import type { DiagnosisState } from "../state/diagnosis-state.ts";
import { lastStageOf } from "./ladder.ts";

/** Where a walk stands on its tree. */
export interface TreePosition {
  /** The step to take now; null off the tree or where the document has none. */
  node: TreeNode | null;
  /** Off the tree by a recorded reason: the node that was left, to come back to. */
  leftAt: TreeNode | null;
}

/**
 * The place on the tree, from the document and the fold alone: the entry for the rung the unit stopped at or
 * for a first-look hit, then answer by answer. Undone steps are not in the fold, so they are not in the way.
 */
export function treePosition(tree: TreeDocument, state: DiagnosisState): TreePosition {
  const step = state.treeSteps.at(-1);
  const unit = state.profile ?? undefined;
  if (!step) return { node: enter(tree, state), leftAt: null };
  switch (step.kind) {
    case "answered": {
      const answer = state.observations.find((observation) => observation.eventId === step.eventId);
      const value = answer?.value === "OL" ? Infinity : answer?.value;
      return { node: afterAnswer(tree, step.treeNode, { ...answer, value }, unit) ?? null, leftAt: null };
    }
    case "declined":
      return { node: afterDeclined(tree, step.treeNode, unit) ?? null, leftAt: null };
    case "done":
      return { node: afterDone(tree, step.treeNode, unit) ?? null, leftAt: null };
    case "entered":
      return { node: settleNode(tree, step.treeNode, unit) ?? null, leftAt: null };
    case "left":
      return { node: null, leftAt: findNode(tree, step.treeNode) ?? null };
  }
}

/** The step a walk begins with: the part for a first-look hit that pointed at a rung, else the stopped rung. */
function enter(tree: TreeDocument, state: DiagnosisState): TreeNode | null {
  const hit = state.looks.findLast((look) => look.answer === "hit");
  return (
    enterTree(tree, { lastStage: lastStageOf(state), lookItem: hit?.item }, state.profile ?? undefined) ??
    null
  );
}
