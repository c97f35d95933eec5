import { CLOCK_TOLERANCE_MINUTES } from "@emberladder/contract";
import type { Role } from "@emberladder/contract";
import type { Envelope } from "@emberladder/diagnosis";
import { findBreaches } from "./judge.ts";
import type { TreeDocument } from "@emberladder/trees";
import type { Breach, DiagnosisState, ReadBody } from "./judge.ts";
import { treeFlagsOf } from "./tree-step-flags.ts";

/** Flags that tell a supervisor something, but do not hold a report back. */
export const INFORMATIVE_RULES: readonly string[] = [
  "clock-off",
  "unknown-step",
  "tree-step-unreachable",
  "tree-unknown",
];

/** What is known of the record before an event, beside its folded state. */
export interface Before {
  state: DiagnosisState;
  /** Devices that have written to this diagnosis. */
  devices: ReadonlySet<string>;
  /** The document of the pinned tree, where there is one. */
  tree: TreeDocument | null;
}

/**
 * Everything to flag on an event: rules of the trade that it is against, and facts about the record: a
 * second device, a phone's clock that is off, a record kept by a trainee.
 */
export function flagsOf(event: Envelope, read: ReadBody, before: Before, role: Role): Breach[] {
  const flags = findBreaches(before.state, read, event.occurredAt + (event.serverOffsetMs ?? 0));
  flags.push(...treeFlagsOf(before.state, read, before.tree));
  const isFirstOfDevice = !before.devices.has(event.deviceId);
  const offsetMinutes = Math.round((event.serverOffsetMs ?? 0) / 60_000);
  if (isFirstOfDevice && Math.abs(offsetMinutes) > CLOCK_TOLERANCE_MINUTES)
    flags.push({ rule: "clock-off", params: { minutes: offsetMinutes } });
  if (isFirstOfDevice && before.devices.size > 0) flags.push({ rule: "second-device" });
  if (isFirstOfDevice && role === "trainee") flags.push({ rule: "recorded-by-trainee" });
  if (before.state.closed !== null && read.kind === "unknown") flags.push({ rule: "after-close" });
  return flags;
}
