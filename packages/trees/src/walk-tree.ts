import { getCheck, isCheckId, mayApply } from "@emberladder/furnace";
import type { LastStage, Options, Outcome, ReadingUnit, VariantCodes } from "@emberladder/furnace";
import { isAsking } from "./document.ts";
import type { AskingNode, TreeBranch, TreeDocument, TreeNode } from "./document.ts";

/** What a branch is chosen by. */
export interface TreeAnswer {
  outcome?: Outcome;
  finding?: string;
  value?: number;
  unit?: ReadingUnit;
}

/** What a walk has to know of the unit, so that no question is asked that the unit cannot answer. */
export interface TreeUnit {
  codes: VariantCodes;
  options: Options;
}

/** Finds a node by id; undefined where the document does not have it. */
export function findNode(tree: TreeDocument, id: string): TreeNode | undefined {
  return tree.nodes.find((node) => node.id === id);
}

/** Whether a step asks for a check that the unit cannot have; an option it does not state may be there. */
export function isBesideUnit(node: TreeNode, unit: TreeUnit | undefined): node is AskingNode {
  if (!unit || !isAsking(node) || !isCheckId(node.check)) return false;
  return !mayApply(getCheck(node.check).applies, unit.codes, unit.options);
}

/**
 * Follows go-to nodes to the node that is really meant. With a unit, a step whose check that unit cannot have is
 * passed over: it is left as if it could not be done. A chain that comes back on itself ends in undefined rather
 * than in a loop; `lintTree` reports it.
 */
export function settleNode(
  tree: TreeDocument,
  id: string | undefined,
  unit?: TreeUnit,
): TreeNode | undefined {
  const seen = new Set<string>();
  let current = id === undefined ? undefined : findNode(tree, id);
  while (current) {
    let next: string;
    if (current.kind === "go-to") next = current.to;
    else if (isBesideUnit(current, unit)) next = current.cannot ?? current.otherwise;
    else return current;
    if (seen.has(current.id)) return undefined;
    seen.add(current.id);
    current = findNode(tree, next);
  }
  return undefined;
}

/**
 * Where a walk begins: at the part that answers a first-look item, else at the rung the unit stopped at
 * (`lastStage` is the last one completed), else at the entry for a unit that was not watched.
 */
export function enterTree(
  tree: TreeDocument,
  at: { lastStage: LastStage; lookItem?: string },
  unit?: TreeUnit,
): TreeNode | undefined {
  const key = at.lookItem && tree.entries[`look:${at.lookItem}`] ? `look:${at.lookItem}` : at.lastStage;
  return settleNode(tree, tree.entries[key] ?? tree.entries["any"], unit);
}

function takes(branch: TreeBranch, answer: TreeAnswer): boolean {
  if (branch.on === "finding") return branch.finding === answer.finding;
  if (branch.on === "class") return branch.outcome === answer.outcome;
  if (answer.value === undefined || answer.unit !== branch.unit) return false;
  return (branch.min ?? -Infinity) <= answer.value && answer.value < (branch.max ?? Infinity);
}

const PRECEDENCE: TreeBranch["on"][] = ["finding", "class", "range"];

/** The branch an answer takes: by finding first, then by class, then by value; undefined means otherwise. */
export function chooseBranch(node: AskingNode, answer: TreeAnswer): TreeBranch | undefined {
  for (const on of PRECEDENCE) {
    const branch = node.branches.find((candidate) => candidate.on === on && takes(candidate, answer));
    if (branch) return branch;
  }
  return undefined;
}

/** The node after an answered one. */
export function afterAnswer(
  tree: TreeDocument,
  nodeId: string,
  answer: TreeAnswer,
  unit?: TreeUnit,
): TreeNode | undefined {
  const node = settleNode(tree, nodeId);
  if (!node || !isAsking(node)) return undefined;
  return settleNode(tree, chooseBranch(node, answer)?.to ?? node.otherwise, unit);
}

/** The node after one that could not be done here. */
export function afterDeclined(tree: TreeDocument, nodeId: string, unit?: TreeUnit): TreeNode | undefined {
  const node = settleNode(tree, nodeId);
  if (!node || !isAsking(node)) return undefined;
  return settleNode(tree, node.cannot ?? node.otherwise, unit);
}

/** The node after a `do` node. */
export function afterDone(tree: TreeDocument, nodeId: string, unit?: TreeUnit): TreeNode | undefined {
  const node = settleNode(tree, nodeId);
  return node?.kind === "do" ? settleNode(tree, node.to, unit) : undefined;
}
