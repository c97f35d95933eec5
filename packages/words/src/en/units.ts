import type { ReadingUnit } from "@emberladder/furnace";

/** Unit signs, beside every number. */
export const units: Readonly<Record<ReadingUnit, string>> = {
  V: "V",
  mV: "mV",
  uA: "µA",
  A: "A",
  ohm: "ohm",
  Mohm: "Mohm",
  inwc: "in. w.c.",
  in: "in.",
  F: "F",
  ppm: "ppm",
  pct: "%",
  s: "s",
  CFM: "CFM",
  cfh: "cu ft/h",
  uF: "µF",
  pctPlate: "% of plate",
  count: "count",
};
