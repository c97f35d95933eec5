import type { CheckId } from "@emberladder/furnace";
import type { CheckWords } from "./check-words.ts";

export const air = {
  "ck-filter": {
    title: "Look at the filter",
    do: "Slide it out and hold it to the light.",
    why: "A dirty one opens the limit.",
    reading: "drop across",
    zones: { good: "clean", marginal: "loaded", fail: "choked" },
  },
  "ck-tesp": {
    title: "Read external static",
    do: "Taps before and after the unit, blower on heat.",
    why: "High static means the ducts.",
    reading: "static",
    zones: { good: "in band", marginal: "high", fail: "too high" },
  },
  "ck-temp-rise": {
    title: "Measure the temperature rise",
    do: "Supply less return, after ten minutes of burning.",
    why: "It shows whether air matches fire.",
    reading: "rise",
    zones: { good: "in range", marginal: "near the edge", fail: "out of range" },
  },
  "ck-blower-voltage": {
    title: "Read volts at the blower",
    do: "Leads on its plug with the command on.",
    why: "Volts and no spin means the motor.",
    reading: "blower",
    zones: { good: "volts there", marginal: "weak or high", fail: "no volts" },
  },
  "ck-blower-current": {
    title: "Clamp the blower's current",
    do: "Clamp the common. Compare with the nameplate.",
    why: "Locked or nothing settles it.",
    reading: "current",
    zones: { good: "at nameplate", marginal: "off", fail: "far off" },
  },
  "ck-blower-capacitor": {
    title: "Measure the blower's capacitor",
    do: "Power off. Discharge, lift its leads, read.",
    why: "A weak one hums and starves the air.",
    reading: "of its mark",
    zones: { good: "in band", marginal: "weak", fail: "bad" },
  },
  "ck-blower-wheel": {
    title: "Look at the blower wheel",
    do: "Power off. Blades, belt, set screw, rotation.",
    why: "A loaded wheel moves little air.",
    zones: { good: "clean, free", fail: "dirty or loose" },
  },
  "ck-blower-timing": {
    title: "Time the blower",
    do: "From flame to blower, and from flame out to stop.",
    why: "Too late opens the limit.",
    reading: "delay",
    zones: { good: "in band", marginal: "off", fail: "too late" },
  },
  "ck-flue-analysis": {
    title: "Analyse the flue gas",
    do: "Probe in the flue after five minutes. Blower off, then on.",
    why: "It shows a breach, and a bad burn.",
    reading: "flue",
    zones: { good: "clean", marginal: "watch", fail: "not safe" },
  },
  "ck-economizer-position": {
    title: "Look at the economizer damper",
    do: "In heat it sits at its minimum.",
    why: "Wide open it blows cold air.",
    zones: { good: "at minimum", fail: "open" },
  },
  "ck-board-relay-output": {
    title: "Read the board's relay outputs",
    do: "From each output to N, in its own window.",
    why: "Inputs right and no output means the board.",
    zones: { good: "all there", fail: "output missing" },
  },
  "ck-coil-drop": {
    title: "Read the drop across the coil",
    do: "Taps before and after the coil, blower on.",
    why: "A high drop means a dirty coil.",
    reading: "drop across",
    zones: { good: "clear", marginal: "dirty", fail: "plugged" },
  },
} as const satisfies Partial<Record<CheckId, CheckWords>>;
