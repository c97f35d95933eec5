export { openDatabase } from "./client.ts";
export type { Connection, Database, Queryable, Transaction } from "./client.ts";
export * from "./schema/index.ts";
export * from "./sealed-secret.ts";
export * from "./shipped-trees.ts";
export * from "./transaction.ts";
export { isNothingChanged, writeAtOnce } from "./write-at-once.ts";
