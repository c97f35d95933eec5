import type { LastStage, Stage } from "./codes.ts";
import type { UnitProfile } from "./profile.ts";
import { onLadder, stagesOf } from "./stages.ts";

/**
 * What can be *seen* in a call for heat. Only these are buttons in a watch; what lies under the highest one
 * seen was passed, but is not read. A running inducer does not prove the safeties: on many boards an open
 * limit runs inducer and blower both. Common practice.
 */
export const SIGHTS = ["inducer", "glow", "spark", "pilot", "flame", "flame-stays", "blower"] as const;
export type Sight = (typeof SIGHTS)[number];

const SIGHT_STAGE: Record<Sight, Stage> = {
  inducer: "inducer",
  glow: "ignition-source",
  spark: "ignition-source",
  pilot: "lightoff",
  flame: "lightoff",
  "flame-stays": "main-burner",
  blower: "blower-on",
};

/** The rung that a sight completes. */
export function stageOfSight(sight: Sight): Stage {
  return SIGHT_STAGE[sight];
}

/** What can be seen on this unit, from the foot of the ladder up. */
export function sightsOf(profile: UnitProfile): Sight[] {
  const { codes, options } = profile;
  const rungs = stagesOf(codes, options);
  const glows = codes.ignition === "HSI" || codes.ignition === "IPH";
  const sparks = codes.ignition === "DSI" || codes.ignition === "IPS";
  const hasPilot = codes.ignition === "IPS" || codes.ignition === "IPH";
  return SIGHTS.filter((sight) => {
    if (sight === "glow") return glows;
    if (sight === "spark") return sparks;
    if (sight === "pilot") return hasPilot;
    if (sight === "flame") return !hasPilot;
    return rungs.includes(stageOfSight(sight));
  });
}

/** The glow or spark that has to be seen before gas opens, by ignition; null where a pilot burns. */
export function ignitionSightOf(profile: UnitProfile): "glow" | "spark" | null {
  const sight = sightsOf(profile).find((candidate) => candidate === "glow" || candidate === "spark");
  return sight === "glow" || sight === "spark" ? sight : null;
}

export type WatchEnd =
  "flame-lost" | "no-flame" | "no-glow" | "nothing" | "stopped" | "locked-out" | "limit-cut" | "satisfied";

/**
 * The last stage completed in a watch: from the highest thing seen and how it ended. A blower that started
 * together with the inducer means an open limit or rollout: then only the call came through.
 */
export function lastStageOfWatch(
  profile: UnitProfile,
  watch: { seen: readonly { sight: string }[]; end?: WatchEnd; blowerWithInducer?: boolean },
): LastStage {
  const place = (stage: LastStage) => onLadder(stage, profile.codes, profile.options);
  if (watch.end === "satisfied") return "satisfied";
  if (watch.blowerWithInducer) return place("call");
  const highest = SIGHTS.filter((sight) => watch.seen.some((seen) => seen.sight === sight)).at(-1);
  if (watch.end === "no-glow") return place("prepurge");
  if (!highest) return place("power");
  return place(stageOfSight(highest));
}
