export * from "./document.ts";
export * from "./walk-tree.ts";
export * from "./lint-tree.ts";
export * from "./lint/tree-problem.ts";
export { kindsOf, readApplies } from "./lint/tree-graph.ts";
export { possibleAnswers } from "./lint/possible-answers.ts";
export type { PossibleAnswer } from "./lint/possible-answers.ts";
export * from "./published/hot-surface-induced.ts";
