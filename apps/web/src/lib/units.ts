import {
  cfhToCubicMetresPerHour,
  cfmToLitresPerSecond,
  fahrenheitRiseToCelsius,
  fahrenheitToCelsius,
  inchesToMillimetres,
  inchesWaterToPascals,
} from "@emberladder/field-math";
import type { ReadingUnit } from "@emberladder/furnace";
import { formatNumber } from "./format-number.ts";
import type { UnitSystem } from "./units-shown.ts";

/** A reading ready to be shown: its figure, and the key of its unit's sign in the message catalogues. */
export interface ShownReading {
  figure: string;
  unitKey: string;
}

interface SiUnit {
  name: "Pa" | "mm" | "C" | "Lps" | "m3h";
  /** Decimals that keep what the gauge could tell in its own unit. */
  decimals: number;
  convert: (value: number) => number;
}

const SI: Partial<Record<ReadingUnit, SiUnit>> = {
  inwc: { name: "Pa", decimals: 1, convert: inchesWaterToPascals },
  in: { name: "mm", decimals: 2, convert: inchesToMillimetres },
  F: { name: "C", decimals: 1, convert: fahrenheitToCelsius },
  CFM: { name: "Lps", decimals: 1, convert: cfmToLitresPerSecond },
  cfh: { name: "m3h", decimals: 3, convert: cfhToCubicMetresPerHour },
};

/**
 * Shows a stored reading in the units asked for. The stored value never changes: this only writes it. Volts,
 * amps, ohms, ppm and seconds are the same in both systems. `isRise` is for differences of temperature.
 */
export function showReading(
  value: number | "OL",
  unit: ReadingUnit,
  system: UnitSystem,
  { isRise = false }: { isRise?: boolean } = {},
): ShownReading {
  const si = system === "si" ? SI[unit] : undefined;
  const unitKey = si ? `desk:siUnits.${si.name}` : `trade:units.${unit}`;
  if (value === "OL" || !Number.isFinite(value)) return { figure: "OL", unitKey };
  if (!si) return { figure: formatNumber(value), unitKey };
  const converted = unit === "F" && isRise ? fahrenheitRiseToCelsius(value) : si.convert(value);
  return { figure: Number(converted.toFixed(si.decimals)).toString(), unitKey };
}
