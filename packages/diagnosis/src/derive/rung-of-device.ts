import type { Stage } from "@emberladder/furnace";

const RUNG: Record<string, Stage> = {
  thermostat: "call",
  fuse: "power",
  "door-switch": "power",
  limit: "safeties",
  "aux-limit": "safeties",
  rollout: "safeties",
  "rollout-2": "safeties",
  "pressure-switch": "draft-proved",
  "pressure-switch-2": "draft-proved",
  "centrifugal-switch": "draft-proved",
};

/** The rung on which a bypassed device sits; undefined for a device that is not drawn. */
export function rungOfDevice(device: string): Stage | undefined {
  return RUNG[device];
}
