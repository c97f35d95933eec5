import { z } from "zod";
import {
  checkId,
  eventId,
  noteRef,
  number,
  opening,
  outcome,
  readingValue,
  shown,
  slug,
  stage,
  unit,
} from "./fields.ts";

/** Bodies of the events of checks, the tree and the conclusion, schema version 1. */
export const checkEvents = {
  /** A check begun; what it opens goes on the put-back list by itself. */
  "check.started": z.strictObject({
    check: checkId,
    way: slug.optional(),
    treeNode: slug.optional(),
    opens: z.array(opening).max(8),
  }),
  /** A check answered with a class, a finding, a value, or In V and Out V. */
  "check.answered": z.strictObject({
    check: checkId,
    stage,
    power: z.enum(["ON", "OFF", "ON-idle", "ON-call", "any"]),
    way: slug.optional(),
    outcome: outcome.optional(),
    finding: slug.optional(),
    value: readingValue.optional(),
    unit: unit.optional(),
    inV: number.optional(),
    outV: number.optional(),
    noteRef: noteRef.optional(),
    /** An unlikely value was shown again and confirmed. */
    confirmedUnlikely: z.boolean().optional(),
    /** Taken after a repair of this visit. */
    afterRepair: z.boolean().optional(),
    shown: shown.optional(),
  }),
  "check.declined": z.strictObject({
    check: checkId,
    reason: slug,
    treeNode: slug.optional(),
    noteRef: noteRef.optional(),
  }),
  /** A `do` step of the tree done. */
  "tree.step-done": z.strictObject({ treeNode: slug }),
  /** The tree left for another check, with the reason from the list. */
  "tree.left": z.strictObject({
    treeNode: slug.optional(),
    reason: slug,
    toCheck: checkId.optional(),
    noteRef: noteRef.optional(),
  }),
  /** Back on the tree at a node. */
  "tree.entered": z.strictObject({ treeNode: slug }),
  /** The cause, with the events that show it. */
  "cause.concluded": z.strictObject({
    cause: slug,
    also: z.array(slug).max(4).optional(),
    evidence: z.array(eventId).max(40),
    /** False where nothing was proven: the record says so and what is left to find out. */
    proven: z.boolean(),
    rootCause: z
      .strictObject({
        fault: slug.optional(),
        soughtAllClean: z.boolean().optional(),
        noteRef: noteRef.optional(),
      })
      .optional(),
    openQuestionRef: noteRef.optional(),
  }),
};
