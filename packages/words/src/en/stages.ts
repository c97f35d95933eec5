import type { Stage } from "@emberladder/furnace";

/** A rung of the ladder: its name, and when it is done. */
export interface StageWords {
  readonly name: string;
  readonly done: string;
}

/** Words of the rungs, of the places a reading may be taken at besides, and of a call that was not watched. */
export const stages: Readonly<Record<Stage | "idle" | "lockout" | "any" | "none", StageWords>> = {
  none: { name: "Nothing", done: "Nothing came up" },
  idle: { name: "Between calls", done: "No call for heat" },
  power: { name: "Power", done: "Line volts and 24 V are there" },
  call: { name: "Call for heat", done: "W reaches the control" },
  safeties: { name: "Safeties", done: "Limits and rollouts are closed" },
  "draft-rest": { name: "Draft switch at rest", done: "Open before start" },
  inducer: { name: "Inducer", done: "Inducer turns, or damper opens" },
  "draft-proved": { name: "Draft proved", done: "Draft switch closes" },
  prepurge: { name: "Purge", done: "Purge time is over" },
  "ignition-source": { name: "Glow or spark", done: "Igniter glows, or spark is there" },
  gas: { name: "Gas", done: "Valve is open and gas flows" },
  lightoff: { name: "Light-off", done: "Flame is there" },
  "flame-proved": { name: "Flame proved", done: "Control accepts the flame" },
  "main-burner": { name: "Main burner", done: "All burners are lit" },
  "blower-on": { name: "Blower", done: "Blower starts" },
  steady: { name: "Steady burn", done: "Ten minutes, limits closed, rise in range" },
  satisfied: { name: "Satisfied", done: "Flame out, purged, blower off" },
  lockout: { name: "Lockout", done: "Control has given up" },
  any: { name: "Not watched", done: "Not tied to a stage" },
};
