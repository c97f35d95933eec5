import type { TreeDocument, TreeNode } from "../document.ts";
import { nodesById, reachableNodes, targetsOf } from "./tree-graph.ts";
import type { TreeProblem } from "./tree-problem.ts";

/** Problems of the document as a graph: ids, targets, what cannot be reached, and walks that never end. */
export function lintStructure(tree: TreeDocument): TreeProblem[] {
  const byId = nodesById(tree);
  const reached = reachableNodes(tree);
  return [
    ...duplicates(tree),
    ...danglingTargets(tree, byId),
    ...tree.nodes
      .filter((node) => !reached.has(node.id))
      .map((node): TreeProblem => ({ node: node.id, rule: "unreachable", severity: "warning", params: {} })),
    ...loops(byId),
    ...endlessEntries(tree, byId),
  ];
}

function duplicates(tree: TreeDocument): TreeProblem[] {
  const seen = new Set<string>();
  return tree.nodes.flatMap(({ id }): TreeProblem[] => {
    if (seen.has(id)) return [{ node: id, rule: "duplicate-id", severity: "error", params: { id } }];
    seen.add(id);
    return [];
  });
}

function danglingTargets(tree: TreeDocument, byId: Map<string, TreeNode>): TreeProblem[] {
  const missing = (to: string, params: Record<string, string>, node?: string): TreeProblem[] =>
    byId.has(to) ? [] : [{ node, rule: "target-missing", severity: "error", params: { ...params, to } }];
  return [
    ...Object.entries(tree.entries).flatMap(([entry, to]) => missing(to, { entry })),
    ...tree.nodes.flatMap((node) => [...new Set(targetsOf(node))].flatMap((to) => missing(to, {}, node.id))),
  ];
}

/**
 * Circles in which nothing is done to the unit: the same question would come round with the same answer. A circle
 * of go-to nodes alone cannot even be walked.
 */
function loops(byId: Map<string, TreeNode>): TreeProblem[] {
  const problems: TreeProblem[] = [];
  const done = new Set<string>();
  const visit = (id: string, path: string[]): void => {
    const node = byId.get(id);
    if (!node || node.kind === "do" || done.has(id)) return;
    const at = path.indexOf(id);
    if (at >= 0) {
      const circle = path.slice(at);
      const onlyGoTo = circle.every((step) => byId.get(step)?.kind === "go-to");
      problems.push({
        node: id,
        rule: onlyGoTo ? "go-to-loop" : "cycle-without-act",
        severity: "error",
        params: { circle: [...circle, id].join(" > ") },
      });
      return;
    }
    for (const to of new Set(targetsOf(node))) visit(to, [...path, id]);
    done.add(id);
  };
  for (const [id, node] of byId) {
    if (node.kind === "do") for (const to of targetsOf(node)) visit(to, []);
    else visit(id, []);
  }
  return problems;
}

/** Entries from which no conclusion and no hand-over can be reached. */
function endlessEntries(tree: TreeDocument, byId: Map<string, TreeNode>): TreeProblem[] {
  return Object.entries(tree.entries).flatMap(([entry, start]): TreeProblem[] => {
    const from = reachableNodes({ ...tree, entries: { [entry]: start } });
    const ends = [...from].some((id) => ["conclude", "hand-over"].includes(byId.get(id)?.kind ?? ""));
    return ends ? [] : [{ node: start, rule: "entry-without-end", severity: "error", params: { entry } }];
  });
}
