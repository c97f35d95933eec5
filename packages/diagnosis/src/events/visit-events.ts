import { z } from "zod";
import { unitProfileSchema } from "@emberladder/furnace";
import {
  checkId,
  GAS_STATES,
  number,
  noteRef,
  outcome,
  POWER_STATES,
  readingValue,
  seconds,
  slug,
} from "./fields.ts";

/** Bodies of the events up to the end of the watch, schema version 1. */
export const visitEvents = {
  /** A diagnosis begins; pins the profile and the versions it is judged by. */
  "diagnosis.opened": z.strictObject({
    callId: z.uuid(),
    unitId: z.uuid(),
    profile: unitProfileSchema,
    tree: z
      .strictObject({ id: z.uuid(), version: z.number().int().min(1), hash: z.string().max(64) })
      .nullable(),
    catalogueVersion: z.string().max(40),
    modelVersion: z.string().max(40),
  }),
  /** One of the door's questions answered. */
  "door.answered": z.discriminatedUnion("question", [
    z.strictObject({
      question: z.literal("people"),
      unwell: z.boolean(),
      alarm: z.boolean(),
      coPpm: z.number().min(0).max(100_000).optional(),
    }),
    z.strictObject({
      question: z.literal("smell"),
      smell: z.boolean(),
      lelPct: z.number().min(0).max(100).optional(),
    }),
    z.strictObject({
      question: z.literal("way-in"),
      safe: z.boolean(),
      edgeFt: z.number().min(0).max(1000).optional(),
      parapetIn: z.number().min(0).max(240).optional(),
      hatchGuarded: z.boolean().optional(),
    }),
    z.strictObject({
      question: z.literal("at-unit"),
      found: z.array(z.enum(["soot", "under-water", "wet-control", "old-wrap", "cannot-lock"])).max(5),
      cabinetV: z.number().min(0).max(1000).optional(),
    }),
  ]),
  /** A stop rule called from the dock or found on the way, not from a reading. */
  "stop.raised": z.strictObject({ rule: slug, noteRef: noteRef.optional() }),
  /** One act of a stop rule done. */
  "stop.act-recorded": z.strictObject({
    rule: slug,
    act: slug,
    value: number.optional(),
    noteRef: noteRef.optional(),
  }),
  /** Complaint and unit read and found right, or the unit corrected. */
  "unit.confirmed": z.strictObject({
    profile: unitProfileSchema.optional(),
    complaintRef: noteRef.optional(),
  }),
  /** The unit's own state changed by hand: power, gas, call for heat. */
  "unit-state.set": z.strictObject({
    power: z.enum(POWER_STATES).optional(),
    gas: z.enum(GAS_STATES).optional(),
    calling: z.boolean().optional(),
  }),
  /** A first-look item looked at. A hit names the finding it stands for. */
  "look.answered": z.strictObject({
    item: slug,
    answer: z.enum(["right", "hit", "note"]),
    check: checkId.optional(),
    finding: slug.optional(),
    outcome: outcome.optional(),
    value: readingValue.optional(),
    noteRef: noteRef.optional(),
  }),
  /** A call for heat to be watched. Resets unknown is null. */
  "watch.started": z.strictObject({
    resetsBefore: z.number().int().min(0).max(99).nullable(),
    before: z
      .strictObject({
        gasShutS: seconds,
        lelBurnerBoxPct: z.number().min(0).max(100),
        lelVentPct: z.number().min(0).max(100),
      })
      .optional(),
  }),
  /** The highest thing seen so far; what lies under it is passed, not read. */
  "watch.seen": z.strictObject({ sight: slug, atS: seconds }),
  /** How the watch ended. */
  "watch.ended": z.strictObject({
    how: z.enum([
      "flame-lost",
      "no-flame",
      "no-glow",
      "nothing",
      "stopped",
      "locked-out",
      "limit-cut",
      "satisfied",
    ]),
    atS: seconds,
    blowerWithInducer: z.boolean().optional(),
    tries: z.number().int().min(1).max(20).optional(),
  }),
  "watch.skipped": z.strictObject({ why: z.enum(["first-look-settled", "not-safe", "no-power", "told"]) }),
};
