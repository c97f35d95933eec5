/** Kinds of thing that have to be put back before a diagnosis can close. */
export const PUT_BACK_KINDS = [
  "cover-removed",
  "gas-port-opened",
  "gas-joint-opened",
  "part-removed",
  "tube-pulled",
  "meter-in-series",
  "lead-lifted",
  "jumper-fitted",
  "valve-closed",
] as const;
export type PutBackKind = (typeof PUT_BACK_KINDS)[number];

/** What a check or a repair opens, lifts, takes out, fits or shuts. */
export const OPENED_THINGS = [
  "burner-door",
  "blower-door",
  "line-leads",
  "door-switch-clamp",
  "disconnect-cover",
  "control-fuse",
  "thermostat-leads",
  "r-lead",
  "unit-gas-valve",
  "r-w-jumper",
  "thermostat-cover",
  "thermostat-cable",
  "w-lead",
  "control-panel",
  "limit-lead",
  "rollout-lead",
  "damper-cover",
  "pressure-switch-lead",
  "pressure-switch-hose",
  "centrifugal-switch-lead",
  "inducer-plug",
  "inducer-capacitor-leads",
  "inducer",
  "cleanout-cover",
  "vent-cap",
  "intake-screen",
  "drain-hose",
  "condensate-trap",
  "burner-tray",
  "igniter-plug",
  "spark-lead",
  "thermocouple-nut",
  "gas-valve-leads",
  "flame-sensor-wire",
  "inlet-tap",
  "manifold-tap",
  "orifice-holders",
  "static-test-plugs",
  "blower-capacitor-leads",
  "flue-test-plug",
  "valve-inlet-joint",
  "valve-outlet-joint",
  "flame-sensor",
  "igniter",
] as const;
export type OpenedThing = (typeof OPENED_THINGS)[number];

/** One thing that a check opens. Judgement. */
export interface Opening {
  readonly kind: PutBackKind;
  readonly what: OpenedThing;
  /** Gas joints and taps: the side of the valve's seat, for the leak check. */
  readonly side?: "up" | "down";
  /** Jumpers and clamps: the device they stand in for. */
  readonly device?: string;
  /** Jumpers and clamps: seconds they may stay on. */
  readonly limitS?: number;
}

/** Kinds whose put-back begins with the power off: a lead is never lifted or put back live. */
export const POWER_OFF_FIRST: readonly PutBackKind[] = ["lead-lifted", "meter-in-series"];
