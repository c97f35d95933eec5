import {
  breaches,
  evolve,
  initialState,
  lastStageOf,
  parseBody,
  standingConclusionRules,
} from "@emberladder/diagnosis";
import type {
  BodyOf,
  Breach,
  DiagnosisState,
  Envelope,
  EventBody,
  RecordedEvent,
} from "@emberladder/diagnosis";

/**
 * All that the server asks the record's own rules. The rules never refuse here: what a technician did is
 * kept, and what is against a rule is flagged.
 */

export type { Breach, DiagnosisState };
export { initialState };

/** An event's body as this build reads it. */
export type ReadBody =
  | { kind: "known"; event: EventBody }
  /** A newer type or version: kept as it is. */
  | { kind: "unknown" }
  | { kind: "malformed"; detail: string };

/** Reads the body of an event. */
export function readEventBody({ type, schemaVersion, body }: Envelope): ReadBody {
  const parsed = parseBody(type, schemaVersion, body);
  if (!parsed.ok) {
    const [issue] = parsed.issues;
    return { kind: "malformed", detail: `${issue?.path ?? ""}: ${issue?.message ?? "not readable"}` };
  }
  return parsed.known ? { kind: "known", event: parsed.event } : { kind: "unknown" };
}

/** The body of an opening, or undefined for any other event. */
export function readOpening(read: ReadBody): BodyOf<"diagnosis.opened"> | undefined {
  return read.kind === "known" && read.event.type === "diagnosis.opened" ? read.event.body : undefined;
}

/** The state after one more event. */
export function evolveState(
  state: DiagnosisState,
  event: Envelope,
  stamp: { serverSeq: number; actorId: string },
): DiagnosisState {
  const recorded: RecordedEvent = {
    id: event.id,
    type: event.type,
    schemaVersion: event.schemaVersion,
    body: event.body,
    occurredAt: event.occurredAt,
    deviceId: event.deviceId,
    deviceSeq: event.deviceSeq,
    ...stamp,
  };
  return evolve(state, recorded);
}

/**
 * The rules that an event is against in the state before it.
 * @param at when it happened by the server's clock, UTC milliseconds
 */
export function findBreaches(state: DiagnosisState, read: ReadBody, at: number): Breach[] {
  if (read.kind !== "known") return [{ rule: "unknown-step" }];
  try {
    const found = breaches(state, read.event, { now: at });
    return read.event.type === "diagnosis.closed" ? withConclusion(found, state) : found;
  } catch {
    // A record that the rules cannot judge is kept all the same, and somebody has to look at it.
    return [{ rule: "not-judged" }];
  }
}

/**
 * With what the conclusion is against at the closing, however the visit ended: the customer is told of the
 * cause even where the unit is left off.
 */
function withConclusion(found: Breach[], state: DiagnosisState): Breach[] {
  const more = standingConclusionRules(state);
  return [...found, ...more.filter(({ rule }) => !found.some((known) => known.rule === rule))];
}

/** What lists and jobs need to know of a state. */
export interface Projection {
  isClosed: boolean;
  outcome: string | null;
  closedAt: Date | null;
  lastStage: string | null;
  /** The closing asks for a report to the customer. */
  wantsReport: boolean;
}

/** The columns of a diagnosis that follow from its events. */
export function projectState(state: DiagnosisState): Projection {
  const stage = lastStageOf(state);
  return {
    isClosed: state.closed !== null,
    outcome: state.closed?.outcome ?? null,
    closedAt: state.closed === null ? null : new Date(state.closed.at),
    lastStage: stage === "any" ? null : stage,
    wantsReport: state.closed !== null && state.report?.to === "customer",
  };
}
