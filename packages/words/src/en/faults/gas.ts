import type { FaultId } from "@emberladder/furnace";
import type { FaultWords } from "./fault-words.ts";

export const gas = {
  "gas-off-appliance-valve": {
    name: "Unit's gas valve shut",
    plain: "The gas valve at the unit was closed.",
    what: "Handle across the pipe at the unit.",
    caution: "Ask who and why before you open it.",
  },
  "gas-off-after-summer": {
    name: "Gas shut for the summer",
    plain: "The gas to the unit had been shut for the summer.",
    what: "Branch valve shut, season tag.",
    caution: "It serves others: system leak test, relight every pilot.",
  },
  "gas-off-meter": {
    name: "Gas off at the meter",
    plain: "The gas was shut off at the meter.",
    what: "Meter valve closed or locked.",
    caution: "Never unlock it: the gas utility only.",
  },
  "gas-service-failed": {
    name: "Gas service failed",
    plain: "No gas was reaching the building, with every valve open.",
    what: "Service line, meter or line regulator passes no gas.",
    caution: "The gas utility only.",
  },
  "lp-tank-empty": {
    name: "LP tank empty",
    plain: "The propane tank was empty.",
    what: "Tank empty or nearly so.",
    caution: "Out of gas: leak test before relighting.",
  },
  "lp-excess-flow-closed": {
    name: "Excess-flow valve shut",
    plain: "A safety in the propane tank's valve had snapped shut.",
    what: "Tank not empty, no gas anywhere.",
    caution: "It may have shut on a real leak. Leak test first.",
  },
  "lp-regulator-frozen": {
    name: "LP regulator iced or failed",
    plain: "The propane regulator was iced up or had failed.",
    what: "Ice, blocked vent or failure: no gas or unsteady pressure.",
  },
  "gas-line-air": {
    name: "Air in the gas line",
    plain: "Air in the gas pipe after work kept the burner from lighting.",
    what: "Air after service: lights on try three or four.",
  },
  "low-inlet-pressure": {
    name: "Low gas pressure",
    plain: "The gas pressure to the unit was too low.",
    what: "Inlet below minimum under load.",
  },
  "gas-line-undersized": {
    name: "Gas pipe too small",
    plain: "The gas pipe is too small when other appliances run.",
    what: "Good static, big drop when the others run.",
  },
  "high-inlet-pressure": {
    name: "High gas pressure",
    plain: "The gas pressure to the unit was too high.",
    what: "Regulator does not lock up: above 14 in.",
    caution: "Stop where it is above the valve's limit.",
  },
  "gas-valve-switch-off": {
    name: "Gas control knob off",
    plain: "The knob on the gas control was off.",
    what: "Knob at OFF or PILOT: coil has volts, no flow.",
    caution: "Ask who and why before you turn it.",
  },
  "gas-valve-coil-open": {
    name: "Gas valve coil open",
    plain: "The gas valve's coil had burned out.",
    what: "24 V there, no click, coil open.",
    caution: "Leak check after.",
  },
  "gas-valve-stuck-closed": {
    name: "Gas valve stuck closed",
    plain: "The gas valve did not open.",
    what: "24 V there, coil sound, no flow.",
    caution: "Never hammer it.",
  },
  "gas-valve-wiring-open": {
    name: "Gas valve wire open",
    plain: "A wire to the gas valve had lost contact.",
    what: "24 V at the board, none at the valve.",
  },
  "gas-valve-leak-by": {
    name: "Gas valve passes when off",
    plain: "The gas valve did not shut completely.",
    what: "Passes gas when off: flame lingers.",
    caution: "Shut off and tag.",
  },
  "manifold-low": {
    name: "Manifold pressure low",
    plain: "The burner's gas pressure was set too low.",
    what: "Out of adjustment or vent plugged, inlet right.",
  },
  "manifold-high": {
    name: "Manifold pressure high",
    plain: "The burner's gas pressure was set too high.",
    what: "Over-set or failed regulator.",
    caution: "CO.",
  },
  "orifice-blocked-insects": {
    name: "Orifices blocked",
    plain: "The burner's gas jets were blocked, mostly by spider webs.",
    what: "Webs or dirt: manifold holds, no flame.",
    caution: "Delayed ignition.",
  },
  "orifice-wrong": {
    name: "Orifice wrong",
    plain: "The burner's gas jets were the wrong size.",
    what: "Size or fuel wrong: over- or underfired.",
    caution: "CO.",
  },
  "altitude-not-derated": {
    name: "Not set for the altitude",
    plain: "The burner was not set for how high your site is.",
    what: "No derate at a high site: too much input.",
    caution: "CO.",
  },
  "fuel-conversion-missing": {
    name: "Conversion kit missing",
    plain: "The unit was fitted for a different kind of gas.",
    what: "Fitted for the other gas.",
    caution: "Stop: do not fire it.",
  },
  "burners-dirty": {
    name: "Burners dirty",
    plain: "The burners were dirty, so the gas lit late.",
    what: "Rust, lint or misfit: late light, yellow flame.",
  },
  "burner-crossover": {
    name: "Flame does not cross over",
    plain: "The flame did not spread to all burners.",
    what: "Warped or rusted carry-over: the far burner stays dark.",
  },
  "burner-misaligned": {
    name: "Burner out of seat",
    plain: "A burner was out of its place.",
    what: "Seat or orifice offset: lifts, roars, rolls out.",
  },
} as const satisfies Partial<Record<FaultId, FaultWords>>;
