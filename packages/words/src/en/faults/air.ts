import type { FaultId } from "@emberladder/furnace";
import type { FaultWords } from "./fault-words.ts";

export const air = {
  "blower-motor-failed": {
    name: "Blower motor failed",
    plain: "The main fan's motor had failed, so the furnace overheated.",
    what: "Volts there, no spin, limit opens.",
    caution: "Turning parts.",
  },
  "blower-capacitor": {
    name: "Blower capacitor weak",
    plain: "A part that starts the main fan had worn out.",
    what: "Capacitor low: slow or humming, limit opens.",
    caution: "Stored charge: discharge first.",
  },
  "blower-ecm-module": {
    name: "Blower module failed",
    plain: "The main fan's electronics had failed.",
    what: "Line and command there, no response.",
    caution: "Wait five minutes for its capacitors.",
  },
  "blower-belt-broken": {
    name: "Blower belt broken",
    plain: "The main fan's belt was broken or slipping.",
    what: "Motor runs, no air.",
  },
  "blower-wheel-dirty": {
    name: "Blower wheel dirty or loose",
    plain: "The main fan's wheel was dirty or loose, so too little air moved.",
    what: "Loaded blades or loose set screw: high rise.",
  },
  "blower-reversed": {
    name: "Blower runs backwards",
    plain: "The main fan was turning the wrong way.",
    what: "Wrong rotation on three phase: low air.",
  },
  "fan-control-failed": {
    name: "Fan control failed",
    plain: "The control that starts the main fan had failed.",
    what: "No volts to the blower after five minutes.",
  },
  "twin-link-lost": {
    name: "Twin link lost",
    plain: "The two linked furnaces had lost contact with each other.",
    what: "Link wire or boards do not match: one blower only.",
  },
  "twin-partner-locked": {
    name: "Partner unit locked out",
    plain: "The furnace's partner had stopped, so this one overheated.",
    what: "Partner dead: back-feed opens this unit's limit.",
  },
  "economizer-stuck-open": {
    name: "Economizer stuck open",
    plain: "A flap was letting too much cold outside air in.",
    what: "Damper open in heat: cold supply, low rise.",
    caution: "Freeze.",
  },
  "supply-low-limit": {
    name: "Low limit tripped",
    plain: "A cold-air safety had switched the unit off.",
    what: "Low-limit thermostat open: damper or heat held.",
  },
  "rtu-flue-water": {
    name: "Water in the burner box",
    plain: "Rain had got into the burner section of the rooftop unit.",
    what: "Water or rust in flue and controls: erratic draft or light.",
  },
  "cooling-mode-stuck": {
    name: "Held in cooling",
    plain: "The rooftop unit was held in cooling.",
    what: "Changeover holds cooling: no W.",
  },
  "rtu-airflow-switch-open": {
    name: "Airflow switch open",
    plain: "A switch that proves air is moving had kept the heat off.",
    what: "String open at the airflow switch.",
  },
} as const satisfies Partial<Record<FaultId, FaultWords>>;
