import { cubicMetresPerHourToCfh } from "./convert-units.ts";

/**
 * Gas flow by the meter, in cubic feet an hour: `turns` of a dial of `dialFt3` a turn in `seconds`. All other
 * appliances and pilots are off. Arithmetic.
 * @returns NaN where no time has passed
 */
export function meterFlowCfh(dialFt3: number, turns: number, seconds: number): number {
  return seconds > 0 ? (3600 * dialFt3 * turns) / seconds : Number.NaN;
}

/** Gas flow by a metric meter, in cubic feet an hour: `turns` of a dial of `dialM3` cubic metres in `seconds`. */
export function metricMeterFlowCfh(dialM3: number, turns: number, seconds: number): number {
  return cubicMetresPerHourToCfh(meterFlowCfh(dialM3, turns, seconds));
}

/** Seconds that one turn of a dial takes at an input. Arithmetic. */
export function secondsPerTurn(dialFt3: number, inputBtuh: number, heatingValueBtuPerFt3: number): number {
  return (3600 * dialFt3 * heatingValueBtuPerFt3) / inputBtuh;
}

/** Input burned, in Btu/h: gas flow times its heating value as delivered. */
export function inputFromFlowBtuh(flowCfh: number, heatingValueBtuPerFt3: number): number {
  return flowCfh * heatingValueBtuPerFt3;
}

/**
 * What an uncompensated meter's flow is multiplied by to get cubic feet at 14.73 psia and 60 degrees
 * Fahrenheit: gas laws. Pressures in psi, temperature in degrees Fahrenheit.
 */
export function meterCorrection(atmosphericPsia: number, gaugePsi: number, gasF: number): number {
  return (((atmosphericPsia + gaugePsi) / 14.73) * 519.67) / (gasF + 459.67);
}

/** Input as a share of what the unit should burn, in percent. */
export function percentOfInput(inputBtuh: number, rightInputBtuh: number): number {
  return (100 * inputBtuh) / rightInputBtuh;
}

/**
 * Input at another manifold pressure through the same orifice, in Btu/h: flow goes with the square root of
 * the pressure (orifice equation). Pressures in the same unit.
 */
export function inputAtManifoldBtuh(inputBtuh: number, manifold: number, newManifold: number): number {
  return inputBtuh * Math.sqrt(newManifold / manifold);
}

/** Manifold pressure that would give another input through the same orifice, in the unit of `manifold`. */
export function manifoldForInput(manifold: number, inputBtuh: number, newInputBtuh: number): number {
  return manifold * (newInputBtuh / inputBtuh) ** 2;
}

/**
 * Flow of one burner orifice, in cubic feet an hour: 1658.5 K A sqrt(h / SG), with the hole in inches and the
 * pressure in inches of water. K is 0.90 for a tapered drilled spud. Gas engineers' handbooks, from memory; it
 * gives the printed orifice tables to three digits.
 */
export function orificeFlowCfh(
  holeIn: number,
  pressureInwc: number,
  specificGravity: number,
  dischargeFactor = 0.9,
): number {
  const areaIn2 = (Math.PI / 4) * holeIn ** 2;
  return 1658.5 * dischargeFactor * areaIn2 * Math.sqrt(pressureInwc / specificGravity);
}

/** Wobbe number of a gas: heat that the same orifice passes at the same pressure goes with it. */
export function wobbeNumber(heatingValueBtuPerFt3: number, specificGravity: number): number {
  return heatingValueBtuPerFt3 / Math.sqrt(specificGravity);
}
