import type { CheckId } from "@emberladder/furnace";
import type { CheckWords } from "./check-words.ts";

export const call = {
  "ck-tstat-settings": {
    title: "Read the thermostat's settings",
    do: "Screen, mode, set point, schedule, type.",
    why: "The cheapest cause is a setting.",
    zones: { good: "calls", fail: "does not call" },
  },
  "ck-tstat-batteries": {
    title: "Check the thermostat batteries",
    do: "Look for a blank screen or low icon. Else read each cell.",
    why: "A blank screen is proof enough.",
    reading: "each cell",
    zones: { good: "good", marginal: "low", fail: "empty" },
  },
  "ck-tstat-call-w": {
    title: "Read the call at the unit",
    do: "Leads on W and C at the unit, thermostat calling.",
    why: "No volts here: the fault is upstream.",
    reading: "W to C",
    zones: { good: "call is there", marginal: "weak", fail: "no call" },
  },
  "ck-tstat-rw-jumper": {
    title: "Bridge R to W for a moment",
    do: "Bridge R and W at the unit, attended. End it within minutes.",
    why: "It splits the unit from the thermostat.",
    zones: { good: "starts", fail: "no start" },
  },
  "ck-tstat-cable-ohms": {
    title: "Read the thermostat cable in ohms",
    do: "Power off, both ends lifted, far ends joined. Read each pair.",
    why: "It finds the broken wire.",
    reading: "each pair",
    zones: { good: "whole", marginal: "poor", fail: "open" },
  },
  "ck-anticipator": {
    title: "Compare the anticipator with W current",
    do: "Meter in series with W. Compare with the dial.",
    why: "A wrong dial ends calls early.",
    reading: "difference",
    zones: { good: "matches", marginal: "near", fail: "does not match" },
  },
  "ck-bas-enable": {
    title: "Check the building control's enable",
    do: "Read heat enable, mode and lockouts on its screen.",
    why: "It may be holding heat off on purpose.",
    zones: { good: "enabled", fail: "held off" },
  },
  "ck-smoke-contact": {
    title: "Read both sides of the smoke contact",
    do: "Black lead on C. Red in, then out.",
    why: "An alarm holds the unit off.",
    zones: { good: "closed", marginal: "barely", fail: "open" },
  },
  "ck-overflow-switch": {
    title: "Read both sides of the float switch",
    do: "Look in the pan. Black lead on C, red in, then out.",
    why: "Water in the pan stops the call.",
    zones: { good: "closed", marginal: "barely", fail: "open" },
  },
  "ck-twin-link": {
    title: "Read between the two boards",
    do: "Leads on R and R, then the link terminals.",
    why: "Twins must pull together.",
    reading: "R to R",
    zones: { good: "in step", marginal: "uneven", fail: "out of phase" },
  },
} as const satisfies Partial<Record<CheckId, CheckWords>>;
