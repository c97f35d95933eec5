import type { UnitProfile } from "@emberladder/furnace";
import { chainDeviceApplies, optionApplies, plateFieldsFor, timingFieldsFor } from "./profile-fields.ts";

/** Feet above which a site counts as high, where input is derated by the commoner reading of the rule. */
const HIGH_SITE_FT = 2000;

/**
 * The profile as it is kept: without answers to questions that the six codes no longer ask, and with the altitude
 * flag as the altitude says. What was typed for another kind of unit never reaches the record.
 */
export function pruneProfile(profile: UnitProfile): UnitProfile {
  const { codes, altitudeFt } = profile;
  const plateNames = new Set<string>(plateFieldsFor(codes).map((field) => field.name));
  const timingNames = new Set<string>(timingFieldsFor(codes).map((field) => field.name));
  const keep = <T extends object>(values: T, isKept: (name: string) => boolean): T =>
    Object.fromEntries(
      Object.entries(values).filter(([name, value]) => value !== undefined && isKept(name)),
    ) as T;
  const options = keep(profile.options, (name) => optionApplies(name as keyof UnitProfile["options"], codes));
  const order = profile.chain?.order.filter((device) => chainDeviceApplies(device, codes)) ?? [];
  return {
    ...profile,
    plate: keep(profile.plate, (name) => plateNames.has(name)),
    timings: keep(profile.timings, (name) => timingNames.has(name)),
    options: altitudeFt === undefined ? options : { ...options, altitude: altitudeFt > HIGH_SITE_FT },
    chain: profile.chain && order.length > 0 ? { ...profile.chain, order } : undefined,
  };
}
