import type { ChainDevice } from "@emberladder/furnace";

/** Devices of the 24 V safety string. */
export const chainDevices: Readonly<Record<ChainDevice, string>> = {
  fuse: "Control fuse",
  thermostat: "Thermostat",
  limit: "Limit",
  "aux-limit": "Auxiliary limit",
  rollout: "Rollout switch",
  "rollout-2": "Second rollout switch",
  "fusible-link": "Thermal link",
  "spill-switch": "Spill switch",
  "vent-damper-end-switch": "Vent damper end switch",
  "overflow-switch": "Overflow switch",
  "smoke-contact": "Smoke contact",
  "airflow-switch": "Airflow switch",
  "low-limit": "Low limit",
  "pressure-switch": "Pressure switch",
  "pressure-switch-2": "High-stage pressure switch",
  "centrifugal-switch": "Centrifugal switch",
};
