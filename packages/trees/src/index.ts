export * from "./document.ts";
export * from "./walk-tree.ts";
