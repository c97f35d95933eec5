import type { Rung } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { formatNumber } from "#lib/format-number.ts";
import { useReadingUnits } from "#lib/use-reading-units.ts";

/**
 * Writes what was read on a rung, in the units shown: volts in and out, or the one figure; empty where nothing
 * was. Where it is narrow, the volts lost across stand for in and out.
 */
export function useRungFigures(): (rung: Rung, isNarrow?: boolean) => string {
  const { t } = useTranslation();
  const { write } = useReadingUnits();
  return ({ reading }, isNarrow = false) => {
    if (!reading) return "";
    if (reading.inV !== undefined && !isNarrow) {
      return t("inOut.values", {
        inV: formatNumber(reading.inV),
        outV: reading.outV === undefined ? "-" : formatNumber(reading.outV),
      });
    }
    // The only check that reads temperatures is the rise.
    return write(reading.value, reading.unit, { isDifference: reading.unit === "F" });
  };
}
