import type { Fuel, LastStage } from "../codes.ts";

/** What the control of a unit sees: its contacts, the flame, the call, and its own timers by name. */
export type SequenceEvent =
  | { type: "LINE.on" | "LINE.off" }
  | { type: "CALL.on" | "CALL.off" | "CALL.high" | "CALL.low" }
  | { type: "LIMIT.open" | "LIMIT.closed" }
  | { type: "DRAFT.open" | "DRAFT.closed" | "HIGH_DRAFT.open" | "HIGH_DRAFT.closed" }
  | { type: "FLAME.lit" | "FLAME.proved" | "FLAME.lost" }
  | { type: `TIMER.${SequenceTimer}` };

/** Timers are events with a name: a clock sends them, and a walk over the graph can send them too. */
export const SEQUENCE_TIMERS = [
  "debounce",
  "startCheck",
  "spinUp",
  "draftWait",
  "draftPause",
  "prepurge",
  "warmUp",
  "trial",
  "crossover",
  "blowerOn",
  "steady",
  "postPurge",
  "blowerOff",
  "interpurge",
  "softLockout",
  "limitLockout",
  "stageTwo",
] as const;
export type SequenceTimer = (typeof SEQUENCE_TIMERS)[number];

/** What the control remembers between states. */
export interface SequenceContext {
  /** Tries for ignition in this call, and re-lights after a lost flame. */
  tries: number;
  recycles: number;
  maxTries: number;
  maxRecycles: number;
  twoStage: boolean;
  fuel: Fuel;
  calling: boolean;
  highCall: boolean;
  limitOpen: boolean;
  draftClosed: boolean;
  /** The control senses a flame, whether or not there should be one. */
  flame: boolean;
  /** The circulating blower runs on for a while after the heat. */
  blower: "off" | "on" | "running-on";
}

/** What a state energises, for the drawing, the circuit and the question "what should be on now". */
export interface SequenceOutputs {
  inducer: "off" | "low" | "high";
  igniter: boolean;
  gas: "off" | "low" | "high";
}

/**
 * What a state says of itself: the stage completed on entering it, and what it energises. Where several states
 * hold at once, as in the run, the highest stage and the highest rate count.
 */
export interface SequenceMeta {
  completed?: LastStage;
  outputs: Partial<SequenceOutputs>;
  /** The timer that runs in this state, if one does. */
  timer?: SequenceTimer;
}
