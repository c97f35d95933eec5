/** What is wrong with a tree; the ids are stable and their words live in the message catalogues. */
export const TREE_RULES = [
  "applies-unreadable",
  "applies-to-no-unit",
  "duplicate-id",
  "target-missing",
  "unreachable",
  "go-to-loop",
  "cycle-without-act",
  "asked-twice",
  "check-unknown",
  "check-cannot-apply",
  "way-unknown",
  "stage-unusual",
  "finding-unknown",
  "finding-of-other-check",
  "unit-of-other-check",
  "fault-unknown",
  "fault-cannot-apply",
  "symptom-concluded",
  "branch-never-taken",
  "branch-same-as-otherwise",
  "numbers-of-one-fuel",
  "numbers-of-other-fuel",
  "cannot-concludes",
  "entry-unknown",
  "entry-missing",
  "entry-never-used",
  "entry-without-end",
  "conclusion-never-decided",
  "conclusion-undecided-on-a-path",
  "conclusion-not-of-unit",
] as const;
export type TreeRule = (typeof TREE_RULES)[number];

/** One problem of a tree. An error keeps a tree from being published; a warning is for its author to weigh. */
export interface TreeProblem {
  /** The node at fault; none where it is the tree as a whole. */
  node?: string;
  rule: TreeRule;
  severity: "error" | "warning";
  params: Record<string, string>;
}
