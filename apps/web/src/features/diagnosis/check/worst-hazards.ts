import type { Hazard, UnitProfile } from "@emberladder/furnace";

/** Hazards from the worst down, so that the first lines are the ones that kill. Judgement. */
const WORST_FIRST: readonly Hazard[] = [
  "GAS",
  "CO",
  "HVAC",
  "FALL",
  "HV-SPK",
  "CAP",
  "ROT",
  "HOT",
  "CUT",
  "WATER",
  "LV",
];

/** Hazard lines of a check: one a hazard, the worst first, at most two so that the answer stays in sight. */
export function worstHazards(hazards: readonly Hazard[], profile: UnitProfile): Hazard[] {
  const { location } = profile.codes;
  return WORST_FIRST.filter(
    (hazard) => hazards.includes(hazard) && (hazard !== "FALL" || location !== "IND"),
  ).slice(0, 2);
}
