import type { StoredUnit } from "@emberladder/field-math";
import { useCallback } from "react";
import { useTranslation } from "react-i18next";
import { showReading } from "./units.ts";
import { useUnitsShown } from "./units-shown.ts";

/** Writes stored readings with their sign in the units that this person sees. Needs the trade's words. */
export function useFormatReading(): (
  value: number | "OL",
  unit: StoredUnit,
  options?: { isRise?: boolean },
) => string {
  const { t } = useTranslation();
  const system = useUnitsShown();
  return useCallback(
    (value, unit, options) => {
      const { figure, unitKey } = showReading(value, unit, system, options);
      return `${figure} ${t(unitKey)}`;
    },
    [t, system],
  );
}
