import type { Options, VariantCodes } from "../codes.ts";
import { mayApply } from "../variant.ts";
import { airChecks } from "./air-checks.ts";
import { callChecks } from "./call-checks.ts";
import { CHECK_IDS } from "./check-ids.ts";
import type { CheckId } from "./check-ids.ts";
import type { Check, CheckEntry, Instrument } from "./check-types.ts";
import { draftChecks } from "./draft-checks.ts";
import { gasChecks } from "./gas-checks.ts";
import { ignitionChecks } from "./ignition-checks.ts";
import type { Opening } from "./openings.ts";
import { supplyChecks } from "./supply-checks.ts";
import { ventChecks } from "./vent-checks.ts";

const entries: Record<CheckId, CheckEntry> = {
  ...supplyChecks,
  ...callChecks,
  ...draftChecks,
  ...ventChecks,
  ...ignitionChecks,
  ...gasChecks,
  ...airChecks,
};

/** Every check of the catalogue, in the order of a visit. */
export const CHECKS: readonly Check[] = CHECK_IDS.map((id) => ({
  id,
  ...entries[id],
  needsNumber: entries[id].reading !== "look" && !entries[id].passesOnSight,
  provenance: "common-practice",
  minutesProvenance: "judgement",
}));

const byId = new Map<CheckId, Check>(CHECKS.map((check) => [check.id, check]));

/** The check with an id. */
export function getCheck(id: CheckId): Check {
  const check = byId.get(id);
  if (!check) throw new Error(`There is no check ${id}.`);
  return check;
}

/** The checks that may be taken on a unit; an option it does not state keeps its checks in. */
export function checksFor(unit: { codes: VariantCodes; options: Options }): Check[] {
  return CHECKS.filter((check) => mayApply(check.applies, unit.codes, unit.options));
}

/**
 * What taking a check opens, in one of its ways: the check's own openings and those of the way. A way the check
 * does not have adds nothing.
 */
export function openingsOf(id: CheckId, way?: string): Opening[] {
  const check = getCheck(id);
  return [...check.opens, ...(check.ways?.find((candidate) => candidate.id === way)?.opens ?? [])];
}

const EYES: ReadonlySet<Instrument> = new Set(["nose", "eyes", "hand", "mirror", "camera", "lamp"]);

/** Whether a check is taken with nothing but the senses and a light. */
export function isLookOnly(id: CheckId): boolean {
  return getCheck(id).instruments.every((instrument) => EYES.has(instrument));
}
