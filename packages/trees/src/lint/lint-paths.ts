import { FIRST_LOOK, decides, getFault, isFaultId, mayApply } from "@emberladder/furnace";
import type { FaultId, VariantCodes } from "@emberladder/furnace";
import { isAsking } from "../document.ts";
import type { AskingNode, TreeDocument, TreeNode } from "../document.ts";
import { settleNode } from "../walk-tree.ts";
import type { TreeUnit } from "../walk-tree.ts";
import { possibleAnswers } from "./possible-answers.ts";
import { reachableNodes } from "./tree-graph.ts";
import type { TreeProblem } from "./tree-problem.ts";

/** Problems of whole walks: causes concluded without a deciding step, and questions asked a second time. */
export function lintPaths(tree: TreeDocument, kinds: readonly VariantCodes[]): TreeProblem[] {
  const problems = kinds.flatMap((codes) => {
    const unit = { codes, options: {} };
    return [...undecidedConclusions(tree, unit), ...foreignConclusions(tree, unit)];
  });
  return [...onePerNode(problems), ...askedTwice(tree)];
}

/** What a tree for several kinds of unit has wrong in each of them is told once. */
function onePerNode(problems: readonly TreeProblem[]): TreeProblem[] {
  const byKey = new Map<string, TreeProblem>();
  for (const problem of problems) {
    const key = `${problem.rule} ${problem.node}`;
    if (!byKey.has(key)) byKey.set(key, problem);
  }
  return [...byKey.values()];
}

/** Steps that follow a node for a unit, each with whether the answer that leads there decides the fault. */
function nextSteps(
  tree: TreeDocument,
  node: TreeNode,
  unit: TreeUnit,
  fault: FaultId,
): [TreeNode, boolean][] {
  const settled = (to: string, isDecided: boolean): [TreeNode, boolean][] => {
    const next = settleNode(tree, to, unit);
    return next ? [[next, isDecided]] : [];
  };
  if (isAsking(node)) {
    return possibleAnswers(node).flatMap(({ evidence, to }) =>
      settled(to, evidence !== null && decides(evidence, fault)),
    );
  }
  return node.kind === "do" ? settled(node.to, false) : [];
}

/** Where a walk may begin, and whether the first-look hit that leads there already decides the fault. */
function beginnings(tree: TreeDocument, unit: TreeUnit, fault: FaultId): [TreeNode, boolean][] {
  return Object.entries(tree.entries).flatMap(([entry, to]): [TreeNode, boolean][] => {
    const node = settleNode(tree, to, unit);
    const item = FIRST_LOOK.find(({ id }) => entry === `look:${id}`);
    const isDecided = item?.hits.every((hit) =>
      decides({ check: hit.check, finding: hit.finding, outcome: "fail" }, fault),
    );
    return node ? [[node, isDecided ?? false]] : [];
  });
}

/**
 * Conclusions that can be reached with nothing on the way that decides the fault. By no path decided is an error:
 * the record could never accept it. By some paths is a warning.
 */
function undecidedConclusions(tree: TreeDocument, unit: TreeUnit): TreeProblem[] {
  const faults = [...new Set(tree.nodes.flatMap((node) => (node.kind === "conclude" ? node.fault : [])))];
  return faults.filter(isFaultId).flatMap((fault): TreeProblem[] => {
    const seen = new Map<string, string | null>();
    const decided = new Set<string>();
    const open: [TreeNode, boolean, string | null][] = beginnings(tree, unit, fault).map(
      ([node, isDecided]) => [node, isDecided, null],
    );
    for (let next = open.pop(); next !== undefined; next = open.pop()) {
      const [node, isDecided, from] = next;
      if (isDecided ? decided.has(node.id) : seen.has(node.id)) continue;
      if (isDecided) decided.add(node.id);
      else seen.set(node.id, from);
      for (const [to, decidesNow] of nextSteps(tree, node, unit, fault))
        open.push([to, isDecided || decidesNow, node.id]);
    }
    return tree.nodes.flatMap((node): TreeProblem[] => {
      if (node.kind !== "conclude" || node.fault !== fault || !seen.has(node.id)) return [];
      const params = { fault, path: pathTo(node.id, seen).join(" > ") };
      return decided.has(node.id)
        ? [{ node: node.id, rule: "conclusion-undecided-on-a-path", severity: "warning", params }]
        : [{ node: node.id, rule: "conclusion-never-decided", severity: "error", params }];
    });
  });
}

function pathTo(id: string, cameFrom: ReadonlyMap<string, string | null>): string[] {
  const path: string[] = [];
  for (let at: string | null | undefined = id; at; at = cameFrom.get(at)) path.unshift(at);
  return path;
}

/** Conclusions that a unit of the tree can walk to although it cannot have that fault. */
function foreignConclusions(tree: TreeDocument, unit: TreeUnit): TreeProblem[] {
  return reachedBy(tree, unit).flatMap((node): TreeProblem[] => {
    if (node.kind !== "conclude" || !isFaultId(node.fault)) return [];
    if (mayApply(getFault(node.fault).applies, unit.codes, unit.options)) return [];
    const params = { fault: node.fault, unit: Object.values(unit.codes).join(" ") };
    return [{ node: node.id, rule: "conclusion-not-of-unit", severity: "warning", params }];
  });
}

/** The steps that walks of one unit can come to. */
function reachedBy(tree: TreeDocument, unit: TreeUnit): TreeNode[] {
  const reached = new Map<string, TreeNode>();
  const open = Object.values(tree.entries);
  for (let id = open.pop(); id !== undefined; id = open.pop()) {
    const node = settleNode(tree, id, unit);
    if (!node || reached.has(node.id)) continue;
    reached.set(node.id, node);
    if (isAsking(node)) open.push(...possibleAnswers(node).map(({ to }) => to));
    else if (node.kind === "do") open.push(node.to);
  }
  return [...reached.values()];
}

/** What a step asks about: the same check, taken the same way at the same place in the sequence. */
function quantityOf({ check, way, stage }: AskingNode): string {
  return [check, way ?? "", stage ?? ""].join(" ");
}

/** Questions that come a second time with nothing done between: the first answer still stands. */
function askedTwice(tree: TreeDocument): TreeProblem[] {
  const reached = reachableNodes(tree);
  const asking = tree.nodes.filter(isAsking).filter((node) => reached.has(node.id));
  return asking.flatMap((first): TreeProblem[] => {
    const seen = new Set<string>();
    const again: TreeProblem[] = [];
    const open = possibleAnswers(first).map(({ to }) => to);
    for (let id = open.pop(); id !== undefined; id = open.pop()) {
      const node = settleNode(tree, id);
      if (!node || seen.has(node.id) || node.id === first.id || node.kind === "do") continue;
      seen.add(node.id);
      if (!isAsking(node)) continue;
      if (quantityOf(node) === quantityOf(first)) {
        const params = { check: node.check, first: first.id };
        again.push({ node: node.id, rule: "asked-twice", severity: "error", params });
      }
      open.push(...possibleAnswers(node).map(({ to }) => to));
    }
    return again;
  });
}
