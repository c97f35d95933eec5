import type { UnitProfile } from "../profile.ts";
import { CLOSING_CHECK_IDS } from "./closing-ids.ts";
import type { ClosingCheckId } from "./closing-ids.ts";
import { TOUCH_ROWS } from "./touch-rows.ts";
import type { TouchRow } from "./touch-rows.ts";

/** How a visit ended. */
export type ClosingOutcome = "fixed" | "part-needed" | "shut-off" | "referred" | "not-found";

/** A row of the closing table: what was touched, or that the unit was left in or out of service. */
export type ClosingRow = TouchRow | "always" | "left-off";

/** First-try lights that may be asked for. */
export type Lights = 1 | 3 | 5;

export interface ClosingRequirement {
  readonly id: ClosingCheckId;
  /** The rows that asked for it. */
  readonly askedBy: readonly ClosingRow[];
  /** close-cycles only: first-try lights needed, the first of them one full call watched. */
  readonly lights?: Lights;
  /** close-rise only: least minutes of burning, with no trip. */
  readonly burnMinutes?: 10 | 15;
}

/** What decides the closing list. */
export interface ClosingSituation {
  touched: readonly TouchRow[];
  outcome: ClosingOutcome;
  profile: UnitProfile;
  /** The fault came and went: five lights instead of three where flame or control was touched. */
  intermittent?: boolean;
  /** Sides on which a gas joint or tap was opened on this visit. */
  gasJoints?: readonly ("up" | "down")[];
  /** A flue CO of this unit not older than 12 months is on record. */
  flueCoWithin12Months?: boolean;
  /** Left off only: the burner was lit after the joint was closed, so that its downstream side can be tested. */
  litAfterJoint?: boolean;
}

const ALWAYS: readonly ClosingCheckId[] = [
  "close-cycles",
  "close-flame",
  "close-cycle-end",
  "close-room-co",
  "close-panels",
  "close-tstat",
  "close-jumpers",
  "close-docs",
];

const LEFT_OFF: readonly ClosingCheckId[] = ["close-panels", "close-jumpers", "close-cold", "close-docs"];

/** What each row adds, as the closing table has it; conditions of a row are in `closingChecksFor`. */
export const TOUCH_ROW_ADDS: Readonly<Record<TouchRow, readonly ClosingCheckId[]>> = {
  setting: [],
  airflow: ["close-rise"],
  flame: ["close-cycles", "close-sensor", "close-co"],
  draft: ["close-cycles", "close-draft", "close-draft-opens", "close-co"],
  control: ["close-cycles", "close-sensor", "close-safeties", "close-draft-opens"],
  "gas-joint": ["close-leak-up", "close-leak-down"],
  "gas-train": [
    "close-rise",
    "close-cycles",
    "close-sensor",
    "close-co",
    "close-draft",
    "close-draft-opens",
    "close-leak-up",
    "close-leak-down",
    "close-inlet-static",
    "close-inlet-run",
    "close-manifold",
    "close-input",
  ],
  safety: CLOSING_CHECK_IDS.filter((id) => id !== "close-restore" && id !== "close-cold"),
  restored: ["close-restore"],
};

/** What each row covers, by words of the trade; the same words name repairs' parts. */
export const TOUCH_ROW_COVERS: Readonly<Record<TouchRow, readonly string[]>> = {
  setting: [
    "setting",
    "batteries",
    "thermostat",
    "switch",
    "breaker",
    "fuse",
    "transformer",
    "control-wire",
    "unit-shutoff-opened-again",
  ],
  airflow: [
    "filter",
    "registers",
    "coil",
    "blower",
    "blower-capacitor",
    "belt",
    "blower-relay",
    "blower-contactor",
  ],
  flame: ["flame-sensor", "thermocouple", "igniter", "spark", "ground"],
  draft: [
    "inducer",
    "inducer-relay",
    "pressure-switch",
    "centrifugal-switch",
    "tube",
    "vent",
    "intake",
    "air-supply",
    "drain",
  ],
  control: ["integrated-board", "module", "gas-control-electronics"],
  "gas-joint": ["gas-tap", "gas-joint"],
  "gas-train": ["valve", "regulator", "orifice", "fuel"],
  safety: [
    "limit-replaced",
    "rollout-switch-tripped-or-replaced",
    "spill-switch-tripped-or-replaced",
    "soot",
    "co-or-spillage-found",
  ],
  restored: ["meter", "branch-or-season-valve", "lp-out-of-gas", "shutoff-serving-others"],
};

/** Whether a unit left with an outcome is in service: fixed, or running with nothing found. */
export function isLeftInService(outcome: ClosingOutcome): boolean {
  return outcome === "fixed" || outcome === "not-found";
}

/** Lights a row asks for: three where flame, draft, control, gas train or a safety was touched, five if intermittent. */
function lightsFor(row: ClosingRow, intermittent: boolean): Lights {
  if (row === "flame" || row === "control" || row === "gas-train") return intermittent ? 5 : 3;
  return row === "draft" || row === "safety" ? 3 : 1;
}

/**
 * The closing list of a visit: the union of what the touched rows add, each with the rows that asked for it. No
 * gauge goes on just to close, so a row not touched asks for nothing. A unit left off is checked for what is
 * open and for the people in the cold; of leak checks only those of joints opened.
 */
export function closingChecksFor(situation: ClosingSituation): ClosingRequirement[] {
  const { outcome, profile } = situation;
  const inService = isLeftInService(outcome);
  const askedBy = new Map<ClosingCheckId, Set<ClosingRow>>();
  const ask = (id: ClosingCheckId, row: ClosingRow) => {
    askedBy.set(id, (askedBy.get(id) ?? new Set()).add(row));
  };
  for (const id of inService ? ALWAYS : LEFT_OFF) ask(id, inService ? "always" : "left-off");
  for (const row of TOUCH_ROWS) {
    if (!situation.touched.includes(row) || !inService) continue;
    for (const id of TOUCH_ROW_ADDS[row]) if (isAsked(id, row, situation)) ask(id, row);
  }
  // A joint opened is tested whatever row was recorded; downstream only where it can be, with a flame.
  for (const side of situation.gasJoints ?? []) {
    if (side === "up") ask("close-leak-up", "gas-joint");
    else if (inService || situation.litAfterJoint) ask("close-leak-down", "gas-joint");
  }
  return CLOSING_CHECK_IDS.filter((id) => askedBy.has(id)).map((id) => {
    const rows = [...(askedBy.get(id) ?? [])];
    if (id === "close-cycles")
      return { id, askedBy: rows, lights: mostLights(rows, situation.intermittent ?? false) };
    if (id === "close-rise") return { id, askedBy: rows, burnMinutes: rows.includes("airflow") ? 15 : 10 };
    return { id, askedBy: rows };
  });

  function isAsked(id: ClosingCheckId, row: TouchRow, { gasJoints = [] }: ClosingSituation): boolean {
    if (id === "close-draft-opens") return profile.codes.draft !== "ND";
    if (id === "close-co" && row === "flame") return !situation.flueCoWithin12Months;
    const needsJoint = row === "gas-joint" || row === "gas-train";
    if (id === "close-leak-up" && needsJoint) return gasJoints.includes("up");
    if (id === "close-leak-down" && needsJoint) return gasJoints.includes("down");
    return true;
  }
}

function mostLights(rows: readonly ClosingRow[], intermittent: boolean): Lights {
  const lights = rows.map((row) => lightsFor(row, intermittent));
  return lights.includes(5) ? 5 : lights.includes(3) ? 3 : 1;
}
