import { displayReading, storedReading } from "@emberladder/field-math";
import type { ReadingNature, StoredUnit, UnitSystem } from "@emberladder/field-math";

/** Stored units never need more decimals than this to show every figure of a field gauge again. */
const MOST_DECIMALS = 6;

/**
 * The value to record for a figure typed in the units shown. It is in the stored unit and as round as it can be
 * while it still shows as what was typed: 49.8 Pa is recorded as 0.2 in. w.c. and not as 0.19993. A figure that
 * shows like one of the `limits` (in the stored unit) of its band is that limit, so that what is typed off the
 * scale's edge has the class of the edge. Units that both systems share are recorded as typed.
 *
 * @example roundToStore(77, "inwc", "si") // 0.309
 */
export function roundToStore(
  typed: number,
  unit: StoredUnit,
  system: UnitSystem,
  nature: ReadingNature = {},
  limits: readonly number[] = [],
): number {
  const { unit: shownUnit, decimals } = displayReading(0, unit, system, nature);
  if (shownUnit === unit) return typed;
  const shownAs = (stored: number) => roundTo(displayReading(stored, unit, system, nature).value, decimals);
  const wanted = roundTo(typed, decimals);
  // A band of magnitudes judges both signs by one limit.
  const limit = limits
    .filter(Number.isFinite)
    .flatMap((edge) => [edge, -edge])
    .find((edge) => shownAs(edge) === wanted);
  if (limit !== undefined) return limit;
  const exact = storedReading(typed, unit, system, nature);
  for (let places = 0; places < MOST_DECIMALS; places++) {
    const rounded = roundTo(exact, places);
    if (shownAs(rounded) === wanted) return rounded;
  }
  return roundTo(exact, MOST_DECIMALS);
}

/** Rounded to decimals; a zero never has a sign. */
export function roundTo(value: number, decimals: number): number {
  return Number(value.toFixed(decimals)) + 0;
}
