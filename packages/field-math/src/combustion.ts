/** Oxygen in dry air, percent by volume, as combustion analysers use it. Common practice. */
export const OXYGEN_IN_AIR_PCT = 20.9;
/** Above this much oxygen an air-free figure blows up a small error and is refused. Judgement. */
export const AIR_FREE_OXYGEN_LIMIT_PCT = 16;
/** Most carbon dioxide in dry flue gas, percent: pipeline gas 11.8, propane 13.7. Stoichiometry. */
export const MOST_CARBON_DIOXIDE_PCT = { NG: 11.8, LP: 13.7 } as const;

/**
 * Carbon monoxide freed from the air that dilutes the sample, in ppm: CO x 20.9 / (20.9 - O2).
 * @returns undefined where so much air is in the sample that the figure would mean nothing
 */
export function airFreeCoPpm(measuredPpm: number, oxygenPct: number): number | undefined {
  if (oxygenPct > AIR_FREE_OXYGEN_LIMIT_PCT) return undefined;
  return (measuredPpm * OXYGEN_IN_AIR_PCT) / (OXYGEN_IN_AIR_PCT - oxygenPct);
}

/** Carbon dioxide of dry flue gas in percent, from its oxygen. Stoichiometry. */
export function carbonDioxidePct(oxygenPct: number, fuel: keyof typeof MOST_CARBON_DIOXIDE_PCT): number {
  return (MOST_CARBON_DIOXIDE_PCT[fuel] * (OXYGEN_IN_AIR_PCT - oxygenPct)) / OXYGEN_IN_AIR_PCT;
}

/**
 * Excess air of burning methane in percent, from the oxygen of dry flue gas. One volume of methane makes 8.547
 * volumes of dry flue gas and takes 9.547 of air; oxygen of air 20.95 percent. Stoichiometry.
 */
export function excessAirPct(oxygenPct: number): number {
  return (100 * (8.547 / 9.547) * oxygenPct) / (20.95 - oxygenPct);
}
