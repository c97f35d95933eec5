import { assign, setup } from "xstate";
import type { UnitProfile } from "../profile.ts";
import { DEFAULT_RECYCLES, DEFAULT_TRIES } from "../timings.ts";
import type {
  SequenceContext,
  SequenceEvent,
  SequenceMeta,
  SequenceOutputs,
  SequenceTimer,
} from "./sequence-types.ts";
import type { LastStage } from "../codes.ts";

const OFF: SequenceOutputs = { inducer: "off", igniter: false, gas: "off" };
const PURGING: SequenceOutputs = { ...OFF, inducer: "low" };
const GLOWING: SequenceOutputs = { ...PURGING, igniter: true };
const TRYING: SequenceOutputs = { ...GLOWING, gas: "low" };
const BURNING: SequenceOutputs = { ...PURGING, gas: "low" };

const meta = (completed: LastStage, outputs: SequenceOutputs, timer?: SequenceTimer): SequenceMeta => ({
  completed,
  outputs,
  ...(timer ? { timer } : {}),
});

const directIgnition = setup({
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
    hasTriesLeft: ({ context }) => context.tries + 1 < context.maxTries,
    hasRecyclesLeft: ({ context }) => context.recycles < context.maxRecycles,
    isTwoStage: ({ context }) => context.twoStage,
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
    powerLost: assign({ tries: 0, recycles: 0, blower: "off", draftClosed: false }),
    highCallOn: assign({ highCall: true }),
    highCallOff: assign({ highCall: false }),
  },
});

/** An open limit or rollout ends any of these states at once: gas off, inducer and blower on. */
const cutByLimit = { "LIMIT.open": { target: "#limitOpen", actions: "limitOpens" } } as const;
/** The call taken away before the gas: nothing has burned, so there is nothing to purge. */
const endBeforeGas = { "CALL.off": { target: "#idle", actions: "callOff" } } as const;
/** The draft switch opens: gas off at once, and the sequence starts again from the inducer. */
const draftLost = { "DRAFT.open": { target: "#inducer", actions: "draftOpens" } } as const;

/**
 * The ignition sequence of a direct hot-surface unit with induced draft and an integrated board, one or two
 * stages, natural gas or propane: tries, re-lights, lockouts, open limit, purges and blower delays.
 *
 * States are named for what the unit does; `meta.completed` is the last stage completed. Order and behaviour
 * are common practice; safe start (a flame before gas is no start) and lockout follow ANSI Z21.20, from
 * memory.
 */
export const directIgnitionMachine = directIgnition.createMachine({
  id: "sequence",
  context: ({ input }) => input,
  initial: "dead",
  on: {
    "LINE.off": { target: ".dead", actions: "powerLost" },
    "CALL.on": { actions: "callOn" },
    "CALL.off": { actions: "callOff" },
    "CALL.high": { actions: "highCallOn" },
    "CALL.low": { actions: "highCallOff" },
    "LIMIT.open": { actions: "limitOpens" },
    "LIMIT.closed": { actions: "limitCloses" },
    "DRAFT.open": { actions: "draftOpens" },
    "DRAFT.closed": { actions: "draftCloses" },
    "TIMER.blowerOff": { actions: "blowerStops" },
  },
  states: {
    dead: {
      meta: meta("none", OFF),
      on: { "LINE.on": [{ guard: "isCalling", target: "called" }, { target: "idle" }] },
    },
    idle: {
      id: "idle",
      meta: meta("power", OFF),
      on: {
        "CALL.on": { target: "called", actions: "callOn" },
        "FLAME.lit": { target: "hardLockout" },
      },
    },
    called: {
      meta: meta("call", OFF, "debounce"),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        "TIMER.debounce": [{ guard: "isLimitOpen", target: "limitOpen" }, { target: "checkingOpen" }],
      },
    },
    limitOpen: {
      id: "limitOpen",
      meta: meta("call", PURGING, "limitLockout"),
      entry: "blowerStarts",
      exit: "blowerRunsOn",
      on: {
        "LIMIT.closed": [
          { guard: "isCalling", target: "checkingOpen", actions: "limitCloses" },
          { target: "idle", actions: "limitCloses" },
        ],
        "TIMER.limitLockout": { target: "hardLockout" },
      },
    },
    checkingOpen: {
      meta: meta("safeties", OFF, "startCheck"),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        "TIMER.startCheck": [{ guard: "isDraftClosed", target: "stuckClosed" }, { target: "inducer" }],
      },
    },
    stuckClosed: {
      meta: meta("safeties", OFF),
      on: { ...endBeforeGas, ...cutByLimit, "DRAFT.open": { target: "inducer", actions: "draftOpens" } },
    },
    inducer: {
      id: "inducer",
      // Running is not proof: `draft-rest` is the last thing completed until the inducer is seen or read.
      meta: meta("inducer", PURGING, "draftWait"),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        "DRAFT.closed": { target: "prepurge", actions: "draftCloses" },
        "TIMER.draftWait": { target: "draftPause" },
      },
    },
    draftPause: {
      meta: meta("inducer", OFF, "draftPause"),
      on: { ...endBeforeGas, ...cutByLimit, "TIMER.draftPause": { target: "checkingOpen" } },
    },
    prepurge: {
      meta: meta("draft-proved", PURGING, "prepurge"),
      on: { ...endBeforeGas, ...cutByLimit, ...draftLost, "TIMER.prepurge": { target: "warmUp" } },
    },
    warmUp: {
      meta: meta("prepurge", GLOWING, "warmUp"),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        ...draftLost,
        "TIMER.warmUp": { target: "trial" },
        "FLAME.lit": { target: "hardLockout" },
      },
    },
    trial: {
      initial: "gas",
      meta: meta("ignition-source", TRYING, "trial"),
      on: {
        ...cutByLimit,
        ...draftLost,
        "CALL.off": { target: "postPurge", actions: "callOff" },
        "TIMER.trial": [
          { guard: "hasTriesLeft", target: "interpurge", actions: "countTry" },
          { guard: "locksHard", target: "hardLockout" },
          { target: "softLockout" },
        ],
      },
      states: {
        gas: { meta: meta("gas", TRYING), on: { "FLAME.lit": { target: "lightoff" } } },
        lightoff: {
          meta: meta("lightoff", TRYING),
          on: { "FLAME.proved": { target: "#burning" }, "FLAME.lost": { target: "gas" } },
        },
      },
    },
    interpurge: {
      meta: meta("draft-proved", PURGING, "interpurge"),
      on: {
        ...cutByLimit,
        ...draftLost,
        "CALL.off": { target: "postPurge", actions: "callOff" },
        "TIMER.interpurge": { target: "warmUp" },
      },
    },
    burning: {
      id: "burning",
      type: "parallel",
      exit: "blowerRunsOn",
      on: {
        ...cutByLimit,
        ...draftLost,
        "CALL.off": { target: "postPurge", actions: "callOff" },
        "FLAME.lost": [
          { guard: "hasRecyclesLeft", target: "interpurge", actions: "countRecycle" },
          { guard: "locksHard", target: "hardLockout" },
          { target: "softLockout" },
        ],
      },
      states: {
        heat: {
          initial: "flameProved",
          states: {
            flameProved: {
              meta: meta("flame-proved", BURNING, "crossover"),
              on: { "TIMER.crossover": { target: "mainBurner" } },
            },
            mainBurner: {
              meta: meta("main-burner", BURNING, "blowerOn"),
              on: { "TIMER.blowerOn": { target: "blowerOn" } },
            },
            blowerOn: {
              entry: "blowerStarts",
              meta: meta("blower-on", BURNING, "steady"),
              on: { "TIMER.steady": { target: "steady" } },
            },
            steady: { meta: meta("steady", BURNING) },
          },
        },
        rate: {
          initial: "low",
          states: {
            low: {
              on: {
                "TIMER.stageTwo": { guard: "isTwoStage", target: "raising" },
                "CALL.high": { guard: "isTwoStage", target: "raising", actions: "highCallOn" },
              },
            },
            // The inducer is on high and the gas still on low until the high draft switch closes.
            raising: {
              on: {
                "HIGH_DRAFT.closed": { target: "high" },
                "CALL.low": { target: "low", actions: "highCallOff" },
              },
            },
            high: {
              on: {
                "HIGH_DRAFT.open": { target: "raising" },
                "CALL.low": { target: "low", actions: "highCallOff" },
              },
            },
          },
        },
      },
    },
    postPurge: {
      meta: meta("satisfied", PURGING, "postPurge"),
      on: {
        "TIMER.postPurge": [{ guard: "isCalling", target: "called" }, { target: "idle" }],
      },
    },
    softLockout: {
      meta: meta("draft-proved", OFF, "softLockout"),
      on: {
        "CALL.off": { target: "idle", actions: "callOff" },
        "TIMER.softLockout": { target: "called", actions: "startOver" },
      },
    },
    hardLockout: {
      meta: meta("power", OFF),
      on: { "CALL.off": { target: "idle", actions: "callOff" } },
    },
  },
});

/** The starting values of a unit's control: how often it tries, its stages, its fuel. */
export function sequenceInput(profile: UnitProfile): SequenceContext {
  return {
    tries: 0,
    recycles: 0,
    maxTries: profile.timings.tries ?? DEFAULT_TRIES,
    maxRecycles: profile.timings.recycles ?? DEFAULT_RECYCLES,
    twoStage: profile.codes.staging === "2S",
    fuel: profile.codes.fuel,
    calling: false,
    highCall: false,
    limitOpen: false,
    draftClosed: false,
    blower: "off",
  };
}
