import { LAST_STAGES } from "../codes.ts";
import type { LastStage } from "../codes.ts";
import type { SnapshotFrom } from "xstate";
import type { directIgnitionMachine } from "./direct-ignition.ts";
import type { SequenceContext, SequenceMeta, SequenceOutputs, SequenceTimer } from "./sequence-types.ts";

/** The state of a running sequence, as the machine hands it out. */
export type SequenceSnapshot = SnapshotFrom<typeof directIgnitionMachine>;

/** What a sequence is doing now, in words of the trade. */
export interface SequenceReading {
  /** Names of the states that hold, joined: `burning.heat.steady + burning.rate.low`. */
  state: string;
  /** The last stage completed. */
  completed: LastStage;
  outputs: SequenceOutputs;
  blower: SequenceContext["blower"];
  /** Timers that run, each with the id of the state it belongs to. */
  timers: { of: string; timer: SequenceTimer }[];
}

const RATES = ["off", "low", "high"] as const;

function higherRate(a: SequenceOutputs["gas"], b: SequenceOutputs["gas"] = "off"): SequenceOutputs["gas"] {
  return RATES.indexOf(a) >= RATES.indexOf(b) ? a : b;
}

function nameOf(value: SequenceSnapshot["value"], path = ""): string {
  if (typeof value === "string") return `${path}${value}`;
  return Object.entries(value)
    .map(([key, inner]) => nameOf(inner as SequenceSnapshot["value"], `${path}${key}.`))
    .join(" + ");
}

/** Reads what a sequence has completed, energises and times in one of its states. */
export function readSequence(snapshot: SequenceSnapshot): SequenceReading {
  let completed: LastStage = "none";
  let outputs: SequenceOutputs = { inducer: "off", igniter: false, gas: "off" };
  const timers: SequenceReading["timers"] = [];
  const metas = snapshot.getMeta() as Record<string, SequenceMeta | undefined>;
  for (const [of, meta] of Object.entries(metas)) {
    if (!meta) continue;
    if (meta.completed && LAST_STAGES.indexOf(meta.completed) > LAST_STAGES.indexOf(completed)) {
      completed = meta.completed;
    }
    outputs = {
      inducer: higherRate(outputs.inducer, meta.outputs.inducer),
      igniter: outputs.igniter || meta.outputs.igniter === true,
      gas: higherRate(outputs.gas, meta.outputs.gas),
    };
    if (meta.timer) timers.push({ of, timer: meta.timer });
  }
  const { blower } = snapshot.context;
  // The blower's run-on outlives the state that began it.
  if (blower === "running-on") timers.push({ of: "blower", timer: "blowerOff" });
  return { state: nameOf(snapshot.value), completed, outputs, blower, timers };
}
