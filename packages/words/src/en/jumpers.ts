import type { JumperCondition, JumperDevice } from "@emberladder/furnace";

/** Devices of which a jumper comes up. */
const devices: Readonly<Record<JumperDevice, string>> = {
  thermostat: "R to W at the unit",
  "door-switch": "Door switch",
  limit: "High limit",
  rollout: "Rollout switch",
  "aux-limit": "Auxiliary limit",
  "spill-switch": "Spill switch",
  "vent-limit": "Vent limit",
  "pressure-switch": "Pressure switch",
  "centrifugal-switch": "Centrifugal switch",
  "flame-sensor": "Flame sensor",
  thermocouple: "Thermocouple or its cutout",
  "gas-valve": "Gas valve terminals",
  "overflow-switch": "Overflow switch",
  "smoke-contact": "Smoke contact",
  "control-fuse": "Control fuse",
};

const conditions: Readonly<Record<JumperCondition, string>> = {
  attended: "Stay with it.",
  "gas-shut": "Record the gas shut first.",
  "power-off-to-fit": "Power off to fit it.",
  "power-off-to-remove": "Power off to take it off.",
  "end-call-first": "End the call first.",
};

/** Words of the jumper rules. */
export const jumpers = {
  devices,
  conditions,
  instead: {
    "in-and-out-volts": "Read in volts and out volts, or ohms dead.",
    "hand-pump": "Pump it by hand instead.",
    "volts-in-a-real-trial": "Read volts at the terminals in a real trial.",
    "same-rating": "Fit one of the same rating.",
    authority: "Only an authorised person clears it.",
  },
} as const;
