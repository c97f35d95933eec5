import type { FaultId } from "@emberladder/furnace";
import type { FaultWords } from "./fault-words.ts";

export const ignition = {
  "igniter-broken": {
    name: "Igniter broken",
    plain: "The part that glows to light the gas was cracked.",
    what: "Open element: volts at the plug, not glowing.",
    caution: "Hot and brittle.",
  },
  "igniter-weak": {
    name: "Igniter weak",
    plain: "The part that lights the gas had become too weak.",
    what: "High resistance: dull glow, late light or none.",
    caution: "Delayed ignition.",
  },
  "igniter-wiring-open": {
    name: "Igniter wiring open",
    plain: "A wire to the igniter had lost contact.",
    what: "Volts at the board, none at the plug.",
  },
  "igniter-misaligned": {
    name: "Igniter out of place",
    plain: "The igniter was not where it should be.",
    what: "Glows well, but off the burner or pilot hood.",
  },
  "spark-gap-wrong": {
    name: "Spark gap wrong",
    plain: "The spark that lights the gas was too weak because its gap was off.",
    what: "Gap wrong, bent or dirty: weak spark.",
    caution: "High voltage at the spark.",
  },
  "spark-electrode-cracked": {
    name: "Electrode porcelain cracked",
    plain: "The insulator of the spark was cracked.",
    what: "Spark leaves through the porcelain.",
    caution: "High voltage at the spark.",
  },
  "spark-lead-failed": {
    name: "Spark lead failed",
    plain: "The wire to the spark had failed.",
    what: "Lead open or leaking: no spark at the gap.",
    caution: "High voltage at the spark.",
  },
  "pilot-orifice-plugged": {
    name: "Pilot orifice plugged",
    plain: "The small pilot flame's gas jet was clogged.",
    what: "Dirt or a spider: no pilot, or a yellow one.",
  },
  "pilot-tube-kinked": {
    name: "Pilot tube kinked or leaking",
    plain: "The small pipe that feeds the pilot flame was damaged.",
    what: "Pilot tube kinked or leaking: no gas at the hood.",
    caution: "Leak.",
  },
  "pilot-weak": {
    name: "Pilot weak",
    plain: "The pilot flame was too small to be sensed.",
    what: "Lazy pilot does not reach flame sensor or thermocouple.",
  },
  "pilot-dirty-off-sensor": {
    name: "Pilot misses the sensor",
    plain: "The pilot flame was dirty and missed its sensor.",
    what: "Lint or rust turns the flame aside.",
  },
  "pilot-blown-out": {
    name: "Pilot blown out",
    plain: "The pilot flame had gone out.",
    what: "Dark as found; relights and holds.",
    caution: "Forced lighting steps only.",
  },
  "thermocouple-failed": {
    name: "Thermocouple failed",
    plain: "The part that proves the pilot flame had worn out.",
    what: "Low millivolts: pilot dies on release.",
  },
  "thermocouple-loose": {
    name: "Thermocouple connection poor",
    plain: "The connection of the part that proves the pilot flame was poor.",
    what: "Good open, low loaded: poor contact at the valve.",
  },
  "tc-circuit-cutout-open": {
    name: "Cutout in the thermocouple lead open",
    plain: "A heat safety in the pilot circuit had opened.",
    what: "Millivolts good before the cutout, lost after it.",
    caution: "It is a safety. Find the cause, never bypass it.",
  },
  "pilot-magnet-failed": {
    name: "Pilot magnet failed",
    plain: "The part of the gas valve that holds the pilot had failed.",
    what: "Enough millivolts, will not hold.",
  },
} as const satisfies Partial<Record<FaultId, FaultWords>>;
