import { classInBand, isCheckId, resolveBands, unitProfileSchema } from "@emberladder/furnace";
import type { CheckId, Fuel, VariantCodes } from "@emberladder/furnace";
import { isAsking } from "../document.ts";
import type { AskingNode, TreeBranch, TreeDocument } from "../document.ts";
import { nodesById } from "./tree-graph.ts";
import { possibleAnswers } from "./possible-answers.ts";
import type { TreeProblem } from "./tree-problem.ts";

type RangeBranch = Extract<TreeBranch, { on: "range" }>;

function describeBranch(branch: TreeBranch): string {
  if (branch.on === "finding") return branch.finding;
  if (branch.on === "class") return branch.outcome;
  return `${branch.min ?? ""}..${branch.max ?? ""} ${branch.unit}`;
}

/** Branches that no answer can take, that change nothing, or whose numbers belong to another fuel. */
export function lintBranches(tree: TreeDocument, kinds: readonly VariantCodes[]): TreeProblem[] {
  const byId = nodesById(tree);
  return tree.nodes
    .filter(isAsking)
    .flatMap((node) => [
      ...deadBranches(node),
      ...node.branches
        .filter((branch) => isIdle(node, branch))
        .map((branch) =>
          problem(node, "branch-same-as-otherwise", "warning", { branch: describeBranch(branch) }),
        ),
      ...fuelProblems(node, kinds),
      ...(byId.get(node.cannot ?? node.otherwise)?.kind === "conclude"
        ? [problem(node, "cannot-concludes", "error", { to: node.cannot ?? node.otherwise })]
        : []),
    ]);
}

function problem(
  node: AskingNode,
  rule: TreeProblem["rule"],
  severity: TreeProblem["severity"],
  params: Record<string, string>,
): TreeProblem {
  return { node: node.id, rule, severity, params: { check: node.check, ...params } };
}

/**
 * A finding or a span that goes where everything else goes. It counts where it keeps its answer from a later
 * branch; a class branch is the author saying what a good reading means.
 */
function isIdle(node: AskingNode, branch: TreeBranch): boolean {
  if (branch.on === "class" || branch.to !== node.otherwise) return false;
  return (
    branch.on === "range" || node.branches.every((other) => other.on === "finding" || other.to === branch.to)
  );
}

function deadBranches(node: AskingNode): TreeProblem[] {
  // Of a check the catalogue does not have, nothing can be said.
  if (!isCheckId(node.check)) return [];
  const taken = new Set(possibleAnswers(node).flatMap(({ branch }) => branch ?? []));
  return node.branches
    .filter(
      (branch, index) => !taken.has(branch) || (branch.on === "range" && isCovered(node, branch, index)),
    )
    .map((branch) => problem(node, "branch-never-taken", "error", { branch: describeBranch(branch) }));
}

/** Whether a span holds no number, or the earlier spans of the same unit leave none of its numbers over. */
function isCovered(node: AskingNode, span: RangeBranch, index: number): boolean {
  let from = span.min ?? -Infinity;
  const to = span.max ?? Infinity;
  const earlier = node.branches
    .slice(0, index)
    .filter((other): other is RangeBranch => other.on === "range" && other.unit === span.unit)
    .toSorted((a, b) => (a.min ?? -Infinity) - (b.min ?? -Infinity));
  for (const other of earlier) {
    if ((other.min ?? -Infinity) > from) break;
    from = Math.max(from, other.max ?? Infinity);
  }
  return from >= to;
}

/** Spans of a pressure that natural gas and propane class differently, in a tree for both or for the other one. */
function fuelProblems(node: AskingNode, kinds: readonly VariantCodes[]): TreeProblem[] {
  const { check } = node;
  const first = kinds[0];
  if (!isCheckId(check) || !first || bandText(check, first, "NG") === bandText(check, first, "LP")) return [];
  const fuels = [...new Set(kinds.map((codes) => codes.fuel))];
  const spans = node.branches.filter((branch): branch is RangeBranch => branch.on === "range");
  return spans.flatMap((span): TreeProblem[] => {
    const params = { branch: describeBranch(span) };
    if (fuels.length > 1) return [problem(node, "numbers-of-one-fuel", "error", params)];
    const own = fuels[0] ?? "NG";
    const middle = ((span.min ?? span.max ?? 0) + (span.max ?? span.min ?? 0)) / 2;
    const ofOther = classOf(check, first, own === "NG" ? "LP" : "NG", middle) === "good";
    const isWrong = ofOther && ["fail", "stop"].includes(classOf(check, first, own, middle) ?? "");
    return isWrong ? [problem(node, "numbers-of-other-fuel", "error", { ...params, fuel: own })] : [];
  });
}

function bandFor(check: CheckId, codes: VariantCodes, fuel: Fuel) {
  return resolveBands(check, unitProfileSchema.parse({ codes: { ...codes, fuel } })).find(
    ({ unit }) => unit === "inwc",
  );
}

function bandText(check: CheckId, codes: VariantCodes, fuel: Fuel): string | undefined {
  return bandFor(check, codes, fuel)?.text;
}

function classOf(check: CheckId, codes: VariantCodes, fuel: Fuel, value: number): string | undefined {
  const band = bandFor(check, codes, fuel);
  return band && classInBand(band, value);
}
