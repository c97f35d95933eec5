/**
 * The six variant codes, the option flags and the stages: the closed vocabularies that every other part of
 * the product names units and sequences with. Codes are ids and never shown; words live in `@emberladder/words`.
 */

/** Ignition: standing pilot, intermittent pilot by spark or hot surface, direct hot surface, direct spark. */
export const IGNITIONS = ["SP", "IPS", "IPH", "HSI", "DSI"] as const;
/** Draft: natural, induced with pressure switch, induced with centrifugal switch, condensing. */
export const DRAFTS = ["ND", "IDP", "IDC", "CON"] as const;
/** Staging: one stage, two stages, modulating. */
export const STAGINGS = ["1S", "2S", "MOD"] as const;
/** Location: indoor, attic or crawl space, packaged rooftop. */
export const LOCATIONS = ["IND", "ATT", "RTU"] as const;
/** Control: integrated board, separate ignition module, valve-mounted control, conventional. */
export const CONTROLS = ["IFC", "MOD-S", "VMC", "CV"] as const;
/** Fuel: natural gas, propane. */
export const FUELS = ["NG", "LP"] as const;

export type Ignition = (typeof IGNITIONS)[number];
export type Draft = (typeof DRAFTS)[number];
export type Staging = (typeof STAGINGS)[number];
export type Location = (typeof LOCATIONS)[number];
export type Control = (typeof CONTROLS)[number];
export type Fuel = (typeof FUELS)[number];

/** The six codes that name a kind of unit. */
export interface VariantCodes {
  ignition: Ignition;
  draft: Draft;
  staging: Staging;
  location: Location;
  control: Control;
  fuel: Fuel;
}

/** Option flags of a unit. Each is true, false, or not stated (unknown). */
export const OPTION_FLAGS = [
  "vent-damper",
  "ac-coil",
  "psc-inducer",
  "psc-blower",
  "ecm-blower",
  "belt-blower",
  "twinned",
  "three-phase",
  "downflow",
  "economizer",
  "bas",
  "smoke",
  "low-limit",
  "airflow-switch",
  "electromech-stat",
  "stat-battery",
  "lv-fuse",
  "overflow",
  "condensate-pump",
  "direct-vent",
  "fusible-link",
  "multi-burner",
  "multi-tap",
  "altitude",
  "gas-meter",
  "start-check",
  "zoned",
  "tc-cutout",
  "transformer-breaker",
  "gfci",
] as const;
export type OptionFlag = (typeof OPTION_FLAGS)[number];
export type Options = Partial<Record<OptionFlag, boolean>>;

/** The stages of one heat cycle, in order from the foot of the ladder. Common practice, no single source. */
export const STAGES = [
  "power",
  "call",
  "safeties",
  "draft-rest",
  "inducer",
  "draft-proved",
  "prepurge",
  "ignition-source",
  "gas",
  "lightoff",
  "flame-proved",
  "main-burner",
  "blower-on",
  "steady",
  "satisfied",
] as const;
export type Stage = (typeof STAGES)[number];

/** The last stage completed by a call or left by a fault: `none` = not even power, `any` = not watched. */
export const LAST_STAGES = ["none", ...STAGES, "any"] as const;
export type LastStage = (typeof LAST_STAGES)[number];

/** Where a reading is taken: a stage, between calls (`idle`), in lockout, or not tied to a stage. */
export const READING_STAGES = ["idle", ...STAGES, "lockout", "any"] as const;
export type ReadingStage = (typeof READING_STAGES)[number];

/** Severity of a fault and how a manual-reset device was met; only last-stage conditions use them. */
export type Severity = "full" | "partial";
export type FoundState = "as-found" | "on-run";

/** Units a reading may carry, as stored. The value is never converted in the record. */
export const READING_UNITS = [
  "V",
  "mV",
  "uA",
  "A",
  "ohm",
  "Mohm",
  "inwc",
  "in",
  "F",
  "ppm",
  "pct",
  "s",
  "CFM",
  "cfh",
  "uF",
  "pctPlate",
  "count",
] as const;
export type ReadingUnit = (typeof READING_UNITS)[number];

/** Class of an observation: good, marginal, fail. */
export const OUTCOMES = ["good", "marginal", "fail"] as const;
export type Outcome = (typeof OUTCOMES)[number];
