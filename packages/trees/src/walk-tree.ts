import type { LastStage, Outcome, ReadingUnit } from "@emberladder/furnace";
import { isAsking } from "./document.ts";
import type { AskingNode, TreeBranch, TreeDocument, TreeNode } from "./document.ts";

/** What a branch is chosen by. */
export interface TreeAnswer {
  outcome?: Outcome;
  finding?: string;
  value?: number;
  unit?: ReadingUnit;
}

/** Finds a node by id; undefined where the document does not have it. */
export function findNode(tree: TreeDocument, id: string): TreeNode | undefined {
  return tree.nodes.find((node) => node.id === id);
}

/**
 * Follows go-to nodes to the node that is really meant. A chain of go-tos that comes back on itself ends in
 * undefined rather than in a loop; `lintTree` reports it.
 */
export function settleNode(tree: TreeDocument, id: string | undefined): TreeNode | undefined {
  const seen = new Set<string>();
  let current = id === undefined ? undefined : findNode(tree, id);
  while (current?.kind === "go-to") {
    if (seen.has(current.id)) return undefined;
    seen.add(current.id);
    current = findNode(tree, current.to);
  }
  return current;
}

/**
 * Where a walk begins: at the part that answers a first-look item, else at the rung the unit stopped at
 * (`lastStage` is the last one completed), else at the entry for a unit that was not watched.
 */
export function enterTree(
  tree: TreeDocument,
  at: { lastStage: LastStage; lookItem?: string },
): TreeNode | undefined {
  const key = at.lookItem && tree.entries[`look:${at.lookItem}`] ? `look:${at.lookItem}` : at.lastStage;
  return settleNode(tree, tree.entries[key] ?? tree.entries["any"]);
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
export function afterAnswer(tree: TreeDocument, nodeId: string, answer: TreeAnswer): TreeNode | undefined {
  const node = settleNode(tree, nodeId);
  if (!node || !isAsking(node)) return undefined;
  return settleNode(tree, chooseBranch(node, answer)?.to ?? node.otherwise);
}

/** The node after one that could not be done here. */
export function afterDeclined(tree: TreeDocument, nodeId: string): TreeNode | undefined {
  const node = settleNode(tree, nodeId);
  if (!node || !isAsking(node)) return undefined;
  return settleNode(tree, node.cannot ?? node.otherwise);
}

/** The node after a `do` node. */
export function afterDone(tree: TreeDocument, nodeId: string): TreeNode | undefined {
  const node = settleNode(tree, nodeId);
  return node?.kind === "do" ? settleNode(tree, node.to) : undefined;
}
