import {
  boolean,
  foreignKey,
  index,
  int,
  json,
  mysqlTable,
  uniqueIndex,
  varchar,
} from "drizzle-orm/mysql-core";
import { code, createdAt, exactText, hex64, id, moment, name, uuid } from "./columns.ts";
import { companies, people } from "./companies.ts";

/** Work for the worker. A claim is a lease: a worker that dies gives its job back when the lease runs out. */
export const jobs = mysqlTable(
  "jobs",
  {
    id: id(),
    companyId: uuid("company_id").references(() => companies.id),
    kind: code("kind", { length: 40 }).notNull(),
    /** Ids only: no secret and no address waits in here. */
    payload: json("payload").$type<Record<string, string>>().notNull(),
    state: code("state", { length: 12 })
      .$type<"waiting" | "running" | "done" | "cancelled" | "dead">()
      .notNull(),
    attempts: int("attempts").notNull(),
    progress: int("progress").notNull(),
    runAfter: moment("run_after").notNull(),
    leaseUntil: moment("lease_until"),
    lastError: varchar("last_error", { length: 200 }),
    createdAt: createdAt(),
    finishedAt: moment("finished_at"),
  },
  (t) => [index("jobs_next").on(t.state, t.runAfter), index("jobs_company").on(t.companyId, t.createdAt)],
);

/** Decision trees of a company. */
export const trees = mysqlTable(
  "trees",
  {
    id: id(),
    companyId: uuid("company_id")
      .notNull()
      .references(() => companies.id),
    slug: code("slug", { length: 80 }).notNull(),
    name: name().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    uniqueIndex("trees_company").on(t.companyId, t.id),
    uniqueIndex("trees_slug").on(t.companyId, t.slug),
  ],
);

/** Published versions; a published document never changes. */
export const treeVersions = mysqlTable(
  "tree_versions",
  {
    id: id(),
    companyId: uuid("company_id").notNull(),
    treeId: uuid("tree_id").notNull(),
    version: int("version").notNull(),
    /** The document's canonical text (RFC 8785). */
    document: exactText("document").notNull(),
    hash: hex64("hash").notNull(),
    inForce: boolean("in_force").notNull(),
    note: varchar("note", { length: 500 }),
    authorId: uuid("author_id").references(() => people.id),
    publishedBy: uuid("published_by").references(() => people.id),
    publishedAt: moment("published_at").notNull(),
  },
  (t) => [
    uniqueIndex("tree_versions_number").on(t.treeId, t.version),
    foreignKey({
      name: "tree_versions_tree",
      columns: [t.companyId, t.treeId],
      foreignColumns: [trees.companyId, trees.id],
    }),
  ],
);
