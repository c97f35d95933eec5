import { z } from "zod";
import { OUTCOMES, PUT_BACK_KINDS, READING_STAGES, READING_UNITS } from "@emberladder/furnace";

/** Fields that several event bodies share. Ids are checked for shape here and for sense by the rules. */
export const slug = z
  .string()
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)
  .max(64);
export const checkId = z
  .string()
  .regex(/^ck-[a-z0-9]+(-[a-z0-9]+)*$/)
  .max(64);
export const eventId = z.uuid();
/** Reference to a free text kept beside the event: SHA-256 of salt and text, see `noteHash`. */
export const noteRef = z.string().regex(/^[0-9a-f]{64}$/);
export const number = z.number().min(-1e9).max(1e9);
/** A reading may be "OL", beyond the meter's range: stored as the word, counted as infinity. */
export const readingValue = z.union([number, z.literal("OL")]);
export const stage = z.enum(READING_STAGES);
export const outcome = z.enum(OUTCOMES);
export const unit = z.enum(READING_UNITS);
export const seconds = z.number().min(0).max(86_400);

export const POWER_STATES = ["on", "off"] as const;
export const GAS_STATES = ["open", "shut"] as const;

/** State of the unit in which something was read: a number without it is not evidence. */
export const unitState = z.strictObject({
  power: z.enum(POWER_STATES),
  gas: z.enum(GAS_STATES),
  calling: z.boolean(),
});
export type UnitState = z.infer<typeof unitState>;

/** What the screen showed when an answer was given. Replay draws this and nothing recomputed. */
export const shown = z.strictObject({
  check: checkId.optional(),
  treeNode: slug.optional(),
  bandUsed: z.string().max(200).optional(),
  unitState: unitState.optional(),
  /** The five likeliest causes in whole percent and the next checks, once they are computed. */
  causes: z
    .array(z.strictObject({ fault: slug, percent: z.number().int().min(0).max(100) }))
    .max(6)
    .optional(),
  next: z.array(checkId).max(6).optional(),
  versions: z.strictObject({ catalogue: z.string().max(40), tree: z.string().max(80).optional() }).optional(),
});

/** One thing opened, lifted or fitted, which has to go back before the diagnosis can close. */
export const opening = z.strictObject({
  kind: z.enum(PUT_BACK_KINDS),
  /** What, as an id with words: burner-door, igniter-plug, manifold-tap ... */
  what: slug,
  /** A joint or tap: which side of the valve's seat, for the leak check. */
  side: z.enum(["up", "down"]).optional(),
  /** A jumper: the device it bridges, and the seconds it may stay. */
  device: slug.optional(),
  limitS: seconds.optional(),
});
export type OpeningBody = z.infer<typeof opening>;
