import {
  btuhToKilowatts,
  celsiusRiseToFahrenheit,
  celsiusToFahrenheit,
  cfhToCubicMetresPerHour,
  cfmToLitresPerSecond,
  cubicMetresPerHourToCfh,
  fahrenheitRiseToCelsius,
  fahrenheitToCelsius,
  inchesToMillimetres,
  inchesWaterToPascals,
  kilowattsToBtuh,
  litresPerSecondToCfm,
  millimetresToInches,
  pascalsToInchesWater,
} from "./convert-units.ts";

/** The two systems a person may have readings shown in. */
export const UNIT_SYSTEMS = ["inch-pound", "si"] as const;
export type UnitSystem = (typeof UNIT_SYSTEMS)[number];

/** Units of a reading as it is stored: those of the gauges, whatever system is shown. */
export type StoredUnit =
  | "V"
  | "mV"
  | "uA"
  | "A"
  | "ohm"
  | "Mohm"
  | "inwc"
  | "in"
  | "F"
  | "ppm"
  | "pct"
  | "s"
  | "CFM"
  | "cfh"
  | "uF"
  | "pctPlate"
  | "count"
  | "btuh";

/** Ids of the units that stand in for a stored one in SI. Their signs are in the message catalogues. */
export type SiUnit = "Pa" | "mm" | "C" | "Lps" | "m3h" | "kW";

/** A reading ready to be written: its figure, the id of its unit, and the decimals worth showing. */
export interface DisplayedReading {
  value: number;
  unit: StoredUnit | SiUnit;
  decimals: number;
}

/** What a figure is, where its unit alone does not tell. */
export interface ReadingNature {
  /** A difference of temperature, such as a rise: converted without the offset. */
  isDifference?: boolean;
}

interface Conversion {
  unit: SiUnit;
  decimals: number;
  toSi: (value: number) => number;
  fromSi: (value: number) => number;
}

/**
 * Decimals that a field gauge can tell in each unit: 0.01 in. w.c. on a manometer, 0.1 uA on a flame-current
 * meter, and so on. Common practice. Decimals in SI keep the same resolution or a finer one.
 */
const STORED_DECIMALS: Record<StoredUnit, number> = {
  V: 1,
  mV: 1,
  uA: 2,
  A: 2,
  ohm: 1,
  Mohm: 1,
  inwc: 2,
  in: 3,
  F: 0,
  ppm: 0,
  pct: 1,
  s: 1,
  CFM: 0,
  cfh: 1,
  uF: 1,
  pctPlate: 1,
  count: 0,
  btuh: 0,
};

const SI: Partial<Record<StoredUnit, Conversion>> = {
  inwc: { unit: "Pa", decimals: 1, toSi: inchesWaterToPascals, fromSi: pascalsToInchesWater },
  in: { unit: "mm", decimals: 2, toSi: inchesToMillimetres, fromSi: millimetresToInches },
  F: { unit: "C", decimals: 1, toSi: fahrenheitToCelsius, fromSi: celsiusToFahrenheit },
  CFM: { unit: "Lps", decimals: 1, toSi: cfmToLitresPerSecond, fromSi: litresPerSecondToCfm },
  cfh: { unit: "m3h", decimals: 3, toSi: cfhToCubicMetresPerHour, fromSi: cubicMetresPerHourToCfh },
  btuh: { unit: "kW", decimals: 3, toSi: btuhToKilowatts, fromSi: kilowattsToBtuh },
};

const RISE: Conversion = {
  unit: "C",
  decimals: 1,
  toSi: fahrenheitRiseToCelsius,
  fromSi: celsiusRiseToFahrenheit,
};

function conversionOf(unit: StoredUnit, nature: ReadingNature): Conversion | undefined {
  return unit === "F" && nature.isDifference ? RISE : SI[unit];
}

/**
 * Converts a stored reading for display. Volts, amps, ohms, ppm, percent and seconds are the same in both
 * systems. The stored value never changes: this gives a new figure, unrounded, and says how many decimals are
 * worth showing.
 *
 * @example displayReading(3.5, "inwc", "si") // { value: 871.811185, unit: "Pa", decimals: 1 }
 */
export function displayReading(
  value: number,
  unit: StoredUnit,
  system: UnitSystem,
  nature: ReadingNature = {},
): DisplayedReading {
  const conversion = system === "si" ? conversionOf(unit, nature) : undefined;
  if (!conversion) return { value, unit, decimals: STORED_DECIMALS[unit] };
  return { value: conversion.toSi(value), unit: conversion.unit, decimals: conversion.decimals };
}

/**
 * The value to store for a figure that was typed in the system shown: the way back from `displayReading`, in
 * the stored unit and unrounded.
 */
export function storedReading(
  shown: number,
  unit: StoredUnit,
  system: UnitSystem,
  nature: ReadingNature = {},
): number {
  const conversion = system === "si" ? conversionOf(unit, nature) : undefined;
  return conversion ? conversion.fromSi(shown) : shown;
}
