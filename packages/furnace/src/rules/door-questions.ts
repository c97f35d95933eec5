import type { CheckId } from "../checks/check-ids.ts";
import type { ReadingUnit } from "../codes.ts";

/** Fields of the door's answers. */
export const DOOR_FIELDS = [
  "unwell",
  "alarm",
  "coPpm",
  "smell",
  "lelPct",
  "safe",
  "edgeFt",
  "parapetIn",
  "hatchGuarded",
  "found",
  "cabinetV",
] as const;
export type DoorField = (typeof DOOR_FIELDS)[number];

/** The door's questions, people before meters. The last is asked at the unit. */
export const DOOR_QUESTION_IDS = ["people", "smell", "way-in", "at-unit"] as const;
export type DoorQuestionId = (typeof DOOR_QUESTION_IDS)[number];

/** What may be found at the unit before it is touched. */
export const AT_UNIT_FINDS = ["soot", "under-water", "wet-control", "old-wrap", "cannot-lock"] as const;
export type AtUnitFind = (typeof AT_UNIT_FINDS)[number];

/** One thing asked at the door. */
export interface DoorAsk {
  readonly question: DoorQuestionId;
  readonly field: DoorField;
  readonly kind: "yes-no" | "number" | "list";
  readonly unit?: ReadingUnit | "ft";
  /** The answer that lets the visit go on without more. */
  readonly clear?: boolean;
  /** The check that the answer stands for. */
  readonly check?: CheckId;
  /** Asked only where the work is on a roof or a ladder. */
  readonly onRoof?: boolean;
}

/** Everything asked at the door, in order. Common practice. */
export const DOOR_ASKS: readonly DoorAsk[] = [
  { question: "people", field: "unwell", kind: "yes-no", clear: false },
  { question: "people", field: "alarm", kind: "yes-no", clear: false },
  { question: "smell", field: "smell", kind: "yes-no", clear: false, check: "ck-odor" },
  { question: "way-in", field: "safe", kind: "yes-no", clear: true },
  { question: "way-in", field: "edgeFt", kind: "number", unit: "ft", onRoof: true },
  { question: "way-in", field: "parapetIn", kind: "number", unit: "in", onRoof: true },
  { question: "way-in", field: "hatchGuarded", kind: "yes-no", clear: true, onRoof: true },
  { question: "people", field: "coPpm", kind: "number", unit: "ppm", check: "ck-co-ambient" },
  { question: "smell", field: "lelPct", kind: "number", unit: "pct", check: "ck-gas-detector" },
  { question: "at-unit", field: "found", kind: "list", check: "ck-visual-wiring" },
  { question: "at-unit", field: "cabinetV", kind: "number", unit: "V", check: "ck-cabinet-earth" },
];

/** Room CO, ppm, from which the source is found and the occupant told, though the visit goes on. Common practice. */
export const CO_ACTION_PPM = 10;
