import type { UnitProfile } from "../profile.ts";
import { DRAFT_REST_S, DRAFT_WAIT_S, LIMIT_LOCKOUT_S, STEADY_S, timingOf } from "../timings.ts";
import { directIgnitionMachine, sequenceInput } from "./direct-ignition.ts";
import type { SequenceTimer } from "./sequence-types.ts";

/**
 * Whether the sequence of this family is written: direct hot surface, pressure switch, integrated board, one or
 * two stages.
 */
export function hasSequence(profile: UnitProfile): boolean {
  const { ignition, draft, control, staging } = profile.codes;
  return ignition === "HSI" && draft === "IDP" && control === "IFC" && staging !== "MOD";
}

/** How long each of a unit's timers runs, in seconds: its label's figures, else the usual ones. */
export function timerSeconds(profile: UnitProfile): Record<SequenceTimer, number> {
  return {
    debounce: 1,
    startCheck: 1,
    spinUp: 1,
    draftWait: DRAFT_WAIT_S.usual,
    draftPause: DRAFT_REST_S.usual,
    prepurge: timingOf(profile, "prepurgeS").usual,
    warmUp: timingOf(profile, "warmUpS").usual,
    trial: timingOf(profile, "trialS").usual,
    crossover: 1,
    blowerOn: timingOf(profile, "blowerOnDelayS").usual,
    steady: STEADY_S,
    postPurge: timingOf(profile, "postPurgeS").usual,
    blowerOff: timingOf(profile, "blowerOffDelayS").usual,
    interpurge: timingOf(profile, "interpurgeS").usual,
    softLockout: timingOf(profile, "softLockoutS").usual,
    limitLockout: LIMIT_LOCKOUT_S,
    stageTwo: timingOf(profile, "stageTwoDelayS").usual,
  };
}

/**
 * The ignition sequence of a unit as a machine and the input to start it with.
 * @throws where the family's sequence is not written; ask `hasSequence` first.
 */
export function createSequence(profile: UnitProfile) {
  if (!hasSequence(profile)) throw new Error("The sequence of this kind of unit is not written.");
  return { machine: directIgnitionMachine, input: sequenceInput(profile), timers: timerSeconds(profile) };
}
