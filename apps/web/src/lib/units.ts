import { displayReading } from "@emberladder/field-math";
import type { SiUnit, StoredUnit, UnitSystem } from "@emberladder/field-math";

/** A reading ready to be shown: its figure, and the key of its unit's sign in the message catalogues. */
export interface ShownReading {
  figure: string;
  unitKey: string;
}

/** Signs that are not the trade's: the SI ones, and those that only a plate has. */
const DESK_SIGNS: Record<string, string> = {
  Pa: "desk:siUnits.Pa",
  mm: "desk:siUnits.mm",
  C: "desk:siUnits.C",
  Lps: "desk:siUnits.Lps",
  m3h: "desk:siUnits.m3h",
  kW: "desk:siUnits.kW",
  btuh: "desk:plateUnits.btuh",
};

/**
 * Writes a stored reading in the units asked for; what is stored never changes. In inch-pound units the figure is
 * the stored one, digit for digit. `isRise` is for differences of temperature.
 */
export function showReading(
  value: number | "OL",
  unit: StoredUnit,
  system: UnitSystem,
  { isRise = false }: { isRise?: boolean } = {},
): ShownReading {
  const isOver = value === "OL" || !Number.isFinite(value);
  const shown = displayReading(isOver ? 0 : value, unit, system, { isDifference: isRise });
  const figure = isOver
    ? "OL"
    : writeFigure(shown.unit === unit ? value : Number(shown.value.toFixed(shown.decimals)));
  return { figure, unitKey: signKeyOf(shown.unit) };
}

/** The key of a unit's sign in the message catalogues. */
export function signKeyOf(unit: StoredUnit | SiUnit): string {
  return DESK_SIGNS[unit] ?? `trade:units.${unit}`;
}

/** At most three decimals, no trailing zeros, thousands parted so that an input is read at a glance. */
function writeFigure(value: number): string {
  return value.toLocaleString("en-US", { maximumFractionDigits: 3 });
}
