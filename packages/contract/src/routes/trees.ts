import { z } from "zod";
import { defineContract } from "../route-contract.ts";
import { idField, momentField } from "../schemas/fields.ts";

const tag = "Decision trees";

const versionSchema = z.strictObject({
  version: z.number().int(),
  publishedAt: momentField,
  publishedBy: z.string().nullable(),
  note: z.string().nullable(),
  inForce: z.boolean(),
});

export const treeSchema = z
  .strictObject({
    id: idField,
    slug: z.string(),
    name: z.string(),
    /** The version in force; null where none is. */
    versionInForce: z.number().int().nullable(),
    versions: z.array(versionSchema),
  })
  .meta({ id: "Tree" });

export const listTrees = defineContract({
  method: "get",
  path: "/api/trees",
  access: "tree:read",
  tag,
  summary: "The company's decision trees with their published versions.",
  answer: { kind: "json", status: 200, schema: z.strictObject({ items: z.array(treeSchema) }) },
});

export const treeVersionSchema = z
  .strictObject({
    treeId: idField,
    slug: z.string(),
    name: z.string(),
    version: z.number().int(),
    publishedAt: momentField,
    /** SHA-256 of the document's text, as diagnoses pin it. */
    hash: z.string(),
    /** Decision-tree document v1. Immutable once published. */
    document: z.record(z.string(), z.unknown()),
  })
  .meta({ id: "TreeVersion" });

export const readTreeVersion = defineContract({
  method: "get",
  path: "/api/trees/{treeId}/versions/{version}",
  access: "tree:read",
  tag,
  summary: "One published version with its document.",
  params: z.strictObject({ treeId: idField, version: z.coerce.number().int().min(1) }),
  answer: { kind: "json", status: 200, schema: treeVersionSchema },
  errors: ["not-found"],
});
