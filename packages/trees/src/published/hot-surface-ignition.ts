import type { TreeNode } from "../document.ts";
import { act, look, read } from "./steps.ts";

/** Stopped at the igniter, at the gas, or between gas and flame. */
export const ignitionNodes: TreeNode[] = [
  look("igniter-look", "ck-igniter-visual", { cracked: "is-igniter-broken", misaligned: "is-igniter-misaligned", "is-good": "igniter-cold" }, "igniter-cold", {
    way: "power-off",
    note: "A crack that can be seen settles it.",
  }),
  read("igniter-cold", "ck-igniter-ohms", { open: "is-igniter-broken", low: "is-igniter-broken", leak: "is-igniter-broken", high: "is-igniter-weak", "is-good": "igniter-volts", "is-marginal": "is-igniter-weak", "is-fail": "is-igniter-broken" }, "igniter-volts"),
  read("igniter-volts", "ck-igniter-voltage", { "present-no-glow": "is-igniter-broken", "board-yes-plug-no": "is-igniter-wiring-open", "zero-at-board": "is-board-relay-igniter", "zero-at-plug": "igniter-relay", low: "is-low-line-voltage", "is-fail": "igniter-relay" }, "igniter-relay"),
  read("igniter-relay", "ck-board-relay-output", { igniter: "is-board-relay-igniter", "none-at-all": "is-board-dead", "changes-with-flex": "is-board-solder-crack", "is-good": "is-igniter-wiring-open", "is-fail": "is-board-relay-igniter" }, "is-igniter-wiring-open", { stage: "ignition-source" }),

  look("gas-handles", "ck-gas-shutoff", { "appliance-valve": "is-gas-off-appliance-valve", meter: "is-gas-off-meter", "control-switch-off": "is-gas-valve-switch-off", "branch-off-season": "is-gas-off-after-summer", "is-good": "others-burn" }, "others-burn"),
  look("others-burn", "ck-other-appliances", { dead: "supply-gone", weak: "inlet-running", burn: "valve-volts" }, "valve-volts"),
  look("supply-gone", "ck-regulator-vent", { "no-outlet": "supply-static", iced: "is-lp-regulator-frozen", blocked: "is-lp-regulator-frozen" }, "supply-static"),
  read("supply-static", "ck-inlet-pressure-static", { zero: "tank", "zero-cocks-open": "tank", "is-good": "valve-volts", "is-fail": "tank" }, "tank"),
  read("tank", "ck-lp-tank", { empty: "is-lp-tank-empty", low: "is-lp-tank-empty", "enough-no-pressure": "ask-supplier", "is-fail": "is-lp-tank-empty" }, "ask-utility", {
    cannot: "ask-utility",
    note: "Natural gas: there is no tank. Say so, and the utility has to come.",
  }),
  read("valve-volts", "ck-main-valve-voltage", { "zero-at-board": "is-board-relay-gas", "board-yes-valve-no": "is-gas-valve-wiring-open", "zero-at-valve": "gas-relay", "present-no-flow": "valve-coil", "low-chatter": "is-transformer-overloaded", "comes-and-goes": "is-board-solder-crack", "is-good": "valve-coil", "is-fail": "gas-relay" }, "gas-relay", {
    safety: "In a real trial only. No jumper and no supply of your own.",
  }),
  read("gas-relay", "ck-board-relay-output", { gas: "is-board-relay-gas", "none-at-all": "is-board-dead", "is-good": "is-gas-valve-wiring-open", "is-fail": "is-board-relay-gas" }, "is-gas-valve-wiring-open", { stage: "gas" }),
  read("valve-coil", "ck-valve-coil-ohms", { open: "is-gas-valve-coil-open", "is-good": "inlet-static", "is-fail": "is-gas-valve-coil-open" }, "inlet-static"),
  read("inlet-static", "ck-inlet-pressure-static", { zero: "ask-utility", low: "is-low-inlet-pressure", high: "is-high-inlet-pressure", creeping: "is-high-inlet-pressure", sinking: "tank", "is-good": "manifold", "is-fail": "is-low-inlet-pressure" }, "manifold"),
  read("manifold", "ck-manifold-pressure", { zero: "is-gas-valve-stuck-closed", "low-inlet-ok": "is-manifold-low", "low-inlet-low": "is-low-inlet-pressure", high: "is-manifold-high", "holds-no-flame": "orifices", "wrong-for-fuel": "is-fuel-conversion-missing", "is-good": "igniter-glow", "is-fail": "is-manifold-low" }, "igniter-glow", { way: "high-fire" }),
  look("orifices", "ck-orifice-size", { plugged: "is-orifice-blocked-insects", "wrong-size": "is-orifice-wrong", "wrong-fuel": "is-fuel-conversion-missing", "wrong-altitude": "is-altitude-not-derated" }, "igniter-glow"),

  look("igniter-glow", "ck-igniter-visual", { dull: "igniter-amps", "no-glow": "igniter-cold", misaligned: "is-igniter-misaligned", cracked: "is-igniter-broken", "is-good": "burners" }, "igniter-amps", { way: "glow" }),
  read("igniter-amps", "ck-igniter-current", { low: "is-igniter-weak", zero: "igniter-cold", "is-good": "burners", "is-fail": "is-igniter-weak", "is-marginal": "is-igniter-weak" }, "burners"),
  look("burners", "ck-burner-visual", { webs: "is-orifice-blocked-insects", "lint-rust": "is-burners-dirty", misaligned: "is-burner-misaligned", "crossover-slot": "is-burner-crossover", "is-good": "inlet-running" }, "inlet-running", { way: "in-place" }),
  read("inlet-running", "ck-inlet-pressure-running", { low: "is-low-inlet-pressure", "drop-others": "is-gas-line-undersized", unstable: "is-lp-regulator-frozen", "is-good": "ask-senior", "is-fail": "is-low-inlet-pressure", "is-marginal": "is-low-inlet-pressure" }, "ask-senior", { way: "pressure" }),

  read(
    "flame-signal",
    "ck-flame-current",
    {
      zero: "sensor-wire",
      "good-not-accepted": "is-board-flame-circuit",
      "recovers-bonded": "is-poor-ground",
      "recovers-polarity": "is-reversed-polarity",
      "recovers-moved": "is-flame-sensor-misplaced",
      unstable: "burner-ground",
      "leakage-ac": "sensor-insulation",
      "falls-when-others-run": "inlet-running",
      "changes-with-blower": "exchanger",
      "is-good": "is-board-flame-circuit",
      "is-marginal": "sensor-off",
      "is-fail": "sensor-off",
    },
    "sensor-wire",
    { stage: "lightoff", note: "The board's own display is a reading. Low: clean first; if it recovers, that is the proof." },
  ),
  act("sensor-off", "Power off and locked. Draw the flame sensor.", "is-flame-sensor-dirty", { power: "off" }, {
    safety: "Sensor and burners are hot.",
    note: "Still low once bright: take burner ground, polarity and insulation.",
  }),
  look("flame-look", "ck-flame-appearance", { "misses-rod": "is-flame-sensor-misplaced", "some-unlit": "crossover", lifts: "is-burner-misaligned", "lazy-yellow": "burners", "rolls-out": "rollout-vent", "blower-change": "exchanger", tiny: "inlet-running", "huge-yellow": "is-fuel-conversion-missing", "blue-then-out": "burner-ground" }, "burner-ground"),
  read("sensor-wire", "ck-sensor-voltage", { "board-yes-rod-no": "is-flame-sensor-wire-open", "zero-at-board": "is-board-flame-circuit", "is-good": "sensor-insulation" }, "sensor-insulation"),
  read("sensor-insulation", "ck-sensor-insulation", { grounded: "is-flame-sensor-grounded", leak: "is-flame-sensor-cracked", "is-good": "flame-look", "is-fail": "is-flame-sensor-cracked", "is-marginal": "is-flame-sensor-cracked" }, "flame-look"),
  read("burner-ground", "ck-burner-ground", { high: "is-poor-ground", "is-good": "polarity", "is-fail": "is-poor-ground", "is-marginal": "is-poor-ground" }, "polarity"),
  look("polarity", "ck-polarity-ground", { reversed: "is-reversed-polarity", "open-ground": "is-poor-ground", "loose-neutral": "is-low-line-voltage" }, "crossover"),
  read("crossover", "ck-crossover", { slow: "is-burner-crossover", never: "is-burner-crossover", "is-fail": "is-burner-crossover" }, "ask-senior"),
];
