import { describe, expect, it } from "vitest";
import { showReading } from "../../../apps/web/src/lib/units.ts";

describe("a stored reading on a screen", () => {
  it("is written digit for digit where inch-pound units are shown", () => {
    expect(showReading(0.31, "inwc", "inch-pound")).toEqual({ figure: "0.31", unitKey: "trade:units.inwc" });
    expect(showReading(80_000, "btuh", "inch-pound")).toEqual({
      figure: "80,000",
      unitKey: "desk:plateUnits.btuh",
    });
  });

  // 1 inch of water, conventional = 249.08891 Pa (GNU units, `inH2O`); 32 F is 0 C, 212 F is 100 C (definition).
  it.each([
    [1, "inwc", "249.1", "desk:siUnits.Pa"],
    [212, "F", "100", "desk:siUnits.C"],
    [32, "F", "0", "desk:siUnits.C"],
    [1, "in", "25.4", "desk:siUnits.mm"],
  ] as const)("shows %d %s in SI as %s", (value, unit, figure, unitKey) => {
    expect(showReading(value, unit, "si")).toEqual({ figure, unitKey });
  });

  it("converts a temperature rise without the offset of the scale", () => {
    expect(showReading(45, "F", "si", { isRise: true }).figure).toBe("25");
  });

  it.each(["V", "A", "uA", "ohm", "ppm", "s"] as const)("shows %s alike in both systems", (unit) => {
    expect(showReading(2.4, unit, "si")).toEqual(showReading(2.4, unit, "inch-pound"));
  });

  it("says OL for a value beyond the meter's range in both systems", () => {
    expect(showReading("OL", "ohm", "inch-pound").figure).toBe("OL");
    expect(showReading("OL", "inwc", "si").figure).toBe("OL");
  });
});
