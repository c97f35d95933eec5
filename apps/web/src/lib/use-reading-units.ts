import { displayReading } from "@emberladder/field-math";
import type { ReadingNature, StoredUnit } from "@emberladder/field-math";
import { useMemo } from "react";
import { useTranslation } from "react-i18next";
import { formatNumber } from "./format-number.ts";
import { roundTo, roundToStore } from "./typed-reading.ts";
import { signKeyOf } from "./units.ts";
import { useUnitsShown } from "./units-shown.ts";

/** Readings between the record, which keeps the gauges' units, and the units that this person sees and types. */
export interface ReadingUnits {
  /** The sign of the unit that stands for a stored one: Pa for in. w.c. in SI. */
  signOf: (unit: StoredUnit, nature?: ReadingNature) => string;
  /** The figure alone, without parted thousands, so that it can be typed again as it stands. */
  figureOf: (value: number | "OL", unit: StoredUnit, nature?: ReadingNature) => string;
  /** Figure and sign; a count has no sign. */
  write: (value: number | "OL", unit: StoredUnit, nature?: ReadingNature) => string;
  /** What to record for a typed figure; `limits` are the edges of its band, in the stored unit. */
  store: <V extends number | "OL">(
    typed: V,
    unit: StoredUnit,
    nature?: ReadingNature,
    limits?: readonly number[],
  ) => V | number;
}

/** Writes stored readings and reads typed ones in the units that this person chose. Needs the trade's words. */
export function useReadingUnits(): ReadingUnits {
  const { t } = useTranslation();
  const system = useUnitsShown();
  return useMemo(() => {
    const signOf: ReadingUnits["signOf"] = (unit, nature) =>
      t(signKeyOf(displayReading(0, unit, system, nature).unit));
    const figureOf: ReadingUnits["figureOf"] = (value, unit, nature) => {
      if (value === "OL" || !Number.isFinite(value)) return value === -Infinity ? "-OL" : "OL";
      const shown = displayReading(value, unit, system, nature);
      return formatNumber(shown.unit === unit ? value : roundTo(shown.value, shown.decimals));
    };
    return {
      signOf,
      figureOf,
      write: (value, unit, nature) =>
        unit === "count" ? figureOf(value, unit) : `${figureOf(value, unit, nature)} ${signOf(unit, nature)}`,
      store: (typed, unit, nature, limits) =>
        typeof typed === "number" ? roundToStore(typed, unit, system, nature, limits) : typed,
    };
  }, [t, system]);
}

const RISES: readonly string[] = ["ck-temp-rise", "close-rise"];

/** What the figure of a check or closing check is: a temperature rise is a difference, not a temperature. */
export function natureOf(check: string): ReadingNature {
  return { isDifference: RISES.includes(check) };
}
