import { CLOSING_CHECK_IDS, closingChecksFor, closingPass, getClosingCheck } from "@emberladder/furnace";
import type { ClosingReading, ClosingRequirement, ClosingVerdict, TouchRow } from "@emberladder/furnace";
import type { VisitOutcome } from "../events/closing-events.ts";
import { foundTripped } from "../rules/conclude-rules.ts";
import type { DiagnosisState, Observation } from "../state/diagnosis-state.ts";
import { bypassedDevices, openedGasSides, openPutBacks } from "./put-backs.ts";

/** One closing check of this visit: why it is asked for, what was recorded, whether it passes. */
export interface ProofItem extends ClosingRequirement {
  reading: ClosingReading | null;
  verdict: ClosingVerdict;
  /** Where the reading comes from: recorded for the proof, an after-repair reading, or the record itself. */
  from: "proof" | "reading" | "record" | null;
}

const DAY_MS = 86_400_000;

/** Rows of the closing table that this visit touched, by repairs, by joints opened, and by what was found. */
export function touchedRows(state: DiagnosisState): TouchRow[] {
  const rows = new Set<TouchRow>(state.repairs.flatMap((repair) => repair.touched));
  if (openedGasSides(state).length > 0) rows.add("gas-joint");
  if (foundTripped(state)) rows.add("safety");
  return [...rows];
}

/** How the visit is going to end, as far as the record shows it: a cause that was repaired ends as fixed. */
export function likelyOutcome(state: DiagnosisState): VisitOutcome {
  if (state.closed) return state.closed.outcome;
  if (!state.conclusion || !state.conclusion.proven) return "not-found";
  const ordered = state.repairs.some((repair) => repair.parts.some((part) => part.state === "ordered"));
  if (ordered) return "part-needed";
  return "fixed";
}

/**
 * The light-off proof of this visit for an outcome: only what was touched asks for anything. `now` decides
 * whether the last flue CO is fresh enough.
 */
export function proofOf(state: DiagnosisState, outcome: VisitOutcome, now: number): ProofItem[] {
  const { profile } = state;
  if (!profile) return [];
  const lastCo = profile.lastFlueCo;
  const required = closingChecksFor({
    touched: touchedRows(state),
    outcome,
    profile,
    intermittent: state.observations.some((observation) => observation.finding === "intermittent"),
    gasJoints: openedGasSides(state),
    flueCoWithin12Months: lastCo !== undefined && now - Date.parse(lastCo.date) <= 365 * DAY_MS,
    litAfterJoint: wasLit(state),
  });
  return required.map((requirement) => {
    const { reading, from } = readingFor(state, requirement);
    const verdict: ClosingVerdict = reading
      ? closingPass(requirement.id, reading, profile, { lights: requirement.lights })
      : { pass: false, missing: ["value"] };
    return { ...requirement, reading, verdict, from };
  });
}

/** Whether the burner was lit in this visit after the repair: a joint downstream holds gas only then. */
export function wasLit(state: DiagnosisState): boolean {
  const cycles = state.proofs["close-cycles"];
  return (cycles?.value ?? 0) > 0;
}

function readingFor(
  state: DiagnosisState,
  requirement: ClosingRequirement,
): { reading: ClosingReading | null; from: ProofItem["from"] } {
  const { id } = requirement;
  const recorded = state.proofs[id];
  if (id === "close-jumpers")
    return { reading: { value: bypassedOrOut(state), unit: "count" }, from: "record" };
  if (id === "close-docs") return { reading: { value: docsCount(state), unit: "count" }, from: "record" };
  if (recorded) {
    const { value, unit, also, seenRight } = recorded;
    return { reading: { value, unit, also, seenRight }, from: "proof" };
  }
  if (id === "close-panels" && !state.putBacks.some((item) => item.kind === "cover-removed")) {
    return { reading: { seenRight: true }, from: "record" };
  }
  const check = getClosingCheck(id).countsReadingOf;
  const taken = check && state.observations.findLast((observation) => counts(observation, check, state));
  if (taken && typeof taken.value === "number") {
    return { reading: { value: taken.value, unit: taken.unit }, from: "reading" };
  }
  return { reading: null, from: null };
}

/** A reading taken after the last repair counts for the proof: no gauge goes on just to close. */
function counts(observation: Observation, check: string, state: DiagnosisState): boolean {
  if (observation.check !== check) return false;
  if (check === "ck-flue-analysis" && observation.way !== "co-air-free") return false;
  if (check === "ck-inlet-pressure-running" || check === "ck-manifold-pressure") return false;
  const repairedAt = state.repairs.at(-1);
  const order = (eventId: string) => state.log.findIndex((event) => event.id === eventId);
  return repairedAt !== undefined && order(observation.eventId) > order(repairedAt.eventId);
}

function bypassedOrOut(state: DiagnosisState): number {
  return Math.max(openPutBacks(state).length, bypassedDevices(state).length);
}

/** Entries of the record that a later reader needs: conclusion, readings, repairs, parts. */
function docsCount(state: DiagnosisState): number {
  const concluded = state.conclusion ? 1 : 0;
  const parts = state.repairs.flatMap((repair) => repair.parts).length;
  return concluded + state.observations.length + state.looks.length + state.repairs.length + parts;
}

/** The proof in the order of the catalogue, only what is still wanted. */
export function proofMissing(items: readonly ProofItem[]): ProofItem[] {
  return items
    .filter((item) => !item.verdict.pass)
    .toSorted((a, b) => CLOSING_CHECK_IDS.indexOf(a.id) - CLOSING_CHECK_IDS.indexOf(b.id));
}
