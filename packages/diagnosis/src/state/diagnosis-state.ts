import type { UnitProfile } from "@emberladder/furnace";
import type { OpeningBody, UnitState } from "../events/fields.ts";
import type { BodyOf } from "../events/index.ts";
import type { VisitOutcome } from "../events/closing-events.ts";

/** What the fold needs of an event; the envelope carries more. */
export interface RecordedEvent {
  id: string;
  type: string;
  schemaVersion: number;
  body: unknown;
  /** UTC milliseconds on the device. */
  occurredAt: number;
  deviceId: string;
  deviceSeq: number;
  serverSeq?: number;
  actorId?: string;
}

/** Which event said it and when: every part of the state can be traced to its step. */
export interface Trace {
  eventId: string;
  at: number;
}

export type DoorAnswer = Trace & BodyOf<"door.answered">;
export type Look = Trace & BodyOf<"look.answered">;
export type Observation = Trace & BodyOf<"check.answered"> & { corrected?: boolean };
export type Declined = Trace & BodyOf<"check.declined">;
export type Departure = Trace & BodyOf<"tree.left">;
export type Conclusion = Trace & BodyOf<"cause.concluded">;
export type Repair = Trace & BodyOf<"repair.recorded">;
export type Proof = Trace & BodyOf<"proof.recorded">;
export type StopAct = Trace & BodyOf<"stop.act-recorded">;
export type StopRaised = Trace & BodyOf<"stop.raised">;

/** One call for heat that was watched. */
export interface Watch extends Trace {
  resetsBefore: number | null;
  before?: BodyOf<"watch.started">["before"];
  seen: { sight: string; atS: number; eventId: string }[];
  ended?: BodyOf<"watch.ended"> & Trace;
}

/** One entry of the put-back list. */
export interface PutBack extends Trace, OpeningBody {
  /** Place in the event that opened it. */
  entry: number;
  /** The check that opened it, if one did. */
  check?: string;
  restored?: Trace & { powerWasOff?: boolean };
}

/** A step on the tree: where the walk has been. */
export interface TreeStep extends Trace {
  kind: "answered" | "declined" | "done" | "left" | "entered";
  treeNode: string;
}

/** The state of a diagnosis: a fold of its events and of nothing else. */
export interface DiagnosisState {
  /** Every event in order, the undone and the unknown ones too. */
  log: readonly RecordedEvent[];
  /** Ids of events taken back, with the event that did it. */
  undone: Readonly<Record<string, string>>;
  /** Ids of events put right, with the events that did it. */
  corrected: Readonly<Record<string, readonly string[]>>;
  opened: (Trace & BodyOf<"diagnosis.opened">) | null;
  profile: UnitProfile | null;
  unit: UnitState;
  door: { [Q in DoorAnswer["question"]]?: Extract<DoorAnswer, { question: Q }> };
  raised: readonly StopRaised[];
  stopActs: readonly StopAct[];
  confirmed: (Trace & { complaintRef?: string; changedUnit: boolean }) | null;
  looks: readonly Look[];
  watches: readonly Watch[];
  watchSkipped: (Trace & BodyOf<"watch.skipped">) | null;
  /** The check that is begun and not yet answered. */
  current: (Trace & { check: string; way?: string; treeNode?: string }) | null;
  observations: readonly Observation[];
  declined: readonly Declined[];
  departures: readonly Departure[];
  treeSteps: readonly TreeStep[];
  putBacks: readonly PutBack[];
  conclusion: Conclusion | null;
  repairs: readonly Repair[];
  proofs: Readonly<Record<string, Proof>>;
  closed: (Trace & BodyOf<"diagnosis.closed"> & { outcome: VisitOutcome }) | null;
  report: (Trace & BodyOf<"report.requested">) | null;
  /** Events this build cannot read: kept and shown, never dropped. */
  unknownSteps: readonly (Trace & { type: string })[];
}

/** A diagnosis before its first event. A unit is met with power on, gas open and no call. */
export const initialState: DiagnosisState = {
  log: [],
  undone: {},
  corrected: {},
  opened: null,
  profile: null,
  unit: { power: "on", gas: "open", calling: false },
  door: {},
  raised: [],
  stopActs: [],
  confirmed: null,
  looks: [],
  watches: [],
  watchSkipped: null,
  current: null,
  observations: [],
  declined: [],
  departures: [],
  treeSteps: [],
  putBacks: [],
  conclusion: null,
  repairs: [],
  proofs: {},
  closed: null,
  report: null,
  unknownSteps: [],
};
