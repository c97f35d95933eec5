import type { CheckId } from "../checks/check-ids.ts";

/** The forced steps of lighting a standing pilot: the watch of every unit that has one. */
export const STANDING_PILOT_STEP_IDS = [
  "stat-down",
  "knob-off",
  "wait-5",
  "lel-0",
  "pilot-light",
  "hold-60",
  "release",
  "stand-aside",
  "knob-on",
  "stat-up",
] as const;
export type StandingPilotStepId = (typeof STANDING_PILOT_STEP_IDS)[number];

export interface StandingPilotStep {
  readonly id: StandingPilotStepId;
  /** Done when ticked, when the time is up, when the number is right, or by what was seen. */
  readonly kind: "tick" | "timer" | "reading" | "seen";
  readonly seconds?: number;
  readonly check?: CheckId;
  readonly atMost?: number;
  /** Where it goes back to when what should be seen is not. */
  readonly elseTo?: StandingPilotStepId;
}

/**
 * The steps, in the only order in which they may be taken. The five minutes are those of lighting instructions;
 * the main burner lights within 4 s or the knob goes OFF, ANSI Z21.47 from memory.
 */
export const STANDING_PILOT_STEPS: readonly StandingPilotStep[] = [
  { id: "stat-down", kind: "tick" },
  { id: "knob-off", kind: "tick" },
  { id: "wait-5", kind: "timer", seconds: 300 },
  { id: "lel-0", kind: "reading", check: "ck-gas-detector", atMost: 0 },
  { id: "pilot-light", kind: "seen", elseTo: "wait-5" },
  { id: "hold-60", kind: "timer", seconds: 60 },
  { id: "release", kind: "seen", elseTo: "wait-5" },
  { id: "stand-aside", kind: "tick" },
  { id: "knob-on", kind: "tick" },
  { id: "stat-up", kind: "seen", seconds: 4, elseTo: "knob-off" },
];
