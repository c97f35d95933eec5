import type { FaultId } from "@emberladder/furnace";
import type { FaultWords } from "./fault-words.ts";

export const flame = {
  "flame-sensor-dirty": {
    name: "Flame sensor dirty",
    plain: "The sensor that tells the furnace it has lit was coated and could not see the flame.",
    what: "Film on the sensor: lights, drops, repeats.",
    caution: "Power off. Hot.",
  },
  "flame-sensor-cracked": {
    name: "Flame sensor cracked",
    plain: "The flame sensor's insulator was cracked.",
    what: "Porcelain leaks to the bracket, worse when damp.",
  },
  "flame-sensor-wire-open": {
    name: "Flame sensor wire open",
    plain: "The flame sensor's wire had lost contact.",
    what: "No signal: volts at the board, none at the sensor.",
  },
  "flame-sensor-grounded": {
    name: "Flame sensor grounded",
    plain: "The flame sensor was touching metal.",
    what: "Sensor or wire touches burner or chassis.",
  },
  "flame-sensor-misplaced": {
    name: "Flame sensor out of the flame",
    plain: "The flame sensor was bent out of the flame.",
    what: "Bent out of the flame: low signal.",
  },
  "board-flame-circuit": {
    name: "Board flame circuit dead",
    plain: "The control could no longer sense a good flame.",
    what: "Good signal not accepted, or no sense volts.",
  },
  "flue-recirculation": {
    name: "Exhaust drawn back in",
    plain: "The unit was breathing in its own exhaust.",
    what: "Exhaust in the intake: flame lifts, signal falls.",
    caution: "CO.",
  },
  "cracked-heat-exchanger": {
    name: "Heat exchanger cracked",
    plain: "The metal that keeps exhaust and house air apart has opened. The unit is not safe to run.",
    what: "Breach: flame, signal or oxygen changes with the blower.",
    caution: "Shut off and tag.",
  },
} as const satisfies Partial<Record<FaultId, FaultWords>>;
