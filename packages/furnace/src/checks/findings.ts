import type { Outcome } from "../codes.ts";
import type { FaultId, SymptomId } from "../faults/fault-ids.ts";
import { evaluateVariant } from "../variant.ts";
import type { VariantContext } from "../variant.ts";
import { airFindings } from "./air-findings.ts";
import { callFindings } from "./call-findings.ts";
import type { CheckId } from "./check-ids.ts";
import type { FindingEntry } from "./check-types.ts";
import { draftFindings } from "./draft-findings.ts";
import { gasFindings } from "./gas-findings.ts";
import { ignitionFindings } from "./ignition-findings.ts";
import { supplyFindings } from "./supply-findings.ts";

/** What may be found at each check. A check with an empty list has one failing outcome only. */
export const CHECK_FINDINGS = {
  ...supplyFindings,
  ...callFindings,
  ...draftFindings,
  ...ignitionFindings,
  ...gasFindings,
  ...airFindings,
} satisfies Record<CheckId, Record<string, FindingEntry>>;

/** Two findings that fit every check. */
export const UNIVERSAL_FINDINGS = {
  /** Taken again after a repair, reset or part change: confirms the repair, says nothing against the fault. */
  retest: { classes: ["good", "marginal"], pointsAt: [] },
  /** Less than 22 V in, or a value across with neither side read: says nothing about the device. */
  "no-path": { classes: [], pointsAt: [] },
} as const satisfies Record<string, FindingEntry>;

export type UniversalFinding = keyof typeof UNIVERSAL_FINDINGS;

/** The findings of one check, by type: a finding that a check does not have does not compile. */
export type FindingIdOf<C extends CheckId> = keyof (typeof CHECK_FINDINGS)[C] & string;

/** A finding with its id. */
export interface Finding extends FindingEntry {
  readonly id: string;
}

/** The findings of a check in the order they are offered, without the two universal ones. */
export function findingsOf(check: CheckId): Finding[] {
  const entries: Record<string, FindingEntry> = CHECK_FINDINGS[check];
  return Object.entries(entries).map(([id, entry]) => ({ id, ...entry }));
}

/** A finding of a check, or undefined where the check has no such finding. */
export function getFinding(check: CheckId, finding: string): Finding | undefined {
  const entries: Record<string, FindingEntry> = { ...UNIVERSAL_FINDINGS, ...CHECK_FINDINGS[check] };
  const entry = Object.hasOwn(entries, finding) ? entries[finding] : undefined;
  return entry && { id: finding, ...entry };
}

/** The faults and symptoms a finding points at on one unit. */
export function pointsAt(check: CheckId, finding: string, unit: VariantContext): (FaultId | SymptomId)[] {
  const entry = getFinding(check, finding);
  if (!entry) return [];
  const more = entry.also && evaluateVariant(entry.also.when, unit) !== false ? entry.also.pointsAt : [];
  return [...entry.pointsAt, ...more];
}

const RANK: Record<Outcome, number> = { good: 0, marginal: 1, fail: 2 };

/** The worse of two classes; an absent one counts for nothing. */
export function worseOutcome(a: Outcome | undefined, b: Outcome | undefined): Outcome | undefined {
  if (!a || !b) return a ?? b;
  return RANK[a] >= RANK[b] ? a : b;
}

/**
 * The class after a finding is added to it: the value gives the class, and a finding can only lower it. With no
 * value, a finding that carries one class gives that class and one that carries several gives none.
 */
export function lowerByFinding(
  outcome: Outcome | undefined,
  check: CheckId,
  finding: string | undefined,
): Outcome | undefined {
  const entry = finding === undefined ? undefined : getFinding(check, finding);
  if (!entry || entry.classes.length === 0) return finding === "no-path" ? undefined : outcome;
  const best = entry.classes.reduce((a, b) => (RANK[a] <= RANK[b] ? a : b));
  if (outcome === undefined) return entry.classes.length === 1 ? best : undefined;
  return worseOutcome(outcome, best);
}
