import { z } from "zod";
import { CONTROLS, DRAFTS, FUELS, IGNITIONS, LOCATIONS, OPTION_FLAGS, STAGINGS } from "./codes.ts";
import type { VariantCodes } from "./codes.ts";

/**
 * The unit profile: everything the product knows about one unit, from its rating plate and its diagram.
 * Whatever is stated here outranks the default bands of the catalogue; whatever is not stated is unknown.
 */

/** Devices of the 24 V safety chain, in the order in which the unit's own diagram wires them. */
export const CHAIN_DEVICES = [
  "fuse",
  "thermostat",
  "limit",
  "aux-limit",
  "rollout",
  "rollout-2",
  "fusible-link",
  "spill-switch",
  "vent-damper-end-switch",
  "overflow-switch",
  "smoke-contact",
  "airflow-switch",
  "low-limit",
  "pressure-switch",
  "pressure-switch-2",
  "centrifugal-switch",
] as const;
export type ChainDevice = (typeof CHAIN_DEVICES)[number];

/** Where the chain is wired: one series string to the valve, loops read by the board, or the limit in line. */
export const CHAIN_ARRANGEMENTS = ["series", "board-loops", "limit-in-line"] as const;

const positive = z.number().positive();
const seconds = z.number().min(0).max(7200);

export const codesSchema = z.strictObject({
  ignition: z.enum(IGNITIONS),
  draft: z.enum(DRAFTS),
  staging: z.enum(STAGINGS),
  location: z.enum(LOCATIONS),
  control: z.enum(CONTROLS),
  fuel: z.enum(FUELS),
});

export const optionsSchema = z.partialRecord(z.enum(OPTION_FLAGS), z.boolean());

/** Figures of the rating plate and the parts' labels; a reading's band may need one of them. */
export const plateSchema = z.strictObject({
  inputBtuh: positive.max(2_000_000).optional(),
  lowInputBtuh: positive.max(2_000_000).optional(),
  outputBtuh: positive.max(2_000_000).optional(),
  efficiencyPct: positive.max(100).optional(),
  manifoldHighInwc: positive.max(14).optional(),
  manifoldLowInwc: positive.max(14).optional(),
  inletMinInwc: positive.max(28).optional(),
  inletMaxInwc: positive.max(28).optional(),
  riseMinF: positive.max(200).optional(),
  riseMaxF: positive.max(200).optional(),
  staticMaxInwc: positive.max(5).optional(),
  ratedVolts: positive.max(600).optional(),
  phase: z.union([z.literal(1), z.literal(3)]).optional(),
  transformerVa: positive.max(1000).optional(),
  fuseA: positive.max(30).nullable().optional(),
  switchMakeInwc: positive.max(5).optional(),
  highSwitchMakeInwc: positive.max(5).optional(),
  igniterVolts: z.union([z.literal(24), z.literal(80), z.literal(120)]).optional(),
  igniterKind: z.enum(["SiC", "SiN"]).optional(),
  igniterOhmMin: positive.max(10_000).optional(),
  igniterOhmMax: positive.max(10_000).optional(),
  sparkGapMinIn: positive.max(1).optional(),
  sparkGapMaxIn: positive.max(1).optional(),
  dropOutUa: positive.max(100).optional(),
  goodUa: positive.max(100).optional(),
  inducerFlaA: positive.max(100).optional(),
  blowerFlaA: positive.max(100).optional(),
  heatingValueBtuPerFt3: positive.max(4000).optional(),
  /** Least natural draft on the day of the visit, inches of water, negative. */
  draftMinInwc: z.number().max(0).min(-1).optional(),
});

/** Timings of the control in seconds; what the label or the control's sheet says, else the defaults. */
export const timingsSchema = z.strictObject({
  prepurgeS: seconds.optional(),
  warmUpS: seconds.optional(),
  trialS: seconds.optional(),
  blowerOnDelayS: seconds.optional(),
  blowerOffDelayS: seconds.optional(),
  postPurgeS: seconds.optional(),
  interpurgeS: seconds.optional(),
  softLockoutS: seconds.optional(),
  stageTwoDelayS: seconds.optional(),
  tries: z.number().int().min(1).max(10).optional(),
  recycles: z.number().int().min(0).max(10).optional(),
});

/** A band of one check replaced for this unit, with where the new figures come from. */
export const bandOverrideSchema = z.strictObject({
  check: z.string().regex(/^ck-[a-z0-9-]+$/),
  when: z.string().max(60).optional(),
  chain: z.string().max(200),
  source: z.string().trim().min(3).max(200),
});

export const ALTITUDE_RULES = ["4-from-sea-level", "4-above-2000", "2-from-sea-level", "none"] as const;

export const unitProfileSchema = z.strictObject({
  codes: codesSchema,
  options: optionsSchema.default({}),
  plate: plateSchema.default({}),
  timings: timingsSchema.default({}),
  altitudeFt: z.number().min(-1500).max(15_000).optional(),
  /** How input is reduced with altitude; a setting because two readings of the rule circulate. */
  altitudeRule: z.enum(ALTITUDE_RULES).optional(),
  chain: z
    .strictObject({
      arrangement: z.enum(CHAIN_ARRANGEMENTS),
      order: z.array(z.enum(CHAIN_DEVICES)).max(20),
    })
    .optional(),
  bands: z.array(bandOverrideSchema).max(100).default([]),
  /** The last flue CO of this unit, air-free: a fresh one saves taking it again at closing. */
  lastFlueCo: z.strictObject({ date: z.iso.date(), airFreePpm: z.number().min(0).max(10_000) }).optional(),
});

export type UnitProfile = z.infer<typeof unitProfileSchema>;
export type PlateFigures = z.infer<typeof plateSchema>;
export type Timings = z.infer<typeof timingsSchema>;

/** One way in which a profile contradicts itself: the field at fault and a reason code for the words. */
export interface ProfileProblem {
  field: string;
  reason: string;
}

/**
 * Problems of a profile that no real unit can have, such as a board-less standing pilot with a flame sensor
 * label. An empty list means that the profile can exist. Common practice and handbook of variants, no source.
 */
export function profileProblems(profile: UnitProfile): ProfileProblem[] {
  const { codes, options, plate } = profile;
  const problems: ProfileProblem[] = [];
  const refuse = (when: boolean, field: string, reason: string) => {
    if (when) problems.push({ field, reason });
  };
  refuse(
    codes.ignition === "SP" && codes.draft !== "ND",
    "codes.draft",
    "standing-pilot-needs-natural-draft",
  );
  refuse(
    codes.ignition === "SP" && codes.control !== "CV",
    "codes.control",
    "standing-pilot-needs-conventional",
  );
  refuse(
    codes.control === "CV" && codes.ignition !== "SP",
    "codes.control",
    "conventional-has-no-electronic-ignition",
  );
  refuse(isDirect(codes) && codes.draft === "ND", "codes.draft", "direct-ignition-needs-induced-draft");
  refuse(isDirect(codes) && codes.control === "VMC", "codes.control", "valve-mounted-control-lights-a-pilot");
  refuse(
    codes.ignition === "HSI" && codes.control === "MOD-S",
    "codes.control",
    "hot-surface-direct-needs-board",
  );
  refuse(codes.staging === "MOD" && codes.control !== "IFC", "codes.staging", "modulating-needs-board");
  refuse(codes.draft === "ND" && codes.staging !== "1S", "codes.staging", "natural-draft-is-one-stage");
  refuse(codes.draft === "CON" && codes.location === "RTU", "codes.location", "condensing-is-not-rooftop");
  refuse(codes.draft === "CON" && codes.control !== "IFC", "codes.control", "condensing-needs-board");
  refuse(
    options["psc-blower"] === true && options["ecm-blower"] === true,
    "options.ecm-blower",
    "one-blower-kind",
  );
  refuse(
    options["vent-damper"] === true && codes.draft !== "ND",
    "options.vent-damper",
    "vent-damper-needs-natural-draft",
  );
  const ordered = (low: keyof PlateFigures, high: keyof PlateFigures) => {
    const a = plate[low];
    const b = plate[high];
    refuse(typeof a === "number" && typeof b === "number" && a > b, `plate.${low}`, "least-above-most");
  };
  ordered("riseMinF", "riseMaxF");
  ordered("inletMinInwc", "inletMaxInwc");
  ordered("igniterOhmMin", "igniterOhmMax");
  ordered("sparkGapMinIn", "sparkGapMaxIn");
  ordered("dropOutUa", "goodUa");
  ordered("lowInputBtuh", "inputBtuh");
  ordered("outputBtuh", "inputBtuh");
  return problems;
}

/** Whether the main burner is lit directly, with no pilot. */
export function isDirect(codes: VariantCodes): boolean {
  return codes.ignition === "HSI" || codes.ignition === "DSI";
}
