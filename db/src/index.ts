export * from "./client.ts";
export * from "./schema/index.ts";
export * from "./sealed-secret.ts";
export * from "./shipped-trees.ts";
export * from "./transaction.ts";
