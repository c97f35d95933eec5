import { getCheck } from "./checks/checks.ts";
import type { CheckId } from "./checks/check-ids.ts";
import type { ReadingUnit } from "./codes.ts";

/** Numbers outside `least` to `most` cannot be read and are refused; outside `likely` they ask to be confirmed. */
export interface ReadingLimits {
  readonly least: number;
  readonly most: number;
  readonly likely: readonly [number, number];
}

const limits = (least: number, most: number, ...likely: [number, number]): ReadingLimits => ({
  least,
  most,
  likely,
});

/** Limits by unit where the check has none of its own. Judgement: what a meter can show at a furnace. */
const UNIT_LIMITS: Readonly<Record<ReadingUnit, ReadingLimits>> = {
  V: limits(0, 1000, 0, 600),
  mV: limits(-100, 1000, 0, 60),
  uA: limits(-50, 500, 0, 25),
  A: limits(0, 400, 0, 60),
  ohm: limits(0, 1e9, 0, 1e7),
  Mohm: limits(0, 100_000, 0, 5000),
  inwc: limits(-28, 60, -5, 15),
  in: limits(0, 12, 0, 1),
  F: limits(-80, 2500, -30, 200),
  ppm: limits(0, 20_000, 0, 1000),
  pct: limits(0, 100, 0, 100),
  s: limits(0, 7200, 0, 600),
  CFM: limits(0, 50_000, 200, 5000),
  cfh: limits(0, 5000, 20, 500),
  uF: limits(0, 200, 2, 80),
  pctPlate: limits(0, 1000, 0, 150),
  count: limits(0, 1000, 0, 60),
};

/** Limits of one check in one unit. Judgement. */
const CHECK_LIMITS: Partial<Record<CheckId, Partial<Record<ReadingUnit, ReadingLimits>>>> = {
  "ck-gas-detector": { pct: limits(0, 100, 0, 60) },
  "ck-co-ambient": { ppm: limits(0, 10_000, 0, 400) },
  "ck-cabinet-earth": { V: limits(0, 600, 0, 250) },
  "ck-tstat-batteries": { V: limits(0, 12, 0.2, 4) },
  "ck-thermocouple-open": { mV: limits(-60, 200, 0, 45) },
  "ck-thermocouple-closed": { mV: limits(-60, 200, 0, 30) },
  "ck-flame-current": { uA: limits(-20, 100, 0, 15) },
  "ck-anticipator": { A: limits(0, 5, 0, 1.5) },
  "ck-valve-current": { A: limits(0, 10, 0, 2) },
  "ck-lv-current": { A: limits(0, 50, 0, 10), pctPlate: limits(0, 1000, 0, 200) },
  "ck-igniter-ohms": { ohm: limits(0, 1e9, 0, 5000) },
  "ck-valve-coil-ohms": { ohm: limits(0, 1e9, 0, 2000) },
  "ck-inducer-ohms": { ohm: limits(0, 1e9, 0, 2000) },
  "ck-spark-gap": { in: limits(0, 2, 0.02, 0.4) },
  "ck-draft": { inwc: limits(-5, 5, -0.25, 0.25) },
  "ck-pressure-suction": { inwc: limits(-10, 10, -4, 4) },
  "ck-pressure-switch-trip": { inwc: limits(-10, 10, -4, 4) },
  "ck-inlet-pressure-static": { inwc: limits(-1, 60, 0, 20) },
  "ck-inlet-pressure-running": { inwc: limits(-1, 60, 0, 20) },
  "ck-manifold-pressure": { inwc: limits(-1, 60, 0, 14) },
  "ck-manifold-leakby": { inwc: limits(-1, 28, 0, 3) },
  "ck-filter": { inwc: limits(0, 5, 0, 1.5) },
  "ck-coil-drop": { inwc: limits(0, 5, 0, 1.5) },
  "ck-tesp": { inwc: limits(0, 10, 0, 3) },
  "ck-temp-rise": { F: limits(-50, 300, 5, 130) },
  "ck-flue-analysis": { ppm: limits(0, 100_000, 0, 4000), pct: limits(0, 21, 0, 20.9) },
  "ck-lp-tank": { pct: limits(0, 100, 0, 90) },
  "ck-transformer-tap": { pct: limits(0, 300, 50, 130) },
};

/** Checks of the 24 V side: more volts than this there are line volts on a control wire. */
const LOW_VOLTAGE_LIKELY = limits(0, 600, 0, 45);

/** The limits of a number of a check in a unit: what is refused, and what asks to be confirmed. Judgement. */
export function readingLimits(check: CheckId, unit: ReadingUnit): ReadingLimits {
  const own = CHECK_LIMITS[check]?.[unit];
  if (own) return own;
  const { hazards, reading } = getCheck(check);
  const isLowVoltage = reading === "in-out" || (hazards.includes("LV") && !hazards.includes("HVAC"));
  return unit === "V" && isLowVoltage ? LOW_VOLTAGE_LIKELY : UNIT_LIMITS[unit];
}

/** Whether a number can be read at all, and whether it is likely. OL is always possible in ohms only. */
export function judgeReading(
  check: CheckId,
  unit: ReadingUnit,
  value: number | "OL",
): "likely" | "unlikely" | "impossible" {
  if (value === "OL") return unit === "ohm" || unit === "Mohm" ? "likely" : "unlikely";
  const { least, most, likely } = readingLimits(check, unit);
  if (Number.isNaN(value) || value < least || value > most) return "impossible";
  return value < likely[0] || value > likely[1] ? "unlikely" : "likely";
}
