import {
  CLOSED_CONTACT_V,
  SIGHTS,
  STAGES,
  lastStageOfWatch,
  stageOfSight,
  stagesOf,
  stoppedAt,
} from "@emberladder/furnace";
import type { LastStage, ReadingUnit, Sight, Stage } from "@emberladder/furnace";
import type { DiagnosisState, Observation, Watch } from "../state/diagnosis-state.ts";
import { rungOfDevice } from "./rung-of-device.ts";

export type RungState = "waiting" | "climbing" | "passed" | "read-open" | "proven" | "stopped" | "bypassed";

/** One rung of the drawn ladder. */
export interface Rung {
  stage: Stage;
  /** Number on the ladder, from the foot, from 1. */
  number: number;
  state: RungState;
  /** Seconds from the call for heat, where it was seen in the watch. */
  atS?: number;
  /** The newest reading that proved or stopped the rung. */
  reading?: { value: number | "OL"; unit: ReadingUnit; inV?: number; outV?: number };
  /** A stopped rung is lit up to the gap only after a reading has shown voltage there. */
  litToGap: boolean;
}

/** The watch that counts: the newest one. */
export function lastWatch(state: DiagnosisState): Watch | undefined {
  return state.watches.at(-1);
}

/** The last stage this call completed; `any` where nothing was watched. */
export function lastStageOf(state: DiagnosisState): LastStage {
  const watch = lastWatch(state);
  // A dead unit is not watched: nothing was completed, and that is known.
  if (state.profile && !watch && state.watchSkipped?.why === "no-power") return "none";
  if (!state.profile || !watch) return "any";
  return lastStageOfWatch(state.profile, {
    seen: watch.seen,
    end: watch.ended?.how,
    blowerWithInducer: watch.ended?.blowerWithInducer,
  });
}

/**
 * The ladder of the unit as the record shows it now. A rung is *passed* when something above it was seen,
 * *proven* when it was seen itself or a good reading was taken on it; a full call of the light-off proof
 * proves them all.
 */
export function ladderOf(state: DiagnosisState): Rung[] {
  const { profile } = state;
  if (!profile) return [];
  const stages = stagesOf(profile.codes, profile.options);
  const watch = lastWatch(state);
  const last = lastStageOf(state);
  const reached = last === "any" || last === "none" ? -1 : stages.indexOf(last);
  const running = watch !== undefined && !watch.ended;
  const cycled =
    (state.proofs["close-cycles"]?.value ?? 0) > 0 && state.proofs["close-cycle-end"] !== undefined;
  return stages.map((stage, index) => {
    const seen = seenAt(watch, stage);
    const reading = newestReading(state, stage);
    const bypassed = state.putBacks.some(
      (item) =>
        item.kind === "jumper-fitted" && !item.restored && item.device && rungOfDevice(item.device) === stage,
    );
    const base = {
      stage,
      number: index + 1,
      ...(seen === undefined ? {} : { atS: seen }),
      // After the light-off proof a reading that failed before the repair says nothing of the unit any more.
      ...readingOf(cycled && reading?.outcome !== "good" ? undefined : reading),
    };
    const stopped =
      (watch !== undefined || last === "none") && !running && index === reached + 1 && last !== "satisfied";
    return {
      ...base,
      litToGap: stopped && (reading?.inV ?? 0) >= CLOSED_CONTACT_V,
      state: bypassed
        ? "bypassed"
        : cycled
          ? "proven"
          : rungState({ index, reached, running, stopped, seen: seen !== undefined, reading, stage }),
    };
  });
}

function rungState(rung: {
  index: number;
  reached: number;
  running: boolean;
  stopped: boolean;
  seen: boolean;
  reading: Observation | undefined;
  stage: Stage;
}): RungState {
  if (rung.stopped) return "stopped";
  if (rung.stage === "draft-rest" && rung.reading?.outcome === "good") return "read-open";
  if (rung.index <= rung.reached) return rung.seen || rung.reading?.outcome === "good" ? "proven" : "passed";
  if (rung.running && rung.index === rung.reached + 1) return "climbing";
  return "waiting";
}

function seenAt(watch: Watch | undefined, stage: Stage): number | undefined {
  return watch?.seen.find(
    (seen) => SIGHTS.includes(seen.sight as Sight) && stageOfSight(seen.sight as Sight) === stage,
  )?.atS;
}

function newestReading(state: DiagnosisState, stage: Stage): Observation | undefined {
  return state.observations.findLast(
    (observation) =>
      observation.stage === stage && (observation.value !== undefined || observation.inV !== undefined),
  );
}

function readingOf(observation: Observation | undefined): Pick<Rung, "reading"> {
  if (!observation) return {};
  const { inV, outV, value = inV, unit = "V" } = observation;
  return value === undefined ? {} : { reading: { value, unit, inV, outV } };
}

/** Place of a stage on the full ladder, for comparing two stages. */
export function heightOf(stage: LastStage): number {
  if (stage === "none") return -1;
  return stage === "any" ? -2 : STAGES.indexOf(stage);
}

/** The rung the unit stopped at; null where nothing was watched or all of it ran. */
export function stoppedStageOf(state: DiagnosisState): Stage | null {
  const { profile } = state;
  return profile ? stoppedAt(lastStageOf(state), profile.codes, profile.options) : null;
}
