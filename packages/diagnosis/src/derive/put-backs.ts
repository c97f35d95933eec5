import { POWER_OFF_FIRST, getCheck, openingsOf } from "@emberladder/furnace";
import type { CheckId, Opening, PutBackKind } from "@emberladder/furnace";
import type { DiagnosisState, PutBack } from "../state/diagnosis-state.ts";

/**
 * The order in which it is safe to put things back: jumpers off first, then leads and meters, tubes and parts,
 * joints and ports, covers, and the gas last. Common practice.
 */
const SAFE_ORDER: readonly PutBackKind[] = [
  "jumper-fitted",
  "meter-in-series",
  "lead-lifted",
  "tube-pulled",
  "part-removed",
  "gas-joint-opened",
  "gas-port-opened",
  "cover-removed",
  "valve-closed",
];

/** What is still out, in the order in which it is safe to put back. */
export function openPutBacks(state: DiagnosisState): PutBack[] {
  return state.putBacks
    .filter((item) => !item.restored)
    .toSorted((a, b) => SAFE_ORDER.indexOf(a.kind) - SAFE_ORDER.indexOf(b.kind) || a.at - b.at);
}

/** Whether an entry's own act starts with "power off first". */
export function needsPowerOff(item: Pick<PutBack, "kind" | "device">): boolean {
  if (item.kind === "jumper-fitted") return item.device !== "thermostat";
  return POWER_OFF_FIRST.includes(item.kind);
}

/** A safety that is bypassed just now: no closing leaves one, but for a unit shut off. */
export function bypassedDevices(state: DiagnosisState): string[] {
  return openPutBacks(state).flatMap((item) =>
    item.kind === "jumper-fitted" ? [item.device ?? item.what] : [],
  );
}

/** Sides of the gas valve on which a joint or a tap was opened in this visit, back or not. */
export function openedGasSides(state: DiagnosisState): ("up" | "down")[] {
  const sides = state.putBacks.flatMap((item) =>
    item.kind === "gas-joint-opened" || item.kind === "gas-port-opened" ? [item.side ?? "down"] : [],
  );
  return [...new Set(sides)];
}

/**
 * What taking a check in one of its ways opens that is not out already: a door that is off is not taken off
 * twice, and a gas valve that is shut is not shut again.
 */
export function openingsToAdd(state: DiagnosisState, check: CheckId, way?: string): Opening[] {
  const chosen = way ?? (getCheck(check).ways?.length === 1 ? getCheck(check).ways?.[0]?.id : undefined);
  const out = openPutBacks(state);
  return openingsOf(check, chosen).filter(
    (opening) => !out.some((item) => item.kind === opening.kind && item.what === opening.what),
  );
}
