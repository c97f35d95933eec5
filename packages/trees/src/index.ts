export * from "./document.ts";
export * from "./walk-tree.ts";
export * from "./published/hot-surface-induced.ts";
