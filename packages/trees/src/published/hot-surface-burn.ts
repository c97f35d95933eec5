import type { TreeNode } from "../document.ts";
import { look, read } from "./steps.ts";

/** Lit, and then no blower, or cut off in the run. */
export const burnNodes: TreeNode[] = [
  read(
    "blower-volts",
    "ck-blower-voltage",
    {
      "present-no-spin": "blower-capacitor",
      "line-and-command-no-spin": "is-blower-ecm-module",
      "zero-at-board": "is-board-relay-blower",
      "zero-at-motor": "blower-relay",
      "no-command": "is-board-relay-blower",
      "present-spins": "filter",
      low: "is-low-line-voltage",
      "is-good": "blower-capacitor",
      "is-fail": "blower-relay",
    },
    "blower-relay",
  ),
  read(
    "blower-relay",
    "ck-board-relay-output",
    {
      blower: "is-board-relay-blower",
      "none-at-all": "is-board-dead",
      "is-good": "wiring",
      "is-fail": "is-board-relay-blower",
    },
    "wiring",
    { stage: "blower-on" },
  ),
  read(
    "blower-capacitor",
    "ck-blower-capacitor",
    {
      low: "is-blower-capacitor",
      open: "is-blower-capacitor",
      "is-fail": "is-blower-capacitor",
      "is-marginal": "is-blower-capacitor",
    },
    "blower-amps",
    { cannot: "blower-amps" },
  ),
  read(
    "blower-amps",
    "ck-blower-current",
    {
      zero: "is-blower-motor-failed",
      locked: "is-blower-motor-failed",
      high: "is-blower-motor-failed",
      low: "blower-wheel",
      "is-fail": "is-blower-motor-failed",
    },
    "blower-wheel",
  ),
  look(
    "blower-wheel",
    "ck-blower-wheel",
    {
      dirty: "is-blower-wheel-dirty",
      loose: "is-blower-wheel-dirty",
      belt: "is-blower-belt-broken",
      stiff: "is-blower-motor-failed",
    },
    "static",
  ),

  read(
    "filter",
    "ck-filter",
    {
      loaded: "is-limit-open-filter",
      "wrong-type": "is-limit-open-filter",
      "is-fail": "is-limit-open-filter",
      "is-good": "rise",
    },
    "rise",
    { way: "look" },
  ),
  read(
    "rise",
    "ck-temp-rise",
    {
      high: "blower-wheel",
      low: "flame-look",
      "is-good": "limit-in-run",
      "is-fail": "blower-wheel",
      "is-marginal": "blower-wheel",
    },
    "limit-in-run",
  ),
  read(
    "static",
    "ck-tesp",
    {
      "registers-shut": "is-limit-open-dampers",
      "supply-side": "coil",
      "return-side": "is-limit-open-dampers",
      "is-good": "coil",
      "is-fail": "is-limit-open-dampers",
    },
    "coil",
  ),
  read(
    "coil",
    "ck-coil-drop",
    {
      dirty: "is-limit-open-coil-plugged",
      iced: "is-limit-open-coil-plugged",
      "is-fail": "is-limit-open-coil-plugged",
    },
    "input",
    { cannot: "input" },
  ),
  read(
    "input",
    "ck-meter-clock",
    { over: "is-limit-open-overfire", under: "manifold", "is-fail": "is-limit-open-overfire" },
    "limit-in-run",
    { cannot: "manifold" },
  ),
  read(
    "limit-in-run",
    "ck-limit-voltage",
    {
      "open-cold": "is-limit-failed-open",
      resistive: "is-limit-failed-open",
      "open-hot": "static",
      "is-good": "switch-in-run",
    },
    "switch-in-run",
    { stage: "steady" },
  ),
  read(
    "switch-in-run",
    "ck-pressure-switch-voltage",
    {
      "opens-in-run": "vent",
      "hi-open-suction-ok": "is-high-stage-switch-open",
      resistive: "is-pressure-switch-failed-open",
      "is-good": "signal-in-run",
    },
    "signal-in-run",
    { stage: "steady", way: "first-stage" },
  ),
  read(
    "signal-in-run",
    "ck-flame-current",
    {
      "falls-when-others-run": "inlet-running",
      "changes-with-blower": "exchanger",
      unstable: "burner-ground",
      low: "sensor-off",
      "is-good": "exchanger",
    },
    "exchanger",
    { stage: "steady" },
  ),
  look(
    "exchanger",
    "ck-heat-exchanger",
    { crack: "is-cracked-heat-exchanger", plugged: "is-rollout-blocked-flue", "is-good": "wiggle" },
    "wiggle",
    { way: "camera" },
  ),
];
