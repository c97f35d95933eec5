import type { CheckId, FaultId, FindingIdOf, Outcome, ReadingStage } from "@emberladder/furnace";
import type { TreeBranch, TreeNode } from "../document.ts";

/** Short forms for writing a tree by hand: an id of the catalogue that is wrong does not compile. */

type Extra = {
  minutes?: number;
  safety?: string;
  note?: string;
  stage?: ReadingStage;
  way?: string;
  cannot?: string;
};

/** Branches of one check: by finding, then by class. Each names the node it goes to. */
export type Answers<C extends CheckId> = { [F in FindingIdOf<C>]?: string } & {
  [O in Outcome as `is-${O}`]?: string;
};

function branchesOf(answers: Record<string, string | undefined>): TreeBranch[] {
  return Object.entries(answers).flatMap(([key, to]): TreeBranch[] => {
    if (to === undefined) return [];
    if (key === "is-good" || key === "is-marginal" || key === "is-fail") {
      return [{ on: "class", outcome: key.slice(3) as Outcome, to }];
    }
    return [{ on: "finding", finding: key, to }];
  });
}

/** A reading to take. */
export function read<C extends CheckId>(
  id: string,
  check: C,
  answers: Answers<C>,
  otherwise: string,
  extra: Extra = {},
): TreeNode {
  return { kind: "check", id, check, branches: branchesOf(answers), otherwise, ...extra };
}

/** Something to look at. */
export function look<C extends CheckId>(
  id: string,
  check: C,
  answers: Answers<C>,
  otherwise: string,
  extra: Extra = {},
): TreeNode {
  return { kind: "look", id, check, branches: branchesOf(answers), otherwise, ...extra };
}

type DoNode = Extract<TreeNode, { kind: "do" }>;

/** Something to do, what it changes on the unit, and what it takes off or out. */
export function act(
  id: string,
  words: string,
  to: string,
  extra: Pick<DoNode, "note" | "safety" | "minutes" | "sets" | "opens"> = {},
): TreeNode {
  return { kind: "do", id, act: words, to, ...extra };
}

/** A cause, under the id `is-<fault>`. */
export function conclude(fault: FaultId, note?: string): TreeNode {
  return { kind: "conclude", id: `is-${fault}`, fault, ...(note ? { note } : {}) };
}

/** Where the procedure ends without a cause. */
export function handOver(
  id: string,
  whom: Extract<TreeNode, { kind: "hand-over" }>["whom"],
  say: string,
): TreeNode {
  return { kind: "hand-over", id, whom, say };
}
