import {
  CHECK_IDS,
  evaluateVariant,
  getCheck,
  getFault,
  getFinding,
  isCheckId,
  isFaultId,
  isSymptomId,
} from "@emberladder/furnace";
import type { CheckId, VariantCodes, VariantExpr } from "@emberladder/furnace";
import { isAsking } from "../document.ts";
import type { AskingNode, TreeDocument, TreeNode } from "../document.ts";
import type { TreeProblem } from "./tree-problem.ts";

type Report = (
  rule: TreeProblem["rule"],
  params: Record<string, string>,
  severity?: TreeProblem["severity"],
) => TreeProblem;

/** Whether an expression is false for every one of the kinds, whatever options they have. */
function isBesideAll(expr: VariantExpr, kinds: readonly VariantCodes[]): boolean {
  return kinds.every((codes) => evaluateVariant(expr, { codes, options: {} }) === false);
}

/** Checks, findings, ways and faults that the catalogue does not have, or that no unit of the tree can have. */
export function lintCatalogue(tree: TreeDocument, kinds: readonly VariantCodes[]): TreeProblem[] {
  return tree.nodes.flatMap((node) => {
    const report: Report = (rule, params, severity = "error") => ({ node: node.id, rule, severity, params });
    if (isAsking(node)) return lintAsking(node, kinds, report);
    return node.kind === "conclude" ? lintConclusion(node, kinds, report) : [];
  });
}

function lintAsking(node: AskingNode, kinds: readonly VariantCodes[], report: Report): TreeProblem[] {
  const { check: id } = node;
  if (!isCheckId(id)) return [report("check-unknown", { check: id })];
  const check = getCheck(id);
  const problems: TreeProblem[] = [];
  if (isBesideAll(check.applies, kinds)) problems.push(report("check-cannot-apply", { check: id }));
  if (node.way && !check.ways?.some((way) => way.id === node.way)) {
    problems.push(report("way-unknown", { check: id, way: node.way }));
  }
  if (node.stage && !check.stages.includes(node.stage)) {
    problems.push(report("stage-unusual", { check: id, stage: node.stage }, "warning"));
  }
  for (const branch of node.branches) {
    if (branch.on === "finding" && !getFinding(id, branch.finding)) {
      problems.push(report(ruleOfFinding(branch.finding), { check: id, finding: branch.finding }));
    }
    if (branch.on === "range" && !check.units.includes(branch.unit)) {
      problems.push(report("unit-of-other-check", { check: id, unit: branch.unit }));
    }
  }
  return problems;
}

function ruleOfFinding(finding: string): "finding-of-other-check" | "finding-unknown" {
  const isKnown = CHECK_IDS.some((other: CheckId) => getFinding(other, finding));
  return isKnown ? "finding-of-other-check" : "finding-unknown";
}

function lintConclusion(
  node: Extract<TreeNode, { kind: "conclude" }>,
  kinds: readonly VariantCodes[],
  report: Report,
): TreeProblem[] {
  const { fault } = node;
  if (isSymptomId(fault)) return [report("symptom-concluded", { fault })];
  if (!isFaultId(fault)) return [report("fault-unknown", { fault })];
  return isBesideAll(getFault(fault).applies, kinds) ? [report("fault-cannot-apply", { fault })] : [];
}
