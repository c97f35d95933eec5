/** Devices of which the question of a jumper comes up. */
export const JUMPER_DEVICES = [
  "thermostat",
  "door-switch",
  "limit",
  "rollout",
  "aux-limit",
  "spill-switch",
  "vent-limit",
  "pressure-switch",
  "centrifugal-switch",
  "flame-sensor",
  "thermocouple",
  "gas-valve",
  "overflow-switch",
  "smoke-contact",
  "control-fuse",
] as const;
export type JumperDevice = (typeof JUMPER_DEVICES)[number];

/** What has to be recorded before a jumper goes on, and how it comes off. */
export type JumperCondition =
  "attended" | "gas-shut" | "power-off-to-fit" | "power-off-to-remove" | "end-call-first";

export interface JumperRule {
  readonly allowed: boolean;
  /** Seconds it may stay. */
  readonly limitS?: number;
  readonly conditions?: readonly JumperCondition[];
  /** What proves the device instead. */
  readonly instead?: "in-and-out-volts" | "hand-pump" | "volts-in-a-real-trial" | "same-rating" | "authority";
}

/**
 * Which devices may be bridged for a moment to find a fault, and how. Nothing on the gas valve's terminals, ever:
 * no jumper and no supply, gas on or off. Common practice.
 */
export const JUMPER_RULES: Readonly<Record<JumperDevice, JumperRule>> = {
  thermostat: { allowed: true, limitS: 300, conditions: ["attended", "end-call-first"] },
  "door-switch": {
    allowed: true,
    limitS: 600,
    conditions: ["attended", "power-off-to-fit", "power-off-to-remove"],
  },
  limit: { allowed: false, instead: "in-and-out-volts" },
  rollout: { allowed: false, instead: "in-and-out-volts" },
  "aux-limit": { allowed: false, instead: "in-and-out-volts" },
  "spill-switch": { allowed: false, instead: "in-and-out-volts" },
  "vent-limit": { allowed: false, instead: "in-and-out-volts" },
  "pressure-switch": {
    allowed: true,
    limitS: 60,
    conditions: ["gas-shut", "power-off-to-fit", "power-off-to-remove", "attended"],
    instead: "hand-pump",
  },
  "centrifugal-switch": {
    allowed: true,
    limitS: 60,
    conditions: ["gas-shut", "power-off-to-fit", "power-off-to-remove", "attended"],
  },
  "flame-sensor": { allowed: false },
  thermocouple: { allowed: false },
  "gas-valve": { allowed: false, instead: "volts-in-a-real-trial" },
  "overflow-switch": { allowed: false, instead: "in-and-out-volts" },
  "smoke-contact": { allowed: false, instead: "authority" },
  "control-fuse": { allowed: false, instead: "same-rating" },
};

/** The rule of a device, or undefined where the device is not one that is ever bridged or asked about. */
export function jumperRuleOf(device: string): JumperRule | undefined {
  const known = JUMPER_DEVICES.find((candidate) => candidate === device);
  return known && JUMPER_RULES[known];
}
