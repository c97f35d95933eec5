import type { TreeNode } from "../document.ts";
import { look, read } from "./steps.ts";

/** Stopped before the inducer, at the inducer, or at the pressure switch. */
export const draftNodes: TreeNode[] = [
  read("switch-at-rest", "ck-pressure-switch-rest", { closed: "is-pressure-switch-stuck-closed", "closed-tube-on-only": "is-pressure-tube-water", "is-fail": "is-pressure-switch-stuck-closed", "is-good": "lockout" }, "lockout", {
    way: "in-and-out-volts",
    note: "Before the start this contact has to be open.",
  }),
  look("lockout", "ck-lockout-reset", { "runs-then-fails": "lockout-watch", "no-change": "inducer-volts", runs: "lockout-watch" }, "inducer-volts", {
    safety: "Gas shut until a glow is seen.",
    note: "A reset that clears it proves nothing yet. Watch three to five cycles.",
  }),
  look("lockout-watch", "ck-timing", { "flame-lost-at-trial-end": "flame-signal", "late-light": "igniter-glow", "quits-in-steady": "filter", intermittent: "wiggle", "stage-never-came": "inducer-volts", "lights-on-later-try": "is-gas-line-air" }, "ask-senior"),
  look("wiggle", "ck-wire-wiggle", { "board-flex": "is-board-solder-crack", "board-plug": "is-board-connector-corroded", "igniter-plug": "is-igniter-wiring-open", "valve-plug": "is-gas-valve-wiring-open", "sensor-lead": "is-flame-sensor-wire-open", harness: "is-melted-wire" }, "ask-senior"),

  read(
    "inducer-volts",
    "ck-inducer-voltage",
    {
      "present-no-spin": "inducer-amps",
      "present-spins": "tube",
      "zero-at-board": "is-board-relay-inducer",
      "zero-at-motor": "inducer-relay",
      "board-yes-motor-no": "wiring",
      low: "is-low-line-voltage",
      "is-good": "inducer-amps",
    },
    "inducer-relay",
  ),
  read("inducer-relay", "ck-board-relay-output", { inducer: "is-board-relay-inducer", "none-at-all": "is-board-dead", "changes-with-flex": "is-board-solder-crack", "is-good": "wiring", "is-fail": "is-board-relay-inducer" }, "wiring", { stage: "inducer" }),
  read("inducer-amps", "ck-inducer-current", { zero: "inducer-windings", locked: "is-inducer-seized", high: "is-inducer-seized", low: "inducer-wheel", "is-good": "inducer-wheel", "is-fail": "inducer-windings" }, "inducer-windings"),
  read("inducer-windings", "ck-inducer-ohms", { open: "is-inducer-motor-failed", shorted: "is-inducer-motor-failed", "frame-leak": "is-inducer-motor-failed", high: "is-inducer-motor-failed", "is-good": "inducer-wheel", "is-fail": "is-inducer-motor-failed" }, "inducer-wheel"),
  look("inducer-wheel", "ck-inducer-wheel", { loose: "is-inducer-wheel-loose", eaten: "is-inducer-wheel-loose", stiff: "is-inducer-seized", "is-good": "collector" }, "collector", { way: "by-finger" }),

  look("tube", "ck-pressure-tubing", { crack: "is-pressure-tube-cracked", off: "is-pressure-tube-cracked", plugged: "is-pressure-port-plugged", water: "suction", "is-good": "suction" }, "suction", {
    note: "Blow only with the tube off the switch.",
  }),
  read(
    "suction",
    "ck-pressure-suction",
    {
      "low-everywhere": "vent",
      "lost-in-tube": "is-pressure-tube-cracked",
      "zero-at-port": "is-pressure-port-plugged",
      swings: "is-vent-wind",
      "makes-vent-open": "vent",
      "is-good": "switch-closes",
      "is-marginal": "vent",
      "is-fail": "vent",
    },
    "vent",
    { way: "first-stage" },
  ),
  read("switch-closes", "ck-pressure-switch-voltage", { "open-suction-ok": "is-pressure-switch-failed-open", resistive: "is-pressure-switch-failed-open", "open-suction-low": "vent", "opens-in-run": "vent", "hi-open-suction-ok": "is-high-stage-switch-open", "is-good": "wiggle", "is-fail": "switch-by-hand" }, "vent", { way: "first-stage" }),
  read("switch-by-hand", "ck-pressure-switch-trip", { "never-makes": "is-pressure-switch-failed-open", "off-label": "is-pressure-switch-failed-open", "is-fail": "is-pressure-switch-failed-open", "is-good": "wiggle" }, "wiggle"),
  look("vent", "ck-vent-inspect", { blocked: "is-vent-blocked", nest: "is-vent-blocked", "ice-snow": "is-vent-blocked", disconnected: "is-vent-disconnected", "termination-wind": "is-vent-wind", "is-good": "collector" }, "collector", { way: "from-ground" }),
  look("collector", "ck-collector-seal", { "smoke-drawn-in": "is-collector-gasket-leak", "seal-torn": "is-collector-gasket-leak", "is-good": "inducer-wheel-inside" }, "inducer-wheel-inside"),
  look("inducer-wheel-inside", "ck-inducer-wheel", { loose: "is-inducer-wheel-loose", eaten: "is-inducer-wheel-loose", stiff: "is-inducer-seized" }, "ask-senior", { way: "inducer-out" }),
];
