/**
 * How a plate's input is reduced with altitude. Two readings of the older rule circulate and newer units are
 * certified with a smaller one, so the rule is a setting: the unit's own instructions and the local code
 * outrank all of them.
 */
export type AltitudeRule = "4-from-sea-level" | "4-above-2000" | "2-from-sea-level" | "none";

/** No rule reduces input up to this altitude, in feet (610 m). NFPA 54 11.1.2, from memory. */
export const DERATE_STARTS_FT = 2000;

/**
 * The share of the plate's input that a unit may burn at an altitude, 0 to 1.
 *
 * - `4-from-sea-level`: above 2,000 ft, 4 percent for each 1,000 ft counted from sea level. NFPA 54 Annex E
 *   orifice table, as a trade magazine prints it ("4 % for each 1,000 ft above sea level").
 * - `4-above-2000`: the other reading of it, counted from 2,000 ft. Common practice.
 * - `2-from-sea-level`: newer certified units, 2 percent for each 1,000 ft from sea level. From memory.
 * - `none`: the instructions ask for no reduction, or the utility has already thinned its gas.
 */
export function altitudeFactor(altitudeFt: number, rule: AltitudeRule): number {
  if (rule === "none" || altitudeFt <= DERATE_STARTS_FT) return 1;
  const percentPerThousandFt = rule === "2-from-sea-level" ? 2 : 4;
  const countedFt = rule === "4-above-2000" ? altitudeFt - DERATE_STARTS_FT : altitudeFt;
  return Math.max(0, 1 - (percentPerThousandFt / 100) * (countedFt / 1000));
}

/** The input a unit should burn at its site, in Btu/h: the plate's, reduced by the rule in force. */
export function inputAtSiteBtuh(plateInputBtuh: number, altitudeFt: number, rule: AltitudeRule): number {
  return plateInputBtuh * altitudeFactor(altitudeFt, rule);
}

/**
 * Air pressure at an altitude as a share of that at sea level, by the International Standard Atmosphere
 * (troposphere; altitude in feet).
 */
export function standardPressureRatio(altitudeFt: number): number {
  return (1 - 6.8756e-6 * altitudeFt) ** 5.2559;
}
