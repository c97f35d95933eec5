import type { ReadingUnit } from "../codes.ts";
import type { CheckId } from "../checks/check-ids.ts";
import type { ClosingCheckId } from "./closing-ids.ts";
import { CLOSING_CHECK_IDS } from "./closing-ids.ts";

/** A number or a yes that goes with a closing check besides its own value. */
export interface AlsoField {
  readonly id: string;
  readonly unit: ReadingUnit | "yes-no";
  readonly needed?: boolean;
}

export interface ClosingCheckEntry {
  /** Unit of its value; a look that was right may be recorded without one. */
  readonly unit: ReadingUnit;
  /** `count` and `number` need a value; a `look` is right or not. */
  readonly kind: "number" | "count" | "look";
  readonly also: readonly AlsoField[];
  /** A reading of this check taken after the repair on this visit counts. */
  readonly countsReadingOf?: CheckId;
  /** Filled from the record: nobody types it. */
  readonly fillsItself?: boolean;
}

/** A closing check with its id. */
export interface ClosingCheck extends ClosingCheckEntry {
  readonly id: ClosingCheckId;
  readonly provenance: "common-practice";
}

/** What is asked of the people when a unit is left without heat: each item is answered. */
export const COLD_ITEMS = [
  "vulnerable-people",
  "safe-heat",
  "no-oven-or-grill",
  "no-unvented-heater",
  "freeze-warning",
  "co-alarm",
] as const;
export type ColdItem = (typeof COLD_ITEMS)[number];

/** What each closing check records. Common practice. */
const entries: Readonly<Record<ClosingCheckId, ClosingCheckEntry>> = {
  "close-cycles": { unit: "count", kind: "count", also: [{ id: "retries", unit: "count" }] },
  "close-flame": { unit: "count", kind: "look", also: [] },
  "close-cycle-end": {
    unit: "s",
    kind: "number",
    also: [
      { id: "postPurgeS", unit: "s" },
      { id: "blowerOffDelayS", unit: "s" },
      { id: "manifoldOffInwc", unit: "inwc" },
    ],
  },
  "close-room-co": {
    unit: "ppm",
    kind: "number",
    also: [
      { id: "beforePpm", unit: "ppm" },
      { id: "sourceFound", unit: "yes-no" },
      { id: "occupantTold", unit: "yes-no" },
      { id: "alarmExplained", unit: "yes-no" },
    ],
    countsReadingOf: "ck-co-ambient",
  },
  "close-panels": { unit: "count", kind: "look", also: [] },
  "close-tstat": { unit: "F", kind: "look", also: [] },
  "close-jumpers": { unit: "count", kind: "count", also: [], fillsItself: true },
  "close-docs": { unit: "count", kind: "count", also: [], fillsItself: true },
  "close-leak-up": {
    unit: "pct",
    kind: "number",
    also: [
      { id: "joints", unit: "count" },
      { id: "bubbles", unit: "yes-no" },
    ],
  },
  "close-leak-down": {
    unit: "pct",
    kind: "number",
    also: [
      { id: "joints", unit: "count" },
      { id: "bubbles", unit: "yes-no" },
    ],
  },
  "close-restore": {
    unit: "count",
    kind: "look",
    also: [
      { id: "movement", unit: "yes-no" },
      { id: "pilots", unit: "count" },
      { id: "pilotsLitOrTagged", unit: "count" },
    ],
  },
  "close-inlet-static": {
    unit: "inwc",
    kind: "number",
    also: [],
    countsReadingOf: "ck-inlet-pressure-static",
  },
  "close-inlet-run": {
    unit: "inwc",
    kind: "number",
    also: [{ id: "dropInwc", unit: "inwc", needed: true }],
    countsReadingOf: "ck-inlet-pressure-running",
  },
  "close-manifold": {
    unit: "inwc",
    kind: "number",
    also: [{ id: "lowInwc", unit: "inwc" }],
    countsReadingOf: "ck-manifold-pressure",
  },
  "close-input": {
    unit: "pctPlate",
    kind: "number",
    also: [
      { id: "computed", unit: "yes-no" },
      { id: "dialFt3", unit: "count" },
      { id: "secondsPerRev", unit: "s" },
      { id: "cfh", unit: "cfh" },
      { id: "heatingValueBtuPerFt3", unit: "count" },
      { id: "btuh", unit: "count" },
    ],
    countsReadingOf: "ck-meter-clock",
  },
  "close-rise": {
    unit: "F",
    kind: "number",
    also: [
      { id: "supplyF", unit: "F" },
      { id: "returnF", unit: "F" },
      { id: "burnMinutes", unit: "count" },
    ],
    countsReadingOf: "ck-temp-rise",
  },
  "close-sensor": {
    unit: "uA",
    kind: "number",
    also: [{ id: "dropOutS", unit: "s" }],
    countsReadingOf: "ck-flame-current",
  },
  "close-co": {
    unit: "ppm",
    kind: "number",
    also: [
      { id: "coMeasuredPpm", unit: "ppm" },
      { id: "o2Pct", unit: "pct" },
      { id: "rising", unit: "yes-no" },
      { id: "causeSought", unit: "yes-no" },
    ],
    countsReadingOf: "ck-flue-analysis",
  },
  "close-draft": {
    unit: "inwc",
    kind: "number",
    also: [
      { id: "spillStopsS", unit: "s" },
      { id: "makeInwc", unit: "inwc" },
      { id: "highMakeInwc", unit: "inwc" },
      { id: "highSuctionInwc", unit: "inwc" },
      { id: "ventJointsCoPpm", unit: "ppm" },
    ],
    countsReadingOf: "ck-pressure-suction",
  },
  "close-draft-opens": { unit: "s", kind: "number", also: [{ id: "ignitionStarted", unit: "yes-no" }] },
  "close-safeties": { unit: "count", kind: "look", also: [] },
  "close-cold": { unit: "count", kind: "count", also: [] },
};

/** Every closing check, in the order in which they are offered. */
export const CLOSING_CHECKS: readonly ClosingCheck[] = CLOSING_CHECK_IDS.map((id) => ({
  id,
  ...entries[id],
  provenance: "common-practice",
}));

/** The closing check with an id. */
export function getClosingCheck(id: ClosingCheckId): ClosingCheck {
  return { id, ...entries[id], provenance: "common-practice" };
}
