import { assign, setup } from "xstate";
import type { LastStage } from "../codes.ts";
import type {
  SequenceContext,
  SequenceEvent,
  SequenceMeta,
  SequenceOutputs,
  SequenceTimer,
} from "./sequence-types.ts";

/** What the control energises in its states, from nothing to a burning main burner. */
export const OFF: SequenceOutputs = { inducer: "off", igniter: false, gas: "off" };
export const PURGING: SequenceOutputs = { ...OFF, inducer: "low" };
export const GLOWING: SequenceOutputs = { ...PURGING, igniter: true };
export const TRYING: SequenceOutputs = { ...GLOWING, gas: "low" };
export const BURNING: SequenceOutputs = { ...PURGING, gas: "low" };

/** What a state says of itself, in the order it is written in the machine. */
export const meta = (
  completed: LastStage,
  outputs: SequenceOutputs,
  timer?: SequenceTimer,
): SequenceMeta => ({
  completed,
  outputs,
  ...(timer ? { timer } : {}),
});

/** Events, guards and actions of the control by name, so that its machine reads as prose. */
export const directIgnition = setup({
  types: {
    context: {} as SequenceContext,
    events: {} as SequenceEvent,
    input: {} as SequenceContext,
    meta: {} as SequenceMeta,
  },
  guards: {
    isLimitOpen: ({ context }) => context.limitOpen,
    isDraftClosed: ({ context }) => context.draftClosed,
    isCalling: ({ context }) => context.calling,
    isFlameSensed: ({ context }) => context.flame,
    hasTriesLeft: ({ context }) => context.tries + 1 < context.maxTries,
    hasRecyclesLeft: ({ context }) => context.recycles < context.maxRecycles,
    isTwoStage: ({ context }) => context.twoStage,
    wantsHighFire: ({ context }) => context.twoStage && context.highCall,
    /** Propane settles low and does not clear by itself: no automatic restart. Common practice. */
    locksHard: ({ context }) => context.fuel === "LP",
  },
  actions: {
    callOn: assign({ calling: true }),
    callOff: assign({ calling: false, highCall: false, tries: 0, recycles: 0 }),
    limitOpens: assign({ limitOpen: true }),
    limitCloses: assign({ limitOpen: false }),
    draftOpens: assign({ draftClosed: false }),
    draftCloses: assign({ draftClosed: true }),
    flameSeen: assign({ flame: true }),
    flameGone: assign({ flame: false }),
    countTry: assign({ tries: ({ context }) => context.tries + 1 }),
    countRecycle: assign({ recycles: ({ context }) => context.recycles + 1, tries: 0 }),
    startOver: assign({ tries: 0, recycles: 0 }),
    blowerStarts: assign({ blower: "on" }),
    blowerRunsOn: assign({
      blower: ({ context }) => (context.blower === "on" ? "running-on" : context.blower),
    }),
    blowerStops: assign({
      blower: ({ context }) => (context.blower === "running-on" ? "off" : context.blower),
    }),
    powerLost: assign({ tries: 0, recycles: 0, blower: "off", draftClosed: false, flame: false }),
    highCallOn: assign({ highCall: true }),
    highCallOff: assign({ highCall: false }),
  },
});

/** An open limit or rollout ends any of these states at once: gas off, inducer and blower on. */
export const cutByLimit = { "LIMIT.open": { target: "#limitOpen", actions: "limitOpens" } } as const;
/** The call taken away before the gas: nothing has burned, so there is nothing to purge. */
export const endBeforeGas = { "CALL.off": { target: "#idle", actions: "callOff" } } as const;
/** The draft switch opens: gas off at once, and the sequence starts again from the inducer. */
export const draftLost = { "DRAFT.open": { target: "#inducer", actions: "draftOpens" } } as const;

/** A flame seen while no gas should flow: the valve leaks or the sensing is wrong, and nothing may start. */
export const flameTooSoon = { "FLAME.lit": { target: "#falseFlame", actions: "flameSeen" } } as const;
