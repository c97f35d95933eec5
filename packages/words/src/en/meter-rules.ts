import type { MeterRule } from "@emberladder/furnace";

/** Rules of handling a meter. */
export const meterRules: Readonly<Record<MeterRule, string>> = {
  "prove-meter": "Prove the meter on a known source, before and after.",
  "no-live-ohms": "Never measure ohms live.",
  "low-z-for-ghosts": "Low impedance settles ghost volts. High for flame sense and millivolts.",
  "microamps-in-series": "Microamps need a DC microamp jack, in series.",
  "say-stage-and-place": "Value, unit, place, stage. A number without its stage proves nothing.",
  "zero-outdoors": "Zero the CO meter outdoors, the manometer at rest.",
  "category-rating": "CAT III 600 everywhere. CAT III 1000 or CAT IV 600 on 480 V.",
  "zero-across-is-not-closed": "0 V across is not closed. Read in volts and out volts.",
};
