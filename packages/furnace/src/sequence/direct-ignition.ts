import type { UnitProfile } from "../profile.ts";
import { DEFAULT_RECYCLES, DEFAULT_TRIES } from "../timings.ts";
import {
  BURNING,
  GLOWING,
  OFF,
  PURGING,
  TRYING,
  cutByLimit,
  directIgnition,
  draftLost,
  endBeforeGas,
  flameTooSoon,
  meta,
} from "./direct-ignition-control.ts";
import type { SequenceContext } from "./sequence-types.ts";

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
    "FLAME.lit": { actions: "flameSeen" },
    "FLAME.lost": { actions: "flameGone" },
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
      // A flame that outlives the post-purge is found here.
      always: { guard: "isFlameSensed", target: "falseFlame" },
      on: { ...flameTooSoon, "CALL.on": { target: "called", actions: "callOn" } },
    },
    falseFlame: {
      id: "falseFlame",
      // The inducer airs the exchanger while the control waits for the flame signal to go.
      meta: meta("power", PURGING),
      on: {
        "FLAME.lost": [
          { guard: "isCalling", target: "called", actions: "flameGone" },
          { target: "idle", actions: "flameGone" },
        ],
      },
    },
    called: {
      meta: meta("call", OFF, "debounce"),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        ...flameTooSoon,
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
        ...flameTooSoon,
        "TIMER.startCheck": [
          { guard: "isFlameSensed", target: "falseFlame" },
          { guard: "isDraftClosed", target: "stuckClosed" },
          { target: "starting" },
        ],
      },
    },
    stuckClosed: {
      meta: meta("safeties", OFF),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        ...flameTooSoon,
        "DRAFT.open": { target: "starting", actions: "draftOpens" },
      },
    },
    starting: {
      // The inducer has volts; whether it turns is known a moment later, or when the switch closes.
      meta: meta("draft-rest", PURGING, "spinUp"),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        ...flameTooSoon,
        "DRAFT.closed": { target: "prepurge", actions: "draftCloses" },
        "TIMER.spinUp": { target: "inducer" },
      },
    },
    inducer: {
      id: "inducer",
      meta: meta("inducer", PURGING, "draftWait"),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        ...flameTooSoon,
        "DRAFT.closed": { target: "prepurge", actions: "draftCloses" },
        "TIMER.draftWait": { target: "draftPause" },
      },
    },
    draftPause: {
      meta: meta("inducer", OFF, "draftPause"),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        ...flameTooSoon,
        "TIMER.draftPause": { target: "checkingOpen" },
      },
    },
    prepurge: {
      meta: meta("draft-proved", PURGING, "prepurge"),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        ...draftLost,
        ...flameTooSoon,
        "TIMER.prepurge": [{ guard: "isFlameSensed", target: "falseFlame" }, { target: "warmUp" }],
      },
    },
    warmUp: {
      meta: meta("prepurge", GLOWING, "warmUp"),
      on: {
        ...endBeforeGas,
        ...cutByLimit,
        ...draftLost,
        ...flameTooSoon,
        "TIMER.warmUp": { target: "trial" },
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
        gas: { meta: meta("gas", TRYING), on: { "FLAME.lit": { target: "lightoff", actions: "flameSeen" } } },
        lightoff: {
          meta: meta("lightoff", TRYING),
          on: {
            "FLAME.proved": { target: "#burning" },
            "FLAME.lost": { target: "gas", actions: "flameGone" },
          },
        },
      },
    },
    interpurge: {
      meta: meta("draft-proved", PURGING, "interpurge"),
      on: {
        ...cutByLimit,
        ...draftLost,
        ...flameTooSoon,
        "CALL.off": { target: "postPurge", actions: "callOff" },
        "TIMER.interpurge": [{ guard: "isFlameSensed", target: "falseFlame" }, { target: "warmUp" }],
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
          { guard: "hasRecyclesLeft", target: "interpurge", actions: ["countRecycle", "flameGone"] },
          { guard: "locksHard", target: "hardLockout", actions: "flameGone" },
          { target: "softLockout", actions: "flameGone" },
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
              meta: { outputs: {}, timer: "stageTwo" },
              on: {
                "TIMER.stageTwo": { guard: "isTwoStage", target: "raising" },
                // A thermostat that asked for high from the start gets it once all burners are lit.
                "TIMER.crossover": { guard: "wantsHighFire", target: "raising" },
                "CALL.high": { guard: "isTwoStage", target: "raising", actions: "highCallOn" },
              },
            },
            // The inducer is on high and the gas still on low until the high draft switch closes.
            raising: {
              meta: { outputs: { inducer: "high" } },
              on: {
                "HIGH_DRAFT.closed": { target: "high" },
                "CALL.low": { target: "low", actions: "highCallOff" },
              },
            },
            high: {
              meta: { outputs: { inducer: "high", gas: "high" } },
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
      // The call and the safeties are all a locked-out control has; how high it had climbed is not kept.
      meta: meta("safeties", OFF, "softLockout"),
      on: {
        "CALL.off": { target: "idle", actions: "callOff" },
        "TIMER.softLockout": { target: "called", actions: "startOver" },
      },
    },
    hardLockout: {
      meta: meta("call", OFF),
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
    flame: false,
    blower: "off",
  };
}
