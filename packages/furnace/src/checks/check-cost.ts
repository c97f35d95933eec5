import type { VariantCodes } from "../codes.ts";
import type { CheckId } from "./check-ids.ts";
import { getCheck, isLookOnly } from "./checks.ts";

/**
 * What live work adds to the minutes of a check, so that of two checks that settle the same thing the safer one
 * goes first. One sum per check; `fall` once a visit. All numbers are judgement.
 */
export const LIVE_WORK_COST = {
  /** 24 V live. */
  lowVoltage: 1,
  /** 120 to 240 V live. */
  lineVoltage: 6,
  /** 480 V live, or any line voltage on a roof or in an attic. */
  lineVoltageExposed: 12,
  /** A call with the gas on. */
  callWithGas: 2,
  /** A gas hose on and off. */
  gasHose: 6,
  /** Turning parts in reach. */
  turningParts: 2,
  /** Roof, ladder, or attic beyond the boards; once a visit. */
  fall: 10,
} as const;

/** Volts from which line voltage counts as the 480 V class. */
const HIGH_LINE_V = 440;

/**
 * Cost of a check in minutes: its own minutes and what live work adds. `fallPaid` says that the way up has been
 * made on this visit already.
 */
export function checkCost(
  id: CheckId,
  unit: { codes: VariantCodes; ratedVolts?: number },
  visit: { fallPaid?: boolean } = {},
): number {
  const check = getCheck(id);
  const has = (hazard: (typeof check.hazards)[number]) => check.hazards.includes(hazard);
  let cost = check.minutes;
  if (has("FALL") && unit.codes.location !== "IND" && !visit.fallPaid) cost += LIVE_WORK_COST.fall;
  const poweredOff = check.power.every((power) => power === "OFF");
  if (poweredOff || isLookOnly(id)) return cost;
  if (has("LV")) cost += LIVE_WORK_COST.lowVoltage;
  if (has("HVAC")) {
    const exposed = unit.codes.location !== "IND" || (unit.ratedVolts ?? 0) >= HIGH_LINE_V;
    cost += exposed ? LIVE_WORK_COST.lineVoltageExposed : LIVE_WORK_COST.lineVoltage;
  }
  if (check.power.includes("ON-call") && (has("GAS") || has("HOT"))) cost += LIVE_WORK_COST.callWithGas;
  if (check.gasHose) cost += LIVE_WORK_COST.gasHose;
  if (has("ROT")) cost += LIVE_WORK_COST.turningParts;
  return cost;
}

/** The order in which checks that settle one question are taken, cheapest and safest first. Judgement. */
export const SETTLING_ORDERS = {
  "not-glowing": ["ck-igniter-visual", "ck-igniter-ohms", "ck-igniter-voltage"],
  "condensing-stopped-at-draft": [
    "ck-condensate-drain",
    "ck-condensate-trap",
    "ck-pressure-tubing",
    "ck-pressure-suction",
    "ck-vent-inspect",
    "ck-intake-inspect",
  ],
  "flame-signal-low": ["ck-flame-current", "ck-polarity-ground", "ck-burner-ground", "ck-sensor-insulation"],
  thermostat: ["ck-tstat-settings", "ck-tstat-batteries", "ck-tstat-call-w"],
  "pressure-switch": ["ck-pressure-suction", "ck-pressure-switch-voltage", "ck-pressure-switch-trip"],
  gas: ["ck-gas-shutoff", "ck-other-appliances", "ck-main-valve-voltage", "ck-inlet-pressure-static"],
} as const satisfies Record<string, readonly CheckId[]>;
