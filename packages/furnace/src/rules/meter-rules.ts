/** Rules of handling a meter, in the order in which they are shown. Common practice; CAT ratings of IEC 61010. */
export const METER_RULES = [
  "prove-meter",
  "no-live-ohms",
  "low-z-for-ghosts",
  "microamps-in-series",
  "say-stage-and-place",
  "zero-outdoors",
  "category-rating",
  "zero-across-is-not-closed",
] as const;
export type MeterRule = (typeof METER_RULES)[number];
