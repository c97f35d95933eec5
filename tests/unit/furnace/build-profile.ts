import { unitProfileSchema } from "@emberladder/furnace";
import type { UnitProfile, VariantCodes } from "@emberladder/furnace";

const HOT_SURFACE: VariantCodes = {
  ignition: "HSI",
  draft: "IDP",
  staging: "1S",
  location: "IND",
  control: "IFC",
  fuel: "NG",
};

/** A unit profile for a test: the commonest unit with what the test changes. */
export function buildProfile(
  overrides: { codes?: Partial<VariantCodes> } & Partial<Omit<UnitProfile, "codes">> = {},
): UnitProfile {
  const { codes, ...rest } = overrides;
  return unitProfileSchema.parse({ ...rest, codes: { ...HOT_SURFACE, ...codes } });
}

/** Units that differ in everything a band looks at, with and without their plates. */
export function buildManyProfiles(): UnitProfile[] {
  const codes: Partial<VariantCodes>[] = [
    {},
    { fuel: "LP" },
    { staging: "2S" },
    { staging: "MOD", draft: "CON", fuel: "LP" },
    { ignition: "SP", draft: "ND", control: "CV" },
    { ignition: "IPS", draft: "ND", control: "MOD-S" },
    { ignition: "IPH", control: "VMC", fuel: "LP" },
    { ignition: "DSI", draft: "IDC", location: "RTU" },
    { ignition: "IPS", draft: "IDC", location: "RTU", control: "MOD-S" },
  ];
  const plates: UnitProfile["plate"][] = [
    {},
    {
      switchMakeInwc: 0.62,
      highSwitchMakeInwc: 1.04,
      ratedVolts: 208,
      riseMinF: 35,
      riseMaxF: 65,
      transformerVa: 40,
      inducerFlaA: 1.4,
      blowerFlaA: 7.6,
      dropOutUa: 0.4,
      goodUa: 2,
      igniterKind: "SiN",
      igniterOhmMin: 44,
      igniterOhmMax: 66,
      inletMinInwc: 5,
      inletMaxInwc: 13,
      manifoldHighInwc: 3.4,
      manifoldLowInwc: 1.7,
      draftMinInwc: -0.03,
      sparkGapMinIn: 0.11,
      sparkGapMaxIn: 0.12,
      staticMaxInwc: 0.8,
    },
    // Figures that sit at or beyond the default edges next to them.
    {
      inletMinInwc: 14,
      inletMaxInwc: 14,
      riseMinF: 50,
      riseMaxF: 50,
      igniterKind: "SiC",
      igniterVolts: 80,
      igniterOhmMin: 90,
      igniterOhmMax: 90,
      sparkGapMinIn: 0.13,
      sparkGapMaxIn: 0.13,
      draftMinInwc: -0.02,
      switchMakeInwc: 0.05,
    },
  ];
  return codes.flatMap((changed) => plates.map((plate) => buildProfile({ codes: changed, plate })));
}
