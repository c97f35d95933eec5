import {
  CONTROLS,
  DRAFTS,
  FUELS,
  IGNITIONS,
  LOCATIONS,
  STAGINGS,
  unitProfileSchema,
} from "@emberladder/furnace";
import type { UnitProfile, VariantCodes } from "@emberladder/furnace";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  chainDeviceApplies,
  optionApplies,
  plateFieldsFor,
  timingFieldsFor,
} from "../../../apps/web/src/features/units/profile-fields.ts";
import { pruneProfile } from "../../../apps/web/src/features/units/prune-profile.ts";
import { unitFormSchema } from "../../../apps/web/src/features/units/unit-form-schema.ts";

const COMMON: VariantCodes = {
  ignition: "HSI",
  draft: "IDP",
  staging: "1S",
  location: "IND",
  control: "IFC",
  fuel: "NG",
};
const anyCodes: fc.Arbitrary<VariantCodes> = fc.record({
  ignition: fc.constantFrom(...IGNITIONS),
  draft: fc.constantFrom(...DRAFTS),
  staging: fc.constantFrom(...STAGINGS),
  location: fc.constantFrom(...LOCATIONS),
  control: fc.constantFrom(...CONTROLS),
  fuel: fc.constantFrom(...FUELS),
});
const build = (change: Partial<UnitProfile> = {}): UnitProfile =>
  unitProfileSchema.parse({ codes: COMMON, ...change });
const names = (codes: VariantCodes) => plateFieldsFor(codes).map((field) => field.name);

describe("what the form of a unit asks", () => {
  // Which parts come with which kind of unit: common practice.
  it("asks for the igniter on hot surface and for the gap on spark, never for both", () => {
    expect(names(COMMON)).toContain("igniterOhmMin");
    expect(names(COMMON)).not.toContain("sparkGapMinIn");
    expect(names({ ...COMMON, ignition: "DSI" })).toContain("sparkGapMinIn");
    expect(names({ ...COMMON, ignition: "DSI" })).not.toContain("igniterOhmMin");
  });

  it("asks nothing of an inducer where the draft is natural", () => {
    const codes: VariantCodes = { ...COMMON, ignition: "SP", draft: "ND", control: "CV" };
    expect(names(codes)).not.toContain("inducerFlaA");
    expect(names(codes)).not.toContain("switchMakeInwc");
    expect(timingFieldsFor(codes).map((field) => field.name)).not.toContain("prepurgeS");
    expect(optionApplies("psc-inducer", codes)).toBe(false);
    expect(chainDeviceApplies("spill-switch", codes)).toBe(true);
  });

  it("asks for the second stage only where there is one", () => {
    expect(names(COMMON)).not.toContain("manifoldLowInwc");
    expect(names({ ...COMMON, staging: "2S" })).toContain("manifoldLowInwc");
    expect(chainDeviceApplies("pressure-switch-2", COMMON)).toBe(false);
  });

  it("keeps only answers to what is asked, for every kind of unit", () => {
    const everything = {
      plate: {
        igniterOhmMin: 40,
        sparkGapMinIn: 0.1,
        manifoldLowInwc: 1.7,
        inducerFlaA: 1,
        fuseA: null,
        phase: 3 as const,
      },
      timings: { prepurgeS: 15, warmUpS: 20, trialS: 5, stageTwoDelayS: 600 },
      options: { "belt-blower": true, "psc-inducer": false, "vent-damper": true },
      chain: {
        arrangement: "series" as const,
        order: ["limit", "spill-switch", "pressure-switch", "smoke-contact"] as const,
      },
    };
    fc.assert(
      fc.property(anyCodes, (codes) => {
        const kept = pruneProfile(
          unitProfileSchema.parse({
            codes,
            ...everything,
            chain: { ...everything.chain, order: [...everything.chain.order] },
          }),
        );
        const asked = new Set<string>(names(codes));
        expect(Object.keys(kept.plate).every((name) => asked.has(name))).toBe(true);
        expect(kept.chain?.order.every((device) => chainDeviceApplies(device, codes)) ?? true).toBe(true);
        expect(unitProfileSchema.safeParse(kept).success).toBe(true);
      }),
    );
  });

  it("sets the altitude option from the altitude, and leaves it unknown without one", () => {
    expect(pruneProfile(build({ altitudeFt: 4300 })).options.altitude).toBe(true);
    expect(pruneProfile(build({ altitudeFt: 2000 })).options.altitude).toBe(false);
    expect(pruneProfile(build()).options.altitude).toBeUndefined();
  });
});

describe("sending the form of a unit", () => {
  const schema = unitFormSchema((reason) => `words for ${reason}`);
  const judge = (profile: UnitProfile) => {
    const parsed = schema.safeParse({ name: "Furnace 1", profile });
    return parsed.success ? [] : parsed.error.issues.map((issue) => [issue.path.join("."), issue.message]);
  };

  it("takes a unit of which only the kind and the name are known", () => {
    expect(judge(build())).toEqual([]);
  });

  it("refuses a kind that no real unit has, at the field that is at fault", () => {
    expect(judge(build({ codes: { ...COMMON, draft: "ND" } }))).toContainEqual([
      "profile.codes.draft",
      "words for direct-ignition-needs-induced-draft",
    ]);
  });

  it("refuses a least above its most", () => {
    expect(judge(build({ plate: { riseMinF: 70, riseMaxF: 40 } }))).toEqual([
      ["profile.plate.riseMinF", "words for least-above-most"],
    ]);
  });

  it("does not judge an answer that the kind no longer asks for", () => {
    expect(judge(build({ plate: { sparkGapMinIn: 0.5, sparkGapMaxIn: 0.1 } }))).toEqual([]);
  });

  it("refuses a band whose chain cannot be read, and says where", () => {
    const bands = [{ check: "ck-lv-current", chain: "F < x <= G", source: "Plate" }];
    expect(judge(build({ bands }))[0]?.[0]).toBe("profile.bands.0.chain");
  });
});
