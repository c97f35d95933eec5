import { displayReading } from "@emberladder/field-math";
import type { StoredUnit } from "@emberladder/field-math";
import { CHECK_IDS, classInBand, resolveBands } from "@emberladder/furnace";
import { describe, expect, it } from "vitest";
import { roundTo, roundToStore } from "../../../apps/web/src/lib/typed-reading.ts";
import { natureOf } from "../../../apps/web/src/lib/use-reading-units.ts";
import { buildProfile } from "../furnace/build-profile.ts";

const figures = {
  switchMakeInwc: 0.62,
  manifoldHighInwc: 3.5,
  riseMinF: 35,
  riseMaxF: 65,
  staticMaxInwc: 0.5,
};
const profile = buildProfile({ plate: figures });

/** The figure as a screen writes it in SI. */
function shownInSi(stored: number, unit: StoredUnit, isDifference = false): number {
  const shown = displayReading(stored, unit, "si", { isDifference });
  return roundTo(shown.value, shown.decimals);
}

const edges = CHECK_IDS.flatMap((check) =>
  resolveBands(check, profile).flatMap((band) =>
    band.segments.flatMap(({ from }) => (Number.isFinite(from) ? [{ check, band, edge: from }] : [])),
  ),
).filter(({ band }) => displayReading(0, band.unit, "si").unit !== band.unit);

describe("a reading typed in SI", () => {
  it("is held against limits in Pa, C and mm", () => {
    expect(new Set(edges.map(({ band }) => band.unit))).toEqual(new Set(["inwc", "F", "in"]));
    expect(edges.length).toBeGreaterThan(15);
  });

  it.each(edges)("has the class of the limit where it is typed at it: $check, $edge $band.unit", (given) => {
    const { check, band, edge } = given;
    const nature = natureOf(check);
    const typed = shownInSi(edge, band.unit, nature.isDifference);
    const limits = band.segments.map(({ from }) => from);
    const stored = roundToStore(typed, band.unit, "si", nature, limits);
    expect(stored).toBe(edge);
    expect(classInBand(band, stored)).toBe(classInBand(band, edge));
  });

  it("has the class of the zone it is typed into, a tenth of a pascal beside the limit", () => {
    // 0.62 in. w.c. is 154.4 Pa (GNU units: 1 inH2O is 249.08891 Pa).
    const limit = 0.62;
    expect(roundToStore(154.4, "inwc", "si", {}, [limit])).toBe(limit);
    expect(roundToStore(154.3, "inwc", "si", {}, [limit])).toBeLessThan(limit);
    expect(roundToStore(154.5, "inwc", "si", {}, [limit])).toBeGreaterThan(limit);
  });

  it("meets a limit that no round figure stands for, on either side of zero", () => {
    expect(roundToStore(78.5, "inwc", "si", {}, [0.31517])).toBe(0.31517);
    expect(roundToStore(-78.5, "inwc", "si", {}, [0.31517])).toBe(-0.31517);
  });

  // 1 inH2O is 249.08891 Pa (GNU units); a rise of 9 F is one of 5 C, and 68 F is 20 C (definition).
  it.each([
    [77, "inwc", false, 0.309],
    [871.8, "inwc", false, 3.5],
    [-12.5, "inwc", false, -0.05],
    [25, "F", true, 45],
    [20, "F", false, 68],
    [2.54, "in", false, 0.1],
    [0, "inwc", false, 0],
  ] as const)(
    "is recorded in the gauge's unit, as round as it can be: %d for %s",
    (typed, unit, isDifference, stored) => {
      expect(roundToStore(typed, unit, "si", { isDifference })).toBe(stored);
    },
  );

  it.each(["inwc", "in", "F", "CFM", "cfh"] as const)(
    "shows again as it was typed, whatever it is, where %s is recorded",
    (unit) => {
      const { decimals } = displayReading(0, unit, "si");
      for (let step = -400; step <= 4000; step++) {
        const typed = roundTo((step * 7) / 10 ** decimals, decimals);
        expect(shownInSi(roundToStore(typed, unit, "si"), unit)).toBe(typed);
      }
    },
  );

  it.each(["V", "uA", "ohm", "ppm", "pct", "s"] as const)(
    "is recorded as typed where both systems have %s",
    (unit) => {
      expect(roundToStore(2.4137, unit, "si", {}, [2.41])).toBe(2.4137);
    },
  );
});

describe("a reading typed in inch-pound units", () => {
  it("is recorded digit for digit, beside a limit too", () => {
    expect(roundToStore(0.3101, "inwc", "inch-pound", {}, [0.31])).toBe(0.3101);
  });
});
