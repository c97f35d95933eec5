import { isFaultId } from "@emberladder/furnace";
import type { FaultId } from "@emberladder/furnace";
import type { TreeDocument } from "./document.ts";
import { lintBranches } from "./lint/lint-branches.ts";
import { lintCatalogue } from "./lint/lint-catalogue.ts";
import { lintEntries } from "./lint/lint-entries.ts";
import { lintPaths } from "./lint/lint-paths.ts";
import { lintStructure } from "./lint/lint-structure.ts";
import { kindsOf, reachableNodes, readApplies } from "./lint/tree-graph.ts";
import type { TreeProblem } from "./lint/tree-problem.ts";

/**
 * Holds a tree against itself and against the catalogue, for every kind of unit it is for. A tree with an error
 * cannot be published; the problems come in a stable order, errors first.
 */
export function lintTree(tree: TreeDocument): TreeProblem[] {
  const applies = readApplies(tree);
  const kinds = applies ? kindsOf(applies) : [];
  const problems = [...lintStructure(tree)];
  if (!applies) problems.push(whole("applies-unreadable", { applies: tree.applies }));
  else if (kinds.length === 0) problems.push(whole("applies-to-no-unit", { applies: tree.applies }));
  else {
    problems.push(...lintCatalogue(tree, kinds), ...lintBranches(tree, kinds), ...lintEntries(tree, kinds));
    // Walks over a broken graph would only tell of the break again.
    if (!problems.some(({ rule }) => rule === "target-missing" || rule === "go-to-loop")) {
      problems.push(...lintPaths(tree, kinds));
    }
  }
  const rank = { error: 0, warning: 1 };
  return problems.toSorted((a, b) => rank[a.severity] - rank[b.severity]);
}

function whole(rule: TreeProblem["rule"], params: Record<string, string>): TreeProblem {
  return { rule, severity: "error", params };
}

/** The faults that a tree can conclude, each once, in the order of the document. */
export function treeConclusions(tree: TreeDocument): FaultId[] {
  const reached = reachableNodes(tree);
  const faults = tree.nodes.flatMap((node) =>
    node.kind === "conclude" && reached.has(node.id) && isFaultId(node.fault) ? [node.fault] : [],
  );
  return [...new Set(faults)];
}
