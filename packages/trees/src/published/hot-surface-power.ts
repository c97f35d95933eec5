import type { TreeNode } from "../document.ts";
import { look, read } from "./steps.ts";

/** Stopped at power, the call or the safeties. */
export const powerNodes: TreeNode[] = [
  read(
    "line-voltage",
    "ck-line-voltage",
    {
      "zero-line": "is-no-line-power-breaker",
      "zero-load": "is-service-switch-off",
      "zero-past-gfci": "is-gfci-tripped",
      "zero-past-door": "door-panel",
      "low-loaded": "is-low-line-voltage",
      "is-good": "secondary",
    },
    "secondary",
    { note: "Say where the volts stop: at the switch, past it, or past the door." },
  ),
  look("door-panel", "ck-panel-fit", { misfit: "is-door-switch-open", "tab-bent": "is-door-switch-open", missing: "is-door-switch-open", "is-good": "door-switch" }, "door-switch"),
  read("door-switch", "ck-door-switch", { "open-panel-on": "is-door-switch-failed", "closes-by-hand": "is-door-switch-open", "is-fail": "is-door-switch-failed" }, "secondary", { way: "by-hand" }),
  read("secondary", "ck-transformer-secondary", { zero: "primary", "zero-button-out": "is-transformer-reset-tripped", sags: "is-transformer-overloaded", "is-good": "control-fuse" }, "control-fuse", { stage: "power" }),
  read("primary", "ck-transformer-primary", { zero: "door-panel", "is-good": "is-transformer-failed" }, "is-transformer-failed"),
  read("control-fuse", "ck-lv-fuse", { blown: "is-lv-fuse-blown", "sound-board-dead": "board-light", "is-fail": "is-lv-fuse-blown" }, "board-light", { way: "in-and-out-volts" }),
  look("board-light", "ck-board-status", { dark: "is-board-dead", internal: "is-board-dead", "limit-open": "safety-string", "rollout-open": "safety-string", "draft-open": "tube", "draft-closed-at-rest": "switch-at-rest", "ignition-failed": "igniter-look", "flame-not-proved": "flame-signal", polarity: "polarity" }, "call-w"),

  read(
    "call-w",
    "ck-tstat-call-w",
    {
      "c-lost-at-stat": "is-common-wire-open",
      "w-in-panel-not-out": "is-zone-panel-no-w",
      "r-at-stat-w-out-dead": "is-tstat-failed",
      "no-r-at-stat": "float",
      pulsing: "is-tstat-power-steal",
      absent: "thermostat-set",
      "is-good": "safety-string",
      "is-fail": "thermostat-set",
    },
    "thermostat-set",
  ),
  look("thermostat-set", "ck-tstat-settings", { mode: "is-tstat-wrong-setting", "schedule-hold": "is-tstat-wrong-setting", "system-type": "is-tstat-wrong-setting", blank: "stat-batteries", "no-c-wire": "is-tstat-power-steal", "is-good": "call-jumper" }, "call-jumper"),
  read("stat-batteries", "ck-tstat-batteries", { blank: "is-tstat-dead-batteries", "low-icon": "is-tstat-dead-batteries", low: "is-tstat-dead-batteries", "is-fail": "is-tstat-dead-batteries" }, "call-jumper"),
  look("call-jumper", "ck-tstat-rw-jumper", { "starts-at-unit-only": "is-tstat-wire-open", "starts-at-stat-base": "is-tstat-failed", starts: "stat-cable", "no-start": "control-fuse", "is-good": "stat-cable" }, "control-fuse", {
    safety: "R and W only. Never a gas valve terminal.",
  }),
  read("stat-cable", "ck-tstat-cable-ohms", { open: "is-tstat-wire-open", "c-open": "is-common-wire-open", shorted: "is-tstat-wire-short", "is-fail": "is-tstat-wire-open" }, "is-tstat-failed"),
  read("float", "ck-overflow-switch", { "open-wet": "is-overflow-switch-open", "open-reservoir-full": "is-condensate-pump-failed", "open-dry": "is-overflow-switch-open", "is-fail": "is-overflow-switch-open" }, "control-fuse", { stage: "call" }),

  read(
    "safety-string",
    "ck-safety-hop",
    {
      "lost-fuse": "control-fuse",
      "lost-limit": "limit-cold",
      "lost-aux": "aux-limit",
      "lost-rollout": "rollout",
      "lost-link": "rollout",
      "lost-float": "float",
      "lost-draft": "tube",
      "lost-wire": "wiring",
      "is-good": "switch-at-rest",
    },
    "limit-cold",
    { note: "The first node without volts: the device before it is open." },
  ),
  read("limit-cold", "ck-limit-ohms", { "open-cold": "is-limit-failed-open", resistive: "is-limit-failed-open", "is-good": "rollout", "is-fail": "is-limit-failed-open" }, "rollout"),
  read("aux-limit", "ck-aux-limit", { tripped: "is-aux-limit-tripped", "opens-hot": "is-aux-limit-tripped", "is-fail": "is-aux-limit-tripped" }, "rollout"),
  look("rollout", "ck-rollout", { tripped: "rollout-vent", "link-open": "is-fusible-link-open", "open-not-tripped": "rollout-vent", "is-good": "wiring" }, "rollout-vent", {
    way: "look",
    safety: "Gas shut first. A trip means flame outside the box.",
  }),
  look("rollout-vent", "ck-vent-inspect", { blocked: "is-rollout-blocked-flue", disconnected: "is-vent-disconnected", "is-good": "rollout-exchanger" }, "rollout-exchanger", { way: "from-ground" }),
  look("rollout-exchanger", "ck-heat-exchanger", { crack: "is-rollout-cracked-exchanger", soot: "rollout-burners", plugged: "is-rollout-blocked-flue", "is-good": "rollout-burners" }, "rollout-burners", { way: "camera" }),
  look("rollout-burners", "ck-burner-visual", { "lint-rust": "is-rollout-dirty-burners", webs: "is-orifice-blocked-insects", misaligned: "is-burner-misaligned", "is-good": "ask-senior" }, "ask-senior", { way: "in-place" }),
  look("wiring", "ck-visual-wiring", { melted: "is-melted-wire", scorched: "is-melted-wire", chewed: "is-rodent-wire", corroded: "is-board-connector-corroded", "stapled-cut": "is-tstat-wire-short", "is-good": "ask-senior" }, "ask-senior"),
];
