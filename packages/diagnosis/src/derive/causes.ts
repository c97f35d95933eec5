import {
  FREQUENCIES,
  decides,
  faultsFor,
  getFault,
  isCheckId,
  isFaultId,
  pointsAt,
} from "@emberladder/furnace";
import type { FaultId } from "@emberladder/furnace";
import type { DiagnosisState, Observation } from "../state/diagnosis-state.ts";

interface Seen {
  eventId: string;
  check: string;
  finding?: string;
  outcome?: Observation["outcome"];
}

function seenIn(state: DiagnosisState): Seen[] {
  return [
    ...state.observations,
    ...state.looks.flatMap(({ eventId, check, finding, outcome }) =>
      check ? [{ eventId, check, finding, outcome }] : [],
    ),
  ];
}

/** How much one thing seen speaks for a fault: 3 decides it, 1 points at it. */
function weight(seen: Seen, fault: FaultId, state: DiagnosisState): number {
  if (decides(seen, fault)) return 3;
  const { profile } = state;
  if (!profile || !seen.finding || !isCheckId(seen.check)) return 0;
  return pointsAt(seen.check, seen.finding, { codes: profile.codes, options: profile.options }).includes(
    fault,
  )
    ? 1
    : 0;
}

/**
 * Causes that what was seen points at, the best shown first, then the commoner. It orders a list to choose
 * from; it says nothing of how likely a cause is.
 */
export function causeCandidates(state: DiagnosisState): FaultId[] {
  const { profile } = state;
  if (!profile) return [];
  const seen = seenIn(state);
  return faultsFor(profile)
    .map((fault) => ({
      id: fault.id,
      shown: seen.reduce((sum, one) => sum + weight(one, fault.id, state), 0),
      frequency: FREQUENCIES.indexOf(fault.frequency),
    }))
    .filter((candidate) => candidate.shown > 0)
    .toSorted((a, b) => b.shown - a.shown || a.frequency - b.frequency)
    .slice(0, 12)
    .map((candidate) => candidate.id);
}

/** The events that show a cause: those that decide it first, then those that point at it. */
export function evidenceFor(state: DiagnosisState, cause: string): string[] {
  if (!isFaultId(cause)) return [];
  return seenIn(state)
    .map((seen) => ({ eventId: seen.eventId, weight: weight(seen, cause, state) }))
    .filter((seen) => seen.weight > 0)
    .toSorted((a, b) => b.weight - a.weight)
    .slice(0, 40)
    .map((seen) => seen.eventId);
}

/** The repairs that cure a concluded cause, the usual one first. */
export function repairsFor(cause: string) {
  return isFaultId(cause) ? getFault(cause).repairs : [];
}
