import { describe, expect, it } from "vitest";
import { CHECKS, judgeReading, readingLimits } from "@emberladder/furnace";

/** Impossible readings are refused, unlikely ones ask to be confirmed. UX-17: each edge, from both sides. */
const quantities = CHECKS.flatMap((check) => check.units.map((unit) => ({ check: check.id, unit })));

describe("the limits of every reading of the catalogue", () => {
  it("are in order: what is likely lies within what is possible", () => {
    expect(quantities.length).toBeGreaterThan(60);
    for (const { check, unit } of quantities) {
      const { least, most, likely } = readingLimits(check, unit);
      expect(least, check).toBeLessThan(most);
      expect(likely[0], check).toBeGreaterThanOrEqual(least);
      expect(likely[1], check).toBeLessThanOrEqual(most);
      expect(likely[0], check).toBeLessThanOrEqual(likely[1]);
    }
  });

  it("take the edge itself and refuse what is beyond it", () => {
    for (const { check, unit } of quantities) {
      const { least, most } = readingLimits(check, unit);
      const said = [least, most, least - 1, most + 1].map((value) => judgeReading(check, unit, value));
      expect(said.slice(0, 2), `${check} ${unit}`).not.toContain("impossible");
      expect(said.slice(2), `${check} ${unit}`).toEqual(["impossible", "impossible"]);
    }
  });

  it("take what is likely without a question and ask about what is not", () => {
    for (const { check, unit } of quantities) {
      const { least, most, likely } = readingLimits(check, unit);
      const inside = likely.map((value) => judgeReading(check, unit, value));
      expect(new Set(inside), `${check} ${unit}`).toEqual(new Set(["likely"]));
      const beyond = [(least + likely[0]) / 2, (most + likely[1]) / 2].filter(
        (value) => value < likely[0] || value > likely[1],
      );
      for (const value of beyond)
        expect(judgeReading(check, unit, value), `${check} ${value}`).toBe("unlikely");
    }
  });
});
