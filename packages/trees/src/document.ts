import { z } from "zod";
import { OUTCOMES, PUT_BACK_KINDS, READING_STAGES, READING_UNITS } from "@emberladder/furnace";

/**
 * Decision-tree document, version 1: the company's procedure for one kind of unit. The shape is frozen;
 * a change needs a new `format` and a reader for the old one.
 *
 * A tree is entered at the rung the unit stopped at (the last stage completed), or at a first-look hit. Its
 * nodes ask for checks, tell to do something, conclude, go elsewhere or hand over. Ids of checks, findings and
 * faults are those of the catalogue; `lintTree` holds a document against it.
 */
export const TREE_FORMAT = 1;

const nodeId = z.string().regex(/^[a-z0-9][a-z0-9-]{0,63}$/);
const minutes = z.number().min(0).max(240);

const common = {
  id: nodeId,
  /** Minutes this step takes here; the catalogue's figure where it is left out. */
  minutes: minutes.optional(),
  /** One safety line of the author, shown above the catalogue's own hazards. */
  safety: z.string().trim().min(1).max(120).optional(),
  note: z.string().trim().min(1).max(400).optional(),
};

/** Which answers a branch takes: a coded finding, a class, or a span of values in the check's unit. */
export const branchSchema = z.discriminatedUnion("on", [
  z.strictObject({ on: z.literal("finding"), finding: z.string().regex(/^[a-z0-9-]+$/), to: nodeId }),
  z.strictObject({ on: z.literal("class"), outcome: z.enum(OUTCOMES), to: nodeId }),
  z.strictObject({
    on: z.literal("range"),
    unit: z.enum(READING_UNITS),
    /** Least value, included. */
    min: z.number().optional(),
    /** Largest value, not included. */
    max: z.number().optional(),
    to: nodeId,
  }),
]);

const asking = {
  ...common,
  check: z.string().regex(/^ck-[a-z0-9-]+$/),
  /** Where in the sequence it is taken; the catalogue's first stage where it is left out. */
  stage: z.enum(READING_STAGES).optional(),
  way: z
    .string()
    .regex(/^[a-z0-9-]+$/)
    .optional(),
  branches: z.array(branchSchema).max(24),
  /** Where every answer goes that no branch takes. */
  otherwise: nodeId,
  /** Where "Can't do this check" goes; `otherwise` where it is left out. */
  cannot: nodeId.optional(),
};

export const nodeSchema = z.discriminatedUnion("kind", [
  z.strictObject({ kind: z.literal("check"), ...asking }),
  z.strictObject({ kind: z.literal("look"), ...asking }),
  z.strictObject({
    kind: z.literal("do"),
    ...common,
    act: z.string().trim().min(3).max(160),
    /** What the act changes on the unit: recorded with it, so that later readings have their state. */
    sets: z
      .strictObject({
        power: z.enum(["on", "off"]).optional(),
        gas: z.enum(["open", "shut"]).optional(),
        calling: z.boolean().optional(),
      })
      .optional(),
    /** What the act takes off or out: each becomes an entry of the put-back list. */
    opens: z
      .array(z.strictObject({ kind: z.enum(PUT_BACK_KINDS), what: z.string().regex(/^[a-z0-9-]+$/) }))
      .max(4)
      .optional(),
    to: nodeId,
  }),
  z.strictObject({ kind: z.literal("conclude"), ...common, fault: z.string().regex(/^[a-z0-9-]+$/) }),
  z.strictObject({ kind: z.literal("go-to"), ...common, to: nodeId }),
  z.strictObject({
    kind: z.literal("hand-over"),
    ...common,
    /** Who takes over: a senior on the phone, the utility, the gas supplier, an electrician. */
    whom: z.enum(["senior", "utility", "supplier", "electrician", "supervisor"]),
    say: z.string().trim().min(3).max(200),
  }),
]);

/** The stages a tree may be entered at, `none` for a dead unit, and first-look items written `look:<item>`. */
export const entryKeySchema = z.string().regex(/^(none|any|[a-z-]+|look:[a-z-]+)$/);

export const treeDocumentSchema = z.strictObject({
  format: z.literal(TREE_FORMAT),
  id: nodeId,
  title: z.string().trim().min(3).max(120),
  /** Variant expression in its written form: the units this tree is for. */
  applies: z.string().trim().min(1).max(300),
  entries: z.record(entryKeySchema, nodeId),
  nodes: z.array(nodeSchema).min(1).max(600),
});

export type TreeDocument = z.infer<typeof treeDocumentSchema>;
export type TreeNode = z.infer<typeof nodeSchema>;
export type TreeBranch = z.infer<typeof branchSchema>;
export type AskingNode = Extract<TreeNode, { kind: "check" | "look" }>;

/** Whether a node asks for an answer. */
export function isAsking(node: TreeNode): node is AskingNode {
  return node.kind === "check" || node.kind === "look";
}
