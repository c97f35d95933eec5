import { z } from "zod";
import { TOUCH_ROWS } from "@emberladder/furnace";
import { eventId, noteRef, number, opening, slug, unit } from "./fields.ts";

export const OUTCOMES_OF_VISIT = ["fixed", "part-needed", "shut-off", "referred", "not-found"] as const;
export type VisitOutcome = (typeof OUTCOMES_OF_VISIT)[number];

/** Bodies of the events from the repair to the report, schema version 1. */
export const closingEvents = {
  "repair.recorded": z.strictObject({
    /** Repairs done, by id: clean-flame-sensor, replace-igniter ... */
    done: z.array(slug).max(12),
    parts: z
      .array(
        z.strictObject({
          part: slug,
          quantity: z.number().int().min(1).max(99),
          state: z.enum(["fitted", "ordered"]),
          noteRef: noteRef.optional(),
        }),
      )
      .max(12),
    touched: z.array(z.enum(TOUCH_ROWS)).max(9),
    noteRef: noteRef.optional(),
  }),
  /** Something opened by hand that no check opened. */
  "put-back.opened": opening,
  /** An entry of the put-back list is back. `of` is the event that opened it, `entry` its place in it. */
  "put-back.restored": z.strictObject({
    of: eventId,
    entry: z.number().int().min(0).max(7),
    powerWasOff: z.boolean().optional(),
  }),
  /** A closing check of the light-off proof. */
  "proof.recorded": z.strictObject({
    closing: z.string().regex(/^close-[a-z]+(-[a-z]+)*$/),
    /** Numbers and counts; a check that is looked at has none. */
    value: number.optional(),
    unit: unit.optional(),
    also: z.record(slug.or(z.string().regex(/^[a-z][A-Za-z]*$/)), z.union([number, z.boolean()])).optional(),
    /** What was seen is right; for a number the pass follows from it. */
    seenRight: z.boolean().optional(),
    noteRef: noteRef.optional(),
  }),
  /** The diagnosis ends. */
  "diagnosis.closed": z.strictObject({
    outcome: z.enum(OUTCOMES_OF_VISIT),
    left: z.strictObject({
      inService: z.boolean(),
      gas: z.enum(["open", "shut", "shut-tagged"]),
      power: z.enum(["on", "off", "off-locked"]),
      tag: z.string().max(40).optional(),
      told: z.boolean().optional(),
    }),
    noteRef: noteRef.optional(),
  }),
  /** The customer's report is asked for; the address is the server's, never in the record. */
  "report.requested": z.strictObject({ to: z.enum(["customer", "nobody"]) }),
  /** An earlier event of this diagnosis taken back. It stays in the record, struck through. */
  "event.undone": z.strictObject({ of: eventId }),
  /** An earlier answer put right; `body` replaces its body, the old one stays in the record. */
  "event.corrected": z.strictObject({
    of: eventId,
    body: z.record(z.string().max(64), z.unknown()),
    reason: z.enum(["typed-wrong", "read-wrong", "wrong-place", "other"]),
    noteRef: noteRef.optional(),
  }),
};
