import { OUTCOMES, findingsOf, getCheck, isCheckId } from "@emberladder/furnace";
import type { Evidence, Outcome } from "@emberladder/furnace";
import { chooseBranch } from "../walk-tree.ts";
import type { AskingNode, TreeBranch } from "../document.ts";

/** One answer that a step can be given, what it is evidence of, and where it leads. */
export interface PossibleAnswer {
  /** Nothing where the step could not be done. */
  evidence: Evidence | null;
  /** The branch it takes; none means otherwise, or the way out for a step that could not be done. */
  branch?: TreeBranch;
  to: string;
}

/** Every finding with each class it may carry; without one, the classes that sight or number can give. */
function observationsOf(node: AskingNode): { finding?: string; outcome?: Outcome }[] {
  if (!isCheckId(node.check)) return [];
  const check = getCheck(node.check);
  const findings = findingsOf(node.check);
  const named = findings.flatMap(({ id, classes }) =>
    classes.length === 0 ? [{ finding: id }] : classes.map((outcome) => ({ finding: id, outcome })),
  );
  const takesNumber = check.reading !== "look";
  // A look fails by what was found; where nothing can be named, by the look itself.
  const bare = takesNumber
    ? OUTCOMES
    : findings.length === 0
      ? (["good", "fail"] as const)
      : (["good"] as const);
  return [
    ...named,
    ...bare.map((outcome) => ({ outcome })),
    ...(check.reading === "in-out" ? [{ finding: "no-path" }] : []),
  ];
}

/**
 * The answers a step can be given, each with where it leads: every finding of its check, the classes of a number,
 * a value in each span the step asks about, and "can't do this check".
 */
export function possibleAnswers(node: AskingNode): PossibleAnswer[] {
  const observed = observationsOf(node).map(({ finding, outcome }) => {
    const branch = chooseBranch(node, { finding, outcome });
    return { evidence: { check: node.check, finding, outcome }, branch, to: branch?.to ?? node.otherwise };
  });
  const spans = node.branches.flatMap((branch) =>
    branch.on === "range" ? [{ evidence: { check: node.check }, branch, to: branch.to }] : [],
  );
  return [...observed, ...spans, { evidence: null, to: node.cannot ?? node.otherwise }];
}
