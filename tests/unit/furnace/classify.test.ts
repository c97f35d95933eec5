import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  CHECK_IDS,
  CHECKS,
  READING_STAGES,
  READING_UNITS,
  WAY_IDS,
  classifyReading,
  findingsOf,
  judgeReading,
  readingLimits,
} from "@emberladder/furnace";
import type { Reading } from "@emberladder/furnace";
import { buildManyProfiles, buildProfile } from "./build-profile.ts";

const profile = buildProfile();
const outcomeOf = (reading: Reading, unit = profile) => classifyReading(reading, unit).outcome;

describe("the In V / Out V rule of a 24 V contact (common practice: 22 V in and out closed, under 18 V out open)", () => {
  const limit = (inV: number, outV: number) =>
    classifyReading({ check: "ck-limit-voltage", inV, outV }, profile);

  it("is closed with 22 V or more on both sides and a drop of half a volt at most", () => {
    expect(limit(25.3, 25.1).outcome).toBe("good");
    expect(limit(22, 22).outcome).toBe("good");
  });

  it("is a bad contact with up to 3 V across, and counts as open above", () => {
    expect(limit(25, 23).outcome).toBe("marginal");
    expect(limit(25, 22).outcome).toBe("marginal");
    expect(limit(26, 22.9).outcome).toBe("fail");
  });

  it("is open with 22 V in and under 18 V out", () => {
    expect(limit(24.8, 0).outcome).toBe("fail");
    expect(limit(22, 17.9).outcome).toBe("fail");
  });

  it("is never better than marginal with 18 to 22 V out", () => {
    expect(limit(22.1, 21.9).outcome).toBe("marginal");
    expect(limit(24, 19).outcome).toBe("fail");
  });

  it("says nothing with less than 22 V in, whatever is across", () => {
    expect(limit(21.9, 0)).toMatchObject({ finding: "no-path" });
    expect(limit(0, 0)).toMatchObject({ finding: "no-path" });
    expect(limit(0, 0).outcome).toBeUndefined();
  });

  it("says nothing where 0 V across was read and neither side", () => {
    const across = classifyReading({ check: "ck-limit-voltage", value: 0, unit: "V" }, profile);
    expect(across.finding).toBe("no-path");
    expect(across.outcome).toBeUndefined();
  });

  it("adds up the second side where the value across and one side are given", () => {
    expect(outcomeOf({ check: "ck-limit-voltage", value: 25, unit: "V", inV: 25 })).toBe("fail");
    expect(outcomeOf({ check: "ck-limit-voltage", value: 0.2, unit: "V", inV: 25 })).toBe("good");
  });

  it("turns round for a switch that has to be open before start", () => {
    const rest = (inV: number, outV: number) =>
      outcomeOf({ check: "ck-pressure-switch-rest", inV, outV, power: "ON-idle" });
    expect(rest(25, 0)).toBe("good");
    expect(rest(25, 24.9)).toBe("fail");
    expect(rest(25, 15)).toBe("marginal");
    expect(rest(10, 0)).toBeUndefined();
  });
});

describe("numbers and their bands", () => {
  it.each<[Reading, string]>([
    [{ check: "ck-line-voltage", value: 107.9, unit: "V" }, "fail"],
    [{ check: "ck-line-voltage", value: 108, unit: "V" }, "marginal"],
    [{ check: "ck-line-voltage", value: 110, unit: "V" }, "good"],
    [{ check: "ck-line-voltage", value: 126, unit: "V" }, "good"],
    [{ check: "ck-line-voltage", value: 126.1, unit: "V" }, "marginal"],
    [{ check: "ck-line-voltage", value: 130.1, unit: "V" }, "fail"],
    [{ check: "ck-flame-current", value: 0.2, unit: "uA" }, "fail"],
    [{ check: "ck-flame-current", value: 0.5, unit: "uA" }, "marginal"],
    [{ check: "ck-flame-current", value: 2, unit: "uA" }, "good"],
    [{ check: "ck-burner-ground", value: "OL", unit: "ohm" }, "fail"],
    [{ check: "ck-sensor-insulation", value: "OL", unit: "Mohm" }, "good"],
    [{ check: "ck-igniter-ohms", value: "OL", unit: "ohm" }, "fail"],
    [{ check: "ck-gas-detector", value: 0.9, unit: "pct" }, "good"],
    [{ check: "ck-gas-detector", value: 1, unit: "pct" }, "marginal"],
    [{ check: "ck-inlet-pressure-running", value: 4.5, unit: "inwc" }, "marginal"],
    [{ check: "ck-inlet-pressure-running", value: 1.1, unit: "inwc", way: "drop" }, "fail"],
    [{ check: "ck-flue-analysis", value: 90, unit: "ppm" }, "good"],
    [{ check: "ck-flue-analysis", value: 2, unit: "pct" }, "fail"],
    [{ check: "ck-flue-analysis", value: 2, unit: "pct", way: "oxygen-change" }, "fail"],
    [{ check: "ck-flue-analysis", value: 0.4, unit: "pct", way: "oxygen-change" }, "good"],
    [{ check: "ck-blower-timing", value: 150, unit: "s", stage: "satisfied" }, "good"],
    [{ check: "ck-blower-timing", value: 150, unit: "s", stage: "blower-on" }, "fail"],
    [{ check: "ck-centrifugal-switch", value: "OL", unit: "ohm" }, "good"],
  ])("%j is %s", (reading, outcome) => {
    expect(outcomeOf(reading)).toBe(outcome);
  });

  it("stops work at 70 ppm CO, and counts it as failed", () => {
    expect(classifyReading({ check: "ck-co-ambient", value: 70, unit: "ppm" }, profile)).toMatchObject({
      outcome: "fail",
      stop: true,
    });
    expect(classifyReading({ check: "ck-co-ambient", value: 69, unit: "ppm" }, profile).stop).toBeUndefined();
  });

  it("has no class for ohms of an igniter whose kind the plate does not state", () => {
    expect(outcomeOf({ check: "ck-igniter-ohms", value: 60, unit: "ohm" })).toBeUndefined();
    const carbide = buildProfile({ plate: { igniterKind: "SiC" } });
    expect(outcomeOf({ check: "ck-igniter-ohms", value: 60, unit: "ohm" }, carbide)).toBe("good");
    expect(outcomeOf({ check: "ck-igniter-ohms", value: 111, unit: "ohm" }, carbide)).toBe("fail");
    expect(
      outcomeOf(
        { check: "ck-igniter-ohms", value: 9, unit: "ohm" },
        buildProfile({ codes: { ignition: "IPH" } }),
      ),
    ).toBe("good");
  });

  it("classes amps against the nameplate where it is stated", () => {
    const plated = buildProfile({ plate: { inducerFlaA: 1.4 } });
    expect(outcomeOf({ check: "ck-inducer-current", value: 1.4, unit: "A" }, plated)).toBe("good");
    expect(outcomeOf({ check: "ck-inducer-current", value: 3, unit: "A" }, plated)).toBe("fail");
    expect(outcomeOf({ check: "ck-inducer-current", value: 3, unit: "A" })).toBeUndefined();
  });
});

describe("findings", () => {
  it("can only lower the class that the number gives", () => {
    expect(
      outcomeOf({ check: "ck-flame-current", value: 4.1, unit: "uA", finding: "recovers-cleaned" }),
    ).toBe("good");
    expect(outcomeOf({ check: "ck-flame-current", value: 4.1, unit: "uA", finding: "drifts-down" })).toBe(
      "marginal",
    );
    expect(
      outcomeOf({ check: "ck-flame-current", value: 0.2, unit: "uA", finding: "recovers-cleaned" }),
    ).toBe("fail");
  });

  it("give the class themselves where they carry one and there is no number", () => {
    expect(outcomeOf({ check: "ck-visual-wiring", finding: "melted" })).toBe("fail");
    expect(outcomeOf({ check: "ck-board-status", finding: "flame-not-proved" })).toBe("marginal");
    expect(outcomeOf({ check: "ck-flame-current", finding: "low" })).toBeUndefined();
  });
});

describe("limits of readings", () => {
  it("refuse what no meter shows and ask about what is unlikely", () => {
    expect(judgeReading("ck-flame-current", "uA", 0.2)).toBe("likely");
    expect(judgeReading("ck-flame-current", "uA", 41)).toBe("unlikely");
    expect(judgeReading("ck-flame-current", "uA", 2000)).toBe("impossible");
    expect(judgeReading("ck-line-voltage", "V", -5)).toBe("impossible");
    expect(judgeReading("ck-limit-voltage", "V", 120)).toBe("unlikely");
    expect(judgeReading("ck-flue-analysis", "pct", 25)).toBe("impossible");
    expect(judgeReading("ck-limit-ohms", "ohm", "OL")).toBe("likely");
    expect(judgeReading("ck-lp-tank", "pct", Number.NaN)).toBe("impossible");
  });

  it("hold every finite edge of every band, so that no class is out of reach", () => {
    for (const { id, units } of CHECKS) {
      for (const unit of units) {
        const { least, most, likely } = readingLimits(id, unit);
        expect(least <= likely[0] && likely[0] < likely[1] && likely[1] <= most, `${id} ${unit}`).toBe(true);
      }
    }
  });
});

describe("classifying is total", () => {
  const profiles = buildManyProfiles();
  const number = fc.oneof(
    fc.double(),
    fc.constantFrom(0, 18, 22, Infinity, -Infinity, Number.NaN),
    fc.constant("OL" as const),
  );
  const volts = fc.option(fc.oneof(fc.double({ min: 0, max: 40 }), fc.constant(Number.NaN)), {
    nil: undefined,
  });

  it("gives every reading of every check on every unit a class or none, and never throws", () => {
    fc.assert(
      fc.property(
        fc.record({
          check: fc.constantFrom(...CHECK_IDS),
          value: fc.option(number, { nil: undefined }),
          unit: fc.option(fc.constantFrom(...READING_UNITS), { nil: undefined }),
          stage: fc.option(fc.constantFrom(...READING_STAGES), { nil: undefined }),
          power: fc.option(fc.constantFrom("ON", "OFF", "ON-idle", "ON-call", "any"), { nil: undefined }),
          way: fc.option(fc.constantFrom(...WAY_IDS, "unknown-way"), { nil: undefined }),
          inV: volts,
          outV: volts,
        }),
        fc.nat(),
        (reading, pick) => {
          const classified = classifyReading(reading, profiles[pick % profiles.length] ?? profile);
          const saysNothing = classified.finding === "no-path";
          expect(saysNothing ? [undefined] : [undefined, "good", "marginal", "fail"]).toContain(
            classified.outcome,
          );
        },
      ),
      { numRuns: 3000 },
    );
  });

  it("never lets a finding raise a class", () => {
    const rank = { good: 0, marginal: 1, fail: 2 };
    fc.assert(
      fc.property(
        fc.constantFrom(...CHECKS.filter((check) => check.units.length > 0)),
        fc.double({ min: -50, max: 500, noNaN: true }),
        fc.nat(),
        (check, value, pick) => {
          const findings = findingsOf(check.id);
          const unit = check.units[pick % check.units.length];
          const finding = findings[pick % Math.max(findings.length, 1)]?.id;
          const bare = classifyReading({ check: check.id, value, unit }, profile).outcome;
          const lowered = classifyReading({ check: check.id, value, unit, finding }, profile).outcome;
          const isRaised = bare !== undefined && lowered !== undefined && rank[lowered] < rank[bare];
          expect(isRaised).toBe(false);
        },
      ),
      { numRuns: 1500 },
    );
  });
});
