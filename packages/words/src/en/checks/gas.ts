import type { CheckId } from "@emberladder/furnace";
import type { CheckWords } from "./check-words.ts";

export const gas = {
  "ck-gas-shutoff": {
    title: "Look at every gas valve",
    do: "Meter to unit: handles, knob, tags.",
    why: "Found off: ask who and why first.",
    zones: { good: "all open", fail: "found shut" },
  },
  "ck-lp-tank": {
    title: "Read the tank gauge",
    do: "Read percent at the tank.",
    why: "An empty tank looks like a bad valve.",
    reading: "tank",
    zones: { good: "enough", marginal: "low", fail: "empty" },
  },
  "ck-inlet-pressure-static": {
    title: "Read inlet pressure, unit off",
    do: "Gas shut, hose on the inlet tap. Then open and read.",
    why: "It shows what the supply holds.",
    reading: "inlet",
    zones: { good: "in band", marginal: "off", fail: "out of band" },
  },
  "ck-inlet-pressure-running": {
    title: "Read inlet pressure, all running",
    do: "Hose on the inlet tap. All gas appliances firing.",
    why: "A weak supply shows under load.",
    reading: "inlet",
    zones: { good: "in band", marginal: "off", fail: "out of band" },
  },
  "ck-manifold-pressure": {
    title: "Read manifold pressure",
    do: "Gas shut, hose on the manifold tap. Then fire and read.",
    why: "It shows what the valve gives.",
    reading: "manifold",
    zones: { good: "in band", marginal: "off", fail: "out of band" },
  },
  "ck-manifold-leakby": {
    title: "Read manifold with the valve off",
    do: "Hose on the manifold tap, valve off two minutes.",
    why: "Pressure here means the valve leaks.",
    reading: "manifold",
    zones: { good: "tight", marginal: "creeps", fail: "passes gas" },
  },
  "ck-leak-solution": {
    title: "Soap the joints",
    do: "Each opened joint, 60 seconds. Downstream only with flame lit.",
    why: "Nothing leaves with a leak.",
    zones: { good: "no bubble", fail: "bubbles" },
  },
  "ck-drop-test": {
    title: "Test the line for pressure drop",
    do: "Isolate the section, pressurise, wait the required time.",
    why: "It proves the whole section.",
    zones: { good: "holds", fail: "drops" },
  },
  "ck-meter-dial-leak": {
    title: "Watch the meter dial",
    do: "All appliances and pilots off. Watch the smallest dial.",
    why: "It proves the whole system.",
    zones: { good: "still", fail: "moves" },
  },
  "ck-meter-clock": {
    title: "Clock the meter",
    do: "One appliance running. Time a full turn.",
    why: "It shows the true input.",
    reading: "of plate input",
    zones: { good: "in band", marginal: "near", fail: "off plate" },
  },
  "ck-orifice-size": {
    title: "Check the orifices",
    do: "Power off, gas shut. Stamp or drill gauge, each one.",
    why: "A wrong bore never burns right.",
    zones: { good: "match", fail: "wrong or plugged" },
  },
  "ck-regulator-vent": {
    title: "Look at the regulator's vent",
    do: "Open, dry, facing down.",
    why: "A blocked vent stops the regulator.",
    zones: { good: "open, dry", fail: "blocked or leaking" },
  },
  "ck-other-appliances": {
    title: "Light another gas appliance",
    do: "With the owner's leave, on the same gas.",
    why: "It splits the unit from the supply.",
    zones: { good: "burns", marginal: "weak", fail: "dead" },
  },
} as const satisfies Partial<Record<CheckId, CheckWords>>;
