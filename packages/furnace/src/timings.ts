import type { Stage } from "./codes.ts";
import type { UnitProfile } from "./profile.ts";
import { stagesOf } from "./stages.ts";

/** A duration in seconds as it is usually met, with the range seen. */
export interface Span {
  usual: number;
  least: number;
  most: number;
}

export type TimingName =
  | "prepurgeS"
  | "warmUpS"
  | "trialS"
  | "blowerOnDelayS"
  | "blowerOffDelayS"
  | "postPurgeS"
  | "interpurgeS"
  | "softLockoutS"
  | "stageTwoDelayS";

/**
 * Timings of direct hot-surface units with an integrated board, where the label does not say. Common
 * practice, no single source; the 4 s from gas to flame are ANSI Z21.47, from memory.
 */
export const DEFAULT_TIMINGS: Record<TimingName, Span> = {
  prepurgeS: { usual: 20, least: 15, most: 60 },
  warmUpS: { usual: 20, least: 3, most: 60 },
  trialS: { usual: 5, least: 2, most: 10 },
  blowerOnDelayS: { usual: 30, least: 15, most: 60 },
  blowerOffDelayS: { usual: 120, least: 60, most: 180 },
  postPurgeS: { usual: 10, least: 5, most: 30 },
  interpurgeS: { usual: 30, least: 15, most: 120 },
  softLockoutS: { usual: 3600, least: 3600, most: 10_800 },
  stageTwoDelayS: { usual: 600, least: 300, most: 1200 },
};

/** Tries for ignition before lockout, and re-lights after a lost flame in one call. Common practice. */
export const DEFAULT_TRIES = 3;
export const DEFAULT_RECYCLES = 3;

/** Seconds the control waits for a draft switch before it gives up the try, and how long it then rests. */
export const DRAFT_WAIT_S: Span = { usual: 60, least: 30, most: 300 };
export const DRAFT_REST_S: Span = { usual: 300, least: 300, most: 900 };

/** An open limit for longer than this is a lockout until reset on some boards. Common practice. */
export const LIMIT_LOCKOUT_S = 180;

/** Seconds of burning after which the heat is counted as steady. Common practice. */
export const STEADY_S = 600;

/** The span of one timing for a unit: exactly what its label says, else the default. */
export function timingOf(profile: UnitProfile, name: TimingName): Span {
  const stated = profile.timings[name];
  return stated === undefined ? DEFAULT_TIMINGS[name] : { usual: stated, least: stated, most: stated };
}

/**
 * When each rung of a direct-ignition unit is due, in seconds from the call for heat: the earliest and the
 * latest that are still normal. Rungs without a time of their own share that of the rung that leads to them.
 */
export function dueTimes(profile: UnitProfile): Partial<Record<Stage, Span>> {
  const due: Partial<Record<Stage, Span>> = {};
  let so: Span = { usual: 0, least: 0, most: 0 };
  const add = (span: Span) => {
    so = { usual: so.usual + span.usual, least: so.least + span.least, most: so.most + span.most };
  };
  const step: Partial<Record<Stage, Span>> = {
    call: { usual: 1, least: 0, most: 3 },
    inducer: { usual: 1, least: 0, most: 2 },
    "draft-proved": { usual: 5, least: 1, most: 30 },
    prepurge: timingOf(profile, "prepurgeS"),
    "ignition-source": { ...timingOf(profile, "warmUpS"), least: 2 },
    gas: { usual: 0, least: 0, most: 2 },
    lightoff: { usual: 2, least: 0, most: 4 },
    "flame-proved": { usual: 1, least: 0, most: 4 },
    "main-burner": { usual: 1, least: 0, most: 4 },
    "blower-on": timingOf(profile, "blowerOnDelayS"),
    steady: { usual: STEADY_S, least: STEADY_S, most: STEADY_S },
  };
  for (const stage of stagesOf(profile.codes, profile.options)) {
    const span = step[stage];
    if (span) add(span);
    if (stage !== "satisfied") due[stage] = so;
  }
  return due;
}
