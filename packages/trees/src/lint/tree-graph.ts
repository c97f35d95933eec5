import { CONTROLS, DRAFTS, FUELS, IGNITIONS, LOCATIONS, STAGINGS } from "@emberladder/furnace";
import {
  VariantSyntaxError,
  evaluateVariant,
  parseVariant,
  profileProblems,
  unitProfileSchema,
} from "@emberladder/furnace";
import type { VariantCodes, VariantExpr } from "@emberladder/furnace";
import { isAsking } from "../document.ts";
import type { TreeDocument, TreeNode } from "../document.ts";

/** Where a node leads to, in the order it is written; a target may be named more than once. */
export function targetsOf(node: TreeNode): string[] {
  if (isAsking(node)) {
    return [
      ...node.branches.map((branch) => branch.to),
      node.otherwise,
      ...(node.cannot ? [node.cannot] : []),
    ];
  }
  return node.kind === "do" || node.kind === "go-to" ? [node.to] : [];
}

/** Nodes that some entry leads to, as the document is written: no unit passes over any step. */
export function reachableNodes(tree: TreeDocument): Set<string> {
  const byId = nodesById(tree);
  const reached = new Set<string>();
  const open = Object.values(tree.entries);
  for (let id = open.pop(); id !== undefined; id = open.pop()) {
    const node = byId.get(id);
    if (!node || reached.has(id)) continue;
    reached.add(id);
    open.push(...targetsOf(node));
  }
  return reached;
}

/** The nodes of a tree by id; the first one counts where an id is there twice. */
export function nodesById(tree: TreeDocument): Map<string, TreeNode> {
  const byId = new Map<string, TreeNode>();
  for (const node of tree.nodes) if (!byId.has(node.id)) byId.set(node.id, node);
  return byId;
}

/** The written units of a tree as an expression; undefined where it cannot be read. */
export function readApplies(tree: TreeDocument): VariantExpr | undefined {
  try {
    return parseVariant(tree.applies);
  } catch (error) {
    if (error instanceof VariantSyntaxError) return undefined;
    throw error;
  }
}

/** Every combination of the six codes, those that no real unit has included. */
const EVERY_COMBINATION: VariantCodes[] = IGNITIONS.flatMap((ignition) =>
  DRAFTS.flatMap((draft) =>
    STAGINGS.flatMap((staging) =>
      LOCATIONS.flatMap((location) =>
        CONTROLS.flatMap((control) =>
          FUELS.map((fuel) => ({ ignition, draft, staging, location, control, fuel })),
        ),
      ),
    ),
  ),
);

/** The kinds of unit a tree is for, of those that can exist; an option that its expression asks for is taken as there. */
export function kindsOf(applies: VariantExpr): VariantCodes[] {
  return EVERY_COMBINATION.filter(
    (codes) => evaluateVariant(applies, { codes, options: {} }) !== false,
  ).filter((codes) => profileProblems(unitProfileSchema.parse({ codes })).length === 0);
}
