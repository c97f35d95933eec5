import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { UNIT_SYSTEMS, displayReading, storedReading } from "@emberladder/field-math";
import type { StoredUnit } from "@emberladder/field-math";
import { READING_UNITS } from "@emberladder/furnace";

const UNITS: readonly StoredUnit[] = [...READING_UNITS, "btuh"];
const unit = fc.constantFrom(...UNITS);
// Btu/h are worked out and never typed; their last digit means nothing.
const typedUnit = fc.constantFrom(...READING_UNITS);
const system = fc.constantFrom(...UNIT_SYSTEMS);
const figure = fc.double({ min: -5000, max: 5000, noNaN: true });
const difference = fc.boolean();

describe("a reading shown in the other system (UX-37)", () => {
  it("keeps the stored value and unit where inch-pound units are shown", () => {
    fc.assert(
      fc.property(figure, unit, (value, stored) => {
        expect(displayReading(value, stored, "inch-pound")).toMatchObject({ value, unit: stored });
      }),
    );
  });

  it("comes back to the stored value from what is shown, in both systems", () => {
    fc.assert(
      fc.property(figure, unit, system, difference, (value, stored, shownIn, isDifference) => {
        const shown = displayReading(value, stored, shownIn, { isDifference });
        expect(storedReading(shown.value, stored, shownIn, { isDifference })).toBeCloseTo(value, 8);
      }),
    );
  });

  it("comes back within one unit of the last stored digit from the figure as it is written", () => {
    fc.assert(
      fc.property(fc.integer({ min: -2000, max: 2000 }), typedUnit, system, (digits, stored, shownIn) => {
        const { decimals } = displayReading(0, stored, "inch-pound");
        const value = digits / 10 ** decimals;
        const shown = displayReading(value, stored, shownIn);
        const written = Number(shown.value.toFixed(shown.decimals));
        const back = storedReading(written, stored, shownIn);
        expect(Math.abs(back - value)).toBeLessThanOrEqual(10 ** -decimals);
      }),
    );
  });

  it.each([
    [3.5, "inwc", 871.8, "Pa"],
    [0.125, "in", 3.175, "mm"],
    [32, "F", 0, "C"],
    [1077, "CFM", 508.3, "Lps"],
    [110.8, "cfh", 3.1375, "m3h"],
    [100_000, "btuh", 29.307, "kW"],
  ] as const)("shows %f %s as %f %s", (value, stored, expected, si) => {
    const shown = displayReading(value, stored, "si");
    expect(shown.unit).toBe(si);
    expect(shown.value).toBeCloseTo(expected, 1);
  });

  it("converts a rise without the offset of the thermometer", () => {
    expect(displayReading(54, "F", "si", { isDifference: true }).value).toBeCloseTo(30, 10);
    expect(displayReading(54, "F", "si").value).toBeCloseTo(12.22, 2);
  });

  it("leaves volts, amps, ohms, ppm and seconds as they are", () => {
    for (const same of ["V", "mV", "uA", "A", "ohm", "Mohm", "ppm", "pct", "s", "uF"] as const) {
      expect(displayReading(4.1, same, "si")).toMatchObject({ value: 4.1, unit: same });
    }
  });
});
