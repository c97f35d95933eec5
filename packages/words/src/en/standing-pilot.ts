import type { StandingPilotStepId } from "@emberladder/furnace";

/** The forced steps of lighting a standing pilot. */
export const standingPilot: Readonly<Record<StandingPilotStepId, string>> = {
  "stat-down": "Turn the thermostat down.",
  "knob-off": "Turn the knob to OFF.",
  "wait-5": "Wait five minutes.",
  "lel-0": "Detector in the burner box and at the floor: 0 % LEL.",
  "pilot-light": "Knob to PILOT, press and light.",
  "hold-60": "Hold it for 60 seconds.",
  release: "Let go. Does the pilot stay?",
  "stand-aside": "Stand to the side.",
  "knob-on": "Turn the knob to ON.",
  "stat-up": "Only now raise the thermostat. Lit within four seconds, or knob OFF.",
};
