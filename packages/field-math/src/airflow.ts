import { standardPressureRatio } from "./altitude.ts";

/** Density of standard air, lb/ft3: sea level, 70 degrees Fahrenheit. */
export const STANDARD_AIR_LB_PER_FT3 = 0.075;
/** Btu an hour that one CFM of standard air carries for each degree Fahrenheit: 60 x 0.075 x 0.24. */
export const BTUH_PER_CFM_DEGREE = 1.08;

/**
 * Density of air as a share of standard air, from its pressure in inches of mercury and its temperature in
 * degrees Fahrenheit. Gas laws.
 */
export function airDensityRatio(pressureInHg: number, temperatureF: number): number {
  return ((pressureInHg / 29.92) * 529.67) / (temperatureF + 459.67);
}

/** Density of air at an altitude as a share of standard air, by the standard atmosphere's pressure. */
export function airDensityRatioAt(altitudeFt: number, temperatureF = 70): number {
  return airDensityRatio(29.92 * standardPressureRatio(altitudeFt), temperatureF);
}

/**
 * Airflow in CFM from the heat put into the air and its temperature rise in degrees Fahrenheit. The result is
 * in CFM of air of the density given, as a share of standard air.
 * @returns NaN where there is no rise
 */
export function airflowFromRiseCfm(outputBtuh: number, riseF: number, densityRatio = 1): number {
  return riseF > 0 ? outputBtuh / (BTUH_PER_CFM_DEGREE * densityRatio * riseF) : Number.NaN;
}

/** Temperature rise in degrees Fahrenheit that an airflow in CFM gives. The other side of `airflowFromRiseCfm`. */
export function riseFromAirflowF(outputBtuh: number, airflowCfm: number, densityRatio = 1): number {
  return airflowCfm > 0 ? outputBtuh / (BTUH_PER_CFM_DEGREE * densityRatio * airflowCfm) : Number.NaN;
}
