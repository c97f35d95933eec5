import type { Outcome, ReadingStage, ReadingUnit } from "../codes.ts";
import type { FaultId, SymptomId } from "../faults/fault-ids.ts";
import type { StopRuleId } from "../rules/stop-rule-ids.ts";
import type { VariantExpr } from "../variant.ts";
import type { CheckId } from "./check-ids.ts";
import type { Opening } from "./openings.ts";

/** Hazards shown above the action of a check. */
export const HAZARDS = [
  "LV",
  "HVAC",
  "GAS",
  "HOT",
  "FALL",
  "CO",
  "ROT",
  "HV-SPK",
  "CAP",
  "CUT",
  "WATER",
] as const;
export type Hazard = (typeof HAZARDS)[number];

/** State of the unit's power and call in which a check is taken. OFF means locked and proven dead. */
export const POWER_STATES_OF_CHECK = ["ON", "OFF", "ON-idle", "ON-call", "any"] as const;
export type CheckPower = (typeof POWER_STATES_OF_CHECK)[number];

/** What a check is taken with. */
export const INSTRUMENTS = [
  "nose",
  "gas-detector",
  "co-meter",
  "eyes",
  "mirror",
  "lamp",
  "multimeter",
  "ohmmeter",
  "spare-fuse",
  "clamp-meter",
  "hand",
  "stopwatch",
  "insulated-stick",
  "low-z-meter",
  "jumper",
  "building-control-screen",
  "manometer",
  "hand-pump",
  "capacitance-meter",
  "camera",
  "water",
  "draft-gauge",
  "smoke-source",
  "tape-measure",
  "feeler-gauge",
  "millivolt-adapter",
  "microammeter",
  "high-z-meter",
  "brush",
  "tank-gauge",
  "leak-solution",
  "gas-meter-dial",
  "drill-gauge",
  "thermometers",
  "combustion-analyser",
] as const;
export type Instrument = (typeof INSTRUMENTS)[number];

/** What has to be arranged before a check can be taken. Judgement. */
export const SET_UPS = [
  "co-meter-zeroed",
  "power-locked",
  "panel-open",
  "meter-proved",
  "leads-off",
  "call-for-heat",
  "motors-off",
  "ladder-up",
  "gas-shut",
  "meter-in-series",
  "manometer-zeroed",
  "tee-in-tube",
  "tube-off",
  "clamp-on",
  "unplugged",
  "capacitor-discharged",
  "draft-gauge-zeroed",
  "pilot-lit",
  "manometer-on-inlet",
  "others-running",
  "manometer-on-manifold",
  "burner-lit",
  "steady-10-min",
  "analyser-zeroed",
  "steady-5-min",
] as const;
export type SetUp = (typeof SET_UPS)[number];

/**
 * How a check is answered: a number; volts to C on both sides of a 24 V switch or fuse (`in-out`); or a look.
 * A check that reads a number may still be passed or failed on sight, see `passesOnSight`.
 */
export type ReadingKind = "number" | "in-out" | "look";

/** Ways of taking a check, and readings that a check is made of. */
export const WAY_IDS = [
  "by-hand",
  "attended-clamp",
  "imbalance",
  "lowest-pair",
  "in-and-out-volts",
  "fuse-out-ohms",
  "clamp-loop",
  "series-meter",
  "look",
  "ohms",
  "first-stage",
  "high-stage",
  "at-rest",
  "at-speed",
  "by-finger",
  "inducer-out",
  "from-ground",
  "cleanout-open",
  "cap-off",
  "from-outside",
  "screen-out",
  "pour-at-trap",
  "hose-off",
  "trap-out",
  "camera",
  "burners-out",
  "power-off",
  "glow",
  "board-display",
  "in-place",
  "pressure",
  "drop",
  "high-fire",
  "low-fire",
  "pressure-drop",
  "on-delay",
  "off-delay",
  "co-air-free",
  "oxygen",
  "oxygen-low-fire",
  "oxygen-change",
] as const;
export type WayId = (typeof WAY_IDS)[number];

/** One way of taking a check, or one of the readings it is made of; opens what is listed besides the check's own. */
export interface CheckWay {
  readonly id: WayId;
  readonly opens: readonly Opening[];
}

export interface CheckEntry {
  readonly instruments: readonly Instrument[];
  readonly power: readonly CheckPower[];
  /** Where in the sequence it is taken; the first is the usual one. */
  readonly stages: readonly ReadingStage[];
  readonly applies: VariantExpr;
  /** Minutes at the unit. Judgement. */
  readonly minutes: number;
  readonly hazards: readonly Hazard[];
  readonly reading: ReadingKind;
  /** Units its numbers may carry. */
  readonly units: readonly ReadingUnit[];
  readonly setUp: readonly SetUp[];
  /** What it opens; each becomes an entry of the put-back list when the check is started. */
  readonly opens: readonly Opening[];
  /** 0 nothing touched, 1 a cover or a probe, 2 a lead, tube or part moved, 3 gas side opened. */
  readonly invasive: 0 | 1 | 2 | 3;
  readonly ways?: readonly CheckWay[];
  /** A look alone may settle it, so no number is asked for. */
  readonly passesOnSight?: boolean;
  /** A hose goes on and off a gas tap, each with the gas shut. */
  readonly gasHose?: boolean;
}

/** A check of the catalogue with its id. */
export interface Check extends CheckEntry {
  readonly id: CheckId;
  /** A number is expected: the check has bands and sight alone does not settle it. */
  readonly needsNumber: boolean;
  readonly provenance: "common-practice";
  readonly minutesProvenance: "judgement";
}

/** Something that may be found at a check. */
export interface FindingEntry {
  /** The class or classes an observation may carry with it. */
  readonly classes: readonly Outcome[];
  readonly pointsAt: readonly (FaultId | SymptomId)[];
  /** Further causes on some units only. */
  readonly also?: { readonly when: VariantExpr; readonly pointsAt: readonly FaultId[] };
  readonly rulesOut?: readonly FaultId[];
  readonly stopRules?: readonly StopRuleId[];
}
